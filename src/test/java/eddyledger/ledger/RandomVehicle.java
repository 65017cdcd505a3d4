package eddyledger.ledger;

import eddyledger.model.AirGiven;
import eddyledger.model.Aperture;
import eddyledger.model.BandTable;
import eddyledger.model.ByCondition;
import eddyledger.model.CrossSpectrumChoice.Rule;
import eddyledger.model.EdgeSpeed;
import eddyledger.model.Evidence;
import eddyledger.model.Extras;
import eddyledger.model.Judged;
import eddyledger.model.JudgedBands;
import eddyledger.model.LayerGiven;
import eddyledger.model.MeasuredPanel;
import eddyledger.model.Node;
import eddyledger.model.OperatingCondition;
import eddyledger.model.OtherSource;
import eddyledger.model.Panel;
import eddyledger.model.Receiver;
import eddyledger.model.Settings;
import eddyledger.model.SettingsBuilder;
import eddyledger.model.Vehicle;
import eddyledger.model.VehicleBuilder;
import eddyledger.model.WallPressureChoice;
import eddyledger.model.Zone;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;

/**
 * Vehicles that can be computed, drawn at random and the same for the same seed: two conditions,
 * two or three zones, two receivers, four to seven panels in sections, one of them measured. Plates
 * come in two sizes, so that a run is quick.
 */
final class RandomVehicle {
  private final Random random;
  private final List<String> zones;
  private int panels;

  private RandomVehicle(long seed) {
    random = new Random(seed);
    zones = random.nextBoolean() ? List.of("z0", "z1") : List.of("z0", "z1", "z2");
  }

  static Vehicle of(long seed) {
    return new RandomVehicle(seed).vehicle();
  }

  private Vehicle vehicle() {
    List<Node> tree = new ArrayList<>();
    for (int i = 0; i < 2; i++) {
      tree.add(section("s" + i, 1));
    }
    tree.add(panel());
    return VehicleBuilder.named("random", "random")
        .settings(
            Settings.NONE
                .edit()
                .zone(zone())
                .construction("steel")
                .size(0.3, 0.2)
                .localSpeed(ByCondition.always(EdgeSpeed.ratio(between(0.9, 1.3))))
                .boundaryLayer(ByCondition.always(LayerGiven.thickness(between(0.01, 0.1))))
                .lossFactor(ByCondition.always(SampleVehicle.single(between(0.005, 0.1))))
                .build())
        .conditions(List.of(condition("slow", 25.0, 60.0), condition("fast", 80.0, 230.0)))
        .zones(zones.stream().map(this::zone).toList())
        .apertures(apertures())
        .receivers(List.of(receiver("r0", zones.get(0)), receiver("r1", zones.get(1))))
        .constructions(SampleTree.constructions())
        .layUps(SampleTree.layUps())
        .otherSources(List.of(other("o0", "r0", "slow"), other("o1", "r1", "fast")))
        .tree(tree)
        .build();
  }

  private OperatingCondition condition(String id, double slowest, double fastest) {
    AirGiven outside = AirGiven.atAltitude(between(0.0, 9_000.0));
    AirGiven cabin = AirGiven.of(between(285.0, 303.0), between(75_000.0, 102_000.0));
    return SampleVehicle.condition(id, between(slowest, fastest), null, outside, cabin);
  }

  /** Surfaces are large enough that no zone absorbs more than falls on them. */
  private Zone zone(String id) {
    return SampleVehicle.zone(id, between(1.0, 8.0), between(40.0, 60.0), bands(0.5, 6.0));
  }

  private List<Aperture> apertures() {
    List<Aperture> apertures = new ArrayList<>();
    for (int i = 1; i < zones.size(); i++) {
      JudgedBands loss = random.nextBoolean() ? null : bands(0.0, 30.0);
      String before = zones.get(i - 1);
      apertures.add(
          new Aperture(
              "a" + i, "a" + i, before, zones.get(i), between(0.05, 2.0), loss, Extras.NONE));
    }
    return apertures;
  }

  private Receiver receiver(String id, String zone) {
    Receiver.DirectPath path = new Receiver.DirectPath("p0", between(0.3, 2.0), Extras.NONE);
    return new Receiver(id, id, zone, List.of(path), Extras.NONE);
  }

  private OtherSource other(String id, String receiver, String condition) {
    return SampleVehicle.other(id, receiver, condition, bands(10.0, 70.0));
  }

  private Node section(String id, int depth) {
    List<Node> children = new ArrayList<>();
    int count = 1 + random.nextInt(2);
    for (int i = 0; i < count; i++) {
      boolean deeper = depth < 3 && random.nextInt(3) == 0;
      children.add(deeper ? section(id + "." + i, depth + 1) : panel());
    }
    if (panels == 3) {
      children.add(measured());
    }
    return SampleTree.section(id, settings(), children);
  }

  private Panel panel() {
    return SampleTree.panel("p" + panels++, 1 + random.nextInt(5), settings());
  }

  private Panel measured() {
    String id = "p" + panels++;
    MeasuredPanel data =
        new MeasuredPanel(bands(30.0, 60.0), SampleVehicle.single(between(3.0, 12.0)), Extras.NONE);
    return new Panel(id, id, 2, settings(), data, Evidence.NONE, Extras.NONE);
  }

  /** Each setting is set about every third time, else inherited. */
  private Settings settings() {
    SettingsBuilder settings = Settings.NONE.edit();
    if (third()) {
      settings.zone(zone());
    }
    if (third()) {
      settings.construction(random.nextBoolean() ? "glass" : "skin").size(0.32, 0.24);
    }
    if (third()) {
      settings.layUp(List.of("carpet", "liner", Settings.NO_LAY_UP).get(random.nextInt(3)));
    }
    if (third()) {
      EdgeSpeed suction =
          new EdgeSpeed(
              EdgeSpeed.Way.PRESSURE_COEFFICIENT, Judged.of(between(-0.5, 0.2)), Extras.NONE);
      settings.localSpeed(new ByCondition<>(null, Map.of("fast", suction)));
    }
    if (third()) {
      settings.boundaryLayer(ByCondition.always(SampleTree.running(between(1.0, 20.0))));
    }
    if (third()) {
      settings.wallPressure(ByCondition.always(WallPressureChoice.of("efimtsov")));
    }
    if (third()) {
      Rule rule = Rule.values()[random.nextInt(2)];
      settings.crossSpectrum(
          ByCondition.always(
              SampleTree.orders(1 + random.nextInt(2), 1 + random.nextInt(2), rule)));
    }
    if (third()) {
      settings.convectionRatio(ByCondition.always(Judged.of(between(0.55, 0.85))));
    }
    if (third()) {
      settings.lossFactor(new ByCondition<>(null, Map.of("slow", bands(0.01, 0.1))));
    }
    return settings.build();
  }

  private boolean third() {
    return random.nextInt(3) == 0;
  }

  private String zone() {
    return zones.get(random.nextInt(zones.size()));
  }

  private JudgedBands bands(double low, double high) {
    double[] values = new double[Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      values[band] = between(low, high);
    }
    return SampleVehicle.bands(BandTable.thirds(BandSpectrum.of(values)));
  }

  private double between(double low, double high) {
    return low + (high - low) * random.nextDouble();
  }
}
