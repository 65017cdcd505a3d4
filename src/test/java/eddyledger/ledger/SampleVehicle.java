package eddyledger.ledger;

import eddyledger.model.AirGiven;
import eddyledger.model.Allowance;
import eddyledger.model.Aperture;
import eddyledger.model.BandTable;
import eddyledger.model.ByCondition;
import eddyledger.model.Evidence;
import eddyledger.model.Extras;
import eddyledger.model.JudgedBands;
import eddyledger.model.OperatingCondition;
import eddyledger.model.OtherSource;
import eddyledger.model.PassRule;
import eddyledger.model.Rating;
import eddyledger.model.Receiver;
import eddyledger.model.Target;
import eddyledger.model.Vehicle;
import eddyledger.model.VehicleBuilder;
import eddyledger.model.Zone;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.util.List;
import java.util.Map;

/**
 * A small invented vehicle that uses every part of the model: two conditions with different air
 * outside and in the cabin, three coupled zones, three receivers (one with direct sound), the tree
 * of {@link SampleTree}, other sources, targets and allowances. Its plates have few modes, so that
 * it is computed at once.
 */
final class SampleVehicle {
  static final String ROAD = "road";
  static final String FLIGHT = "flight";
  static final String DRIVER = "driver";
  static final String PASSENGER = "passenger";
  static final String TRUNK_EAR = "trunk-ear";

  private SampleVehicle() {}

  static Vehicle vehicle() {
    return VehicleBuilder.named("sample", "Sample")
        .settings(SampleTree.vehicleSettings())
        .conditions(List.of(road(), flight()))
        .zones(zones())
        .apertures(
            List.of(
                new Aperture("passage", "passage", "front", "rear", 0.8, null, Extras.NONE),
                new Aperture(
                    "shelf",
                    "shelf",
                    "trunk",
                    "rear",
                    0.6,
                    bands(BandTable.octaves("63", 6.0, 9.0, 12.0, 16.0, 20.0, 24.0)),
                    Extras.NONE)))
        .receivers(receivers())
        .constructions(SampleTree.constructions())
        .layUps(SampleTree.layUps())
        .otherSources(others())
        .targets(targets())
        .allowances(
            List.of(
                allowance("sides", DRIVER, ROAD, 70.0),
                allowance("floor", DRIVER, ROAD, 20.0),
                allowance("aft", PASSENGER, FLIGHT, 90.0)))
        .tree(SampleTree.tree())
        .build();
  }

  private static OperatingCondition road() {
    AirGiven outside = AirGiven.of(283.15, 100_400.0);
    return condition(ROAD, 38.0, null, outside, AirGiven.of(295.15, 100_400.0));
  }

  private static OperatingCondition flight() {
    AirGiven cabin = AirGiven.of(296.15, 81_000.0);
    return condition(FLIGHT, null, 0.62, AirGiven.atAltitude(9_000.0), cabin);
  }

  static OperatingCondition condition(
      String id, Double speed, Double mach, AirGiven outside, AirGiven cabin) {
    return new OperatingCondition(
        id, id, speed, mach, outside, cabin, null, null, null, null, null, Extras.NONE);
  }

  private static List<Zone> zones() {
    return List.of(
        zone("front", 3.0, 14.0, bands(BandTable.octaves("125", 1.2, 2.0, 3.1, 3.6, 3.9, 4.0))),
        zone("rear", 2.4, 11.0, bands(thirds(1.1, 0.05))),
        new Zone(
            "trunk",
            "trunk",
            null,
            null,
            new ByCondition<>(single(0.5), Map.of(FLIGHT, single(0.7))),
            Extras.NONE));
  }

  static Zone zone(String id, Double volume, Double surface, JudgedBands absorption) {
    return new Zone(id, id, volume, surface, ByCondition.always(absorption), Extras.NONE);
  }

  private static List<Receiver> receivers() {
    Receiver.DirectPath path = new Receiver.DirectPath("side-glass", 0.7, Extras.NONE);
    return List.of(
        new Receiver(DRIVER, "driver's ear", "front", List.of(path), Extras.NONE),
        new Receiver(PASSENGER, "passenger's ear", "rear", List.of(), Extras.NONE),
        new Receiver(TRUNK_EAR, "in the trunk", "trunk", List.of(), Extras.NONE));
  }

  private static List<OtherSource> others() {
    return List.of(
        other("tyres", DRIVER, ROAD, bands(thirds(52.0, -0.9))),
        other("engine", DRIVER, ROAD, single(30.0)),
        other("engines", PASSENGER, FLIGHT, bands(thirds(70.0, -1.2))));
  }

  static OtherSource other(String id, String receiver, String condition, JudgedBands levels) {
    return new OtherSource(id, id, receiver, condition, levels, Extras.NONE);
  }

  private static List<Target> targets() {
    return List.of(
        target("driver-a", ROAD, List.of(DRIVER), Rating.OVERALL_A, 66.0, PassRule.PLAIN),
        target("flight-a", FLIGHT, List.of(PASSENGER), Rating.OVERALL_A, 78.0, PassRule.PLAIN),
        target(
            "road-both",
            ROAD,
            List.of(DRIVER, PASSENGER),
            Rating.OVERALL_LINEAR,
            80.0,
            new PassRule(PassRule.Rounding.WHOLE, 0.5, PassRule.Across.ENERGY_MEAN)),
        target("flight-sil", FLIGHT, List.of(PASSENGER), Rating.SIL_1K_4K, 60.0, PassRule.PLAIN));
  }

  static Target target(
      String id,
      String condition,
      List<String> receivers,
      Rating rating,
      double value,
      PassRule rule) {
    return new Target(
        id, id, condition, receivers, rating, value, 0.5, rule, Evidence.NONE, Extras.NONE);
  }

  static Allowance allowance(String node, String receiver, String condition, double level) {
    return new Allowance(node, receiver, condition, level, Evidence.NONE, Extras.NONE);
  }

  static JudgedBands bands(BandTable table) {
    return JudgedBands.of(table);
  }

  static JudgedBands single(double value) {
    return bands(BandTable.single(value));
  }

  /** Thirds that rise by a step from band to band. */
  static BandTable thirds(double first, double step) {
    double[] values = new double[Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      values[band] = first + step * band;
    }
    return BandTable.thirds(BandSpectrum.of(values));
  }

  /** The same value in every band but one, which is missing. */
  static JudgedBands without(double value, String missing) {
    double[] values = BandSpectrum.constant(value).toArray();
    values[Bands.position(missing)] = Double.NaN;
    return bands(BandTable.thirds(BandSpectrum.of(values)));
  }
}
