package eddyledger.workbook;

import eddyledger.model.Aperture;
import eddyledger.model.Construction;
import eddyledger.model.Evidence;
import eddyledger.model.Judged;
import eddyledger.model.JudgedBands;
import eddyledger.model.LayUp;
import eddyledger.model.PlateConstruction;
import eddyledger.model.Receiver;
import eddyledger.model.TableContent;
import eddyledger.model.TabulatedLayUp;
import eddyledger.model.Tension;
import eddyledger.model.Vehicle;
import eddyledger.model.Zone;
import eddyledger.workbook.Grid.Field;
import eddyledger.workbook.Look.Format;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/** Writes the constructions, lay-ups, zones, apertures and receivers. */
final class PartTables {
  private static final double MILLIMETRES = 1000.0;
  private static final double GIGA = 1.0e-9;

  private static final List<Field> CONSTRUCTIONS =
      List.of(
          Field.text("Construction"),
          Field.text("Name"),
          Field.text("Type"),
          Field.entered("Thickness, mm", Format.THREE),
          Field.entered("Young's modulus, GPa", Format.TWO),
          Field.entered("Density, kg/m\u00b3", Format.WHOLE),
          Field.entered("Poisson's ratio", Format.TWO),
          Field.derived("Surface mass, kg/m\u00b2", Format.TWO),
          Field.entered("Radius, m", Format.THREE),
          Field.entered("Skin's share of the load", Format.TWO),
          Field.entered("Share, low", Format.TWO),
          Field.entered("Share, high", Format.TWO),
          Field.text("Evidence grade"),
          Field.text("Source"));

  private final Grid grid;
  private final Vehicle vehicle;
  private List<Field> fields = List.of();

  PartTables(Grid grid, Vehicle vehicle) {
    this.grid = grid;
    this.vehicle = vehicle;
  }

  void write() {
    grid.table("Constructions", "Simply supported plates.", CONSTRUCTIONS);
    vehicle.constructions().forEach(this::construction);
    words("Lay-ups", "Lay-up", "Insertion loss, dB");
    vehicle.layUps().forEach(this::layUp);
    words("Zones", "Zone", "Volume, inner surface and absorption area, m\u00b3 and m\u00b2");
    vehicle.zones().forEach(this::zone);
    words("Apertures", "Aperture", "Zones, area in m\u00b2 and transmission loss in dB");
    vehicle.apertures().forEach(this::aperture);
    words("Receivers", "Receiver", "Zone, and panels whose direct sound is counted");
    vehicle.receivers().forEach(this::receiver);
  }

  private void words(String heading, String id, String values) {
    fields =
        List.of(
            Field.text(id),
            Field.text("Name"),
            Field.wide(values, 11),
            Field.text("Evidence grade and source"));
    grid.table(heading, "", fields);
  }

  private void row(String id, String name, String values, String evidence) {
    grid.row(
        fields,
        List.of(Answer.text(id), Answer.text(name), Answer.text(values), Answer.text(evidence)));
  }

  private void construction(Construction construction) {
    if (construction instanceof PlateConstruction plate) {
      Tension tension = plate.tension();
      Judged share = tension == null ? null : tension.skinShare();
      grid.row(
          CONSTRUCTIONS,
          List.of(
              Answer.text(plate.id()),
              Answer.text(plate.name()),
              Answer.words("isotropic plate" + entered(tension)),
              Answer.number(MILLIMETRES * plate.thickness()),
              Answer.number(GIGA * plate.youngsModulus()),
              Answer.number(plate.density()),
              Answer.number(plate.poissonRatio()),
              Answer.number(plate.surfaceMass()),
              Answer.number(plate.radius()),
              Answer.number(share == null ? null : Double.valueOf(share.best())),
              Answer.number(share == null ? null : share.low()),
              Answer.number(share == null ? null : share.high()),
              Answer.words(Words.grade(plate.evidence())),
              Answer.words(Words.source(plate.evidence()))));
    }
  }

  private static String entered(Tension tension) {
    return tension != null && tension.skinShare() == null ? ", tension entered" : "";
  }

  private void layUp(LayUp layUp) {
    if (layUp instanceof TabulatedLayUp table) {
      String base =
          table.baseSurfaceMass() == null
              ? ""
              : "; measured on " + Words.number(table.baseSurfaceMass(), "kg/m\u00b2");
      String includes =
          table.includes().isEmpty()
              ? ""
              : "; includes "
                  + table.includes().stream()
                      .sorted()
                      .map(TableContent::text)
                      .collect(Collectors.joining(", "));
      row(
          table.id(),
          table.name(),
          bands(table.insertionLoss(), "dB") + base + includes,
          evidence(table.insertionLoss().evidence()));
    }
  }

  private void zone(Zone zone) {
    String volume = zone.volume() == null ? "not stated" : Words.number(zone.volume(), "m\u00b3");
    String surface =
        zone.innerSurface() == null ? "not stated" : Words.number(zone.innerSurface(), "m\u00b2");
    JudgedBands absorption = zone.absorptionArea() == null ? null : zone.absorptionArea().base();
    StringBuilder words = new StringBuilder();
    words.append("volume ").append(volume).append("; inner surface ").append(surface);
    words.append("; absorption area: ");
    words.append(absorption == null ? "not stated" : bands(absorption, "m\u00b2"));
    if (zone.absorptionArea() != null) {
      for (Map.Entry<String, JudgedBands> other : zone.absorptionArea().overrides().entrySet()) {
        words.append("; in ").append(other.getKey()).append(": ");
        words.append(bands(other.getValue(), "m\u00b2"));
      }
    }
    Evidence evidence = absorption == null ? Evidence.NONE : absorption.evidence();
    row(zone.id(), zone.name(), words.toString(), evidence(evidence));
  }

  private void aperture(Aperture aperture) {
    JudgedBands loss = aperture.transmissionLoss();
    row(
        aperture.id(),
        aperture.name(),
        aperture.firstZone()
            + " and "
            + aperture.secondZone()
            + ", "
            + Words.number(aperture.area(), "m\u00b2")
            + "; "
            + (loss == null ? "open passage, 0 dB" : bands(loss, "dB")),
        loss == null ? Answer.NOT_ASKED : evidence(loss.evidence()));
  }

  private void receiver(Receiver receiver) {
    String direct =
        receiver.direct().stream()
            .map(path -> path.panel() + " at " + Words.number(path.distance(), "m"))
            .collect(Collectors.joining(", "));
    row(
        receiver.id(),
        receiver.name(),
        receiver.zone()
            + (direct.isEmpty() ? "; no direct sound counted" : "; direct sound: " + direct),
        Answer.NOT_ASKED);
  }

  private static String bands(JudgedBands bands, String unit) {
    String words = Words.table(bands.best(), unit);
    if (bands.low() != null) {
      words = words + "; low: " + Words.table(bands.low(), unit);
    }
    return bands.high() == null ? words : words + "; high: " + Words.table(bands.high(), unit);
  }

  private static String evidence(Evidence evidence) {
    String grade = Words.grade(evidence);
    return grade.equals(Words.source(evidence)) ? grade : grade + "; " + Words.source(evidence);
  }
}
