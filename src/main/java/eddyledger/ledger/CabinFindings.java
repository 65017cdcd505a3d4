package eddyledger.ledger;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Receiver;
import eddyledger.model.Vehicle;
import eddyledger.model.Zone;
import eddyledger.physics.cabin.Sabine;
import eddyledger.physics.cabin.SchroederFrequency;
import eddyledger.quantity.Bands;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;

/** What a run has to say about zones and receivers: where the diffuse balance is weak. */
final class CabinFindings {
  /**
   * Above this altitude cabins are pressurised, and outside pressure is no good default for them.
   */
  private static final double THIN_AIR = 75_000.0;

  private final Vehicle vehicle;
  private final LedgerRun run;
  private final Map<String, Finding> all = new LinkedHashMap<>();

  CabinFindings(Vehicle vehicle, LedgerRun run) {
    this.vehicle = vehicle;
    this.run = run;
  }

  List<Finding> all() {
    int c = 0;
    for (OperatingCondition condition : vehicle.conditions()) {
      String place = "conditions[" + c++ + "]";
      CabinResponse cabin = run.cabin(condition.id());
      if (cabin == null) {
        run.failure(condition.id()).ifPresent(failure -> refused(condition, place, failure));
        continue;
      }
      cabinAir(condition, place);
      for (int z = 0; z < vehicle.zones().size(); z++) {
        zone(vehicle.zones().get(z), "zones[" + z + "]", cabin);
      }
      for (int r = 0; r < vehicle.receivers().size(); r++) {
        direct(vehicle.receivers().get(r), "receivers[" + r + "]", condition.id(), cabin);
      }
    }
    return new ArrayList<>(all.values());
  }

  private void refused(OperatingCondition condition, String place, ResolvedPanel.Failure failure) {
    if (run.error(condition.id()).isPresent() || run.conditions().get(condition.id()) == null) {
      return;
    }
    boolean said =
        vehicle.zones().stream().anyMatch(zone -> run.error(zone.id()).isPresent())
            || vehicle.apertures().stream().anyMatch(it -> run.error(it.id()).isPresent());
    if (!said) {
      add(
          Severity.ERROR,
          "cabin",
          condition.id(),
          place,
          "The cabin cannot be balanced: " + failure.reason() + ".",
          "Correct the zones and apertures.");
    }
  }

  private void cabinAir(OperatingCondition condition, String place) {
    ResolvedCondition state = run.conditions().get(condition.id());
    if (state.cabinAirDefaulted() && state.outside().pressure() < THIN_AIR) {
      add(
          Severity.WARNING,
          "cabin-air",
          condition.id(),
          place + ".cabin_air",
          "The cabin's air is not given and taken at the outside pressure of "
              + Math.round(state.outside().pressure())
              + " Pa.",
          "Give the cabin's temperature and pressure.");
    }
  }

  private void zone(Zone zone, String place, CabinResponse cabin) {
    if (zone.volume() != null) {
      int below = 0;
      double highest = 0.0;
      for (int band = 0; band < Bands.COUNT; band++) {
        if (!cabin.absorption(zone.id()).has(band)) {
          continue;
        }
        double area = cabin.absorption(zone.id()).value(band);
        double limit = SchroederFrequency.ofAbsorptionArea(zone.volume(), area);
        if (Bands.centre(band) < limit) {
          below = band + 1;
          highest = limit;
        }
      }
      if (below > 0) {
        add(
            Severity.NOTE,
            "schroeder",
            zone.id(),
            place,
            "Up to the band of "
                + Bands.label(below - 1)
                + " Hz it is below its Schroeder frequency ("
                + Math.round(highest)
                + " Hz): there the level is the zone's average, and seats differ by some 5 dB.",
            "Do not read differences between seats in these bands.");
      }
    }
    OptionalDouble most =
        IntStream.range(0, Bands.COUNT)
            .mapToDouble(band -> cabin.meanAbsorption(zone.id(), band))
            .filter(value -> !Double.isNaN(value))
            .max();
    if (most.orElse(0.0) > 1.0) {
      add(
          Severity.WARNING,
          "absorption-above-surface",
          zone.id(),
          place,
          "Its absorption area is larger than its inner surface; where direct sound is counted,"
              + " nothing is left for the diffuse field.",
          "Correct the absorption area or the inner surface.");
    }
    Optional<String> diffuse =
        most.stream().boxed().findFirst().flatMap(Sabine::remark).map(remark -> remark.text());
    if (diffuse.isPresent()) {
      add(
          Severity.NOTE,
          "not-diffuse",
          zone.id(),
          place,
          "Its " + diffuse.get() + ".",
          "Give distances where the direct sound matters.");
    }
  }

  private void direct(Receiver receiver, String place, String condition, CabinResponse cabin) {
    for (int k = 0; k < receiver.direct().size(); k++) {
      String id = receiver.direct().get(k).panel();
      ResolvedPanel panel = run.resolved(id, condition);
      if (panel == null || panel.failure() != null) {
        continue;
      }
      double area = PanelShare.area(panel);
      if (Double.isNaN(cabin.distance(receiver, panel.zone(), id, area))) {
        add(
            Severity.WARNING,
            "no-direct-sound",
            receiver.id(),
            place + ".direct[" + k + "]",
            "The direct sound of panel \""
                + id
                + "\" is not counted: it needs a panel with a size, radiating into the receiver's"
                + " own zone, and the zone's inner surface.",
            "Give what is missing, or take the distance away.");
      }
    }
  }

  private void add(
      Severity severity, String code, String subject, String place, String what, String remedy) {
    all.putIfAbsent(code + place + what, new Finding(severity, code, subject, place, what, remedy));
  }
}
