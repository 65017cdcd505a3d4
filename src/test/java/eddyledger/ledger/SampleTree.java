package eddyledger.ledger;

import static eddyledger.ledger.SampleVehicle.FLIGHT;
import static eddyledger.ledger.SampleVehicle.bands;
import static eddyledger.ledger.SampleVehicle.single;
import static eddyledger.ledger.SampleVehicle.thirds;
import static eddyledger.model.ByCondition.always;

import eddyledger.model.BandTable;
import eddyledger.model.ByCondition;
import eddyledger.model.Construction;
import eddyledger.model.CrossSpectrumChoice;
import eddyledger.model.CrossSpectrumChoice.Rule;
import eddyledger.model.EdgeSpeed;
import eddyledger.model.Evidence;
import eddyledger.model.Extras;
import eddyledger.model.Judged;
import eddyledger.model.JudgedBands;
import eddyledger.model.LayUp;
import eddyledger.model.LayerGiven;
import eddyledger.model.MeasuredPanel;
import eddyledger.model.Node;
import eddyledger.model.Panel;
import eddyledger.model.PlateConstruction;
import eddyledger.model.Section;
import eddyledger.model.Settings;
import eddyledger.model.SettingsBuilder;
import eddyledger.model.TabulatedLayUp;
import eddyledger.model.Tension;
import eddyledger.model.WallPressureChoice;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * The tree of {@link SampleVehicle}: five computed panels and a measured one, sections two deep, an
 * empty section, values inherited from every depth and overridden per condition.
 */
final class SampleTree {
  /** Every panel that is computed. */
  static final List<String> COMPUTED =
      List.of("side-glass", "quarter-glass", "floor", "roof", "tail");

  /** The panel that is known by measurement. */
  static final String MEASURED = "hatch";

  private SampleTree() {}

  static Settings vehicleSettings() {
    return settings()
        .localSpeed(always(EdgeSpeed.ratio(1.0)))
        .boundaryLayer(always(LayerGiven.thickness(0.02)))
        .lossFactor(always(single(0.03)))
        .build();
  }

  static List<Node> tree() {
    Section sides =
        section(
            "sides",
            settings().construction("glass").size(0.32, 0.24).build(),
            List.of(
                panel("side-glass", 2, settings().localSpeed(speeds()).build()),
                panel(
                    "quarter-glass",
                    1,
                    settings()
                        .localSpeed(always(EdgeSpeed.ratio(1.1)))
                        .convectionRatio(always(Judged.of(0.65)))
                        .crossSpectrum(always(orders(1, 1, Rule.HALF_POWER_WIDTH)))
                        .build())));
    Section body =
        section(
            "body",
            settings()
                .zone("front")
                .boundaryLayer(new ByCondition<>(null, Map.of(FLIGHT, LayerGiven.thickness(0.09))))
                .lossFactor(always(bands(BandTable.octaves("125", 0.04, 0.03, 0.02))))
                .build(),
            List.of(
                sides,
                panel(
                    "floor",
                    3,
                    settings()
                        .construction("steel")
                        .size(0.3, 0.2)
                        .layUp("carpet")
                        .boundaryLayer(always(running(2.5)))
                        .build())));
    Section aft =
        section(
            "aft",
            settings().zone("rear").construction("skin").layUp("liner").build(),
            List.of(
                panel(
                    "roof",
                    4,
                    settings()
                        .size(0.3, 0.2)
                        .wallPressure(always(WallPressureChoice.of("efimtsov")))
                        .build()),
                measured(),
                section("empty-bay", Settings.NONE, List.of())));
    return List.of(
        body,
        aft,
        panel(
            "tail",
            1,
            settings()
                .zone("trunk")
                .construction("steel")
                .size(0.32, 0.24)
                .crossSpectrum(always(orders(2, 1, Rule.CORRELATION_LENGTH)))
                .build()));
  }

  private static ByCondition<EdgeSpeed> speeds() {
    EdgeSpeed suction =
        new EdgeSpeed(EdgeSpeed.Way.PRESSURE_COEFFICIENT, Judged.of(-0.3), Extras.NONE);
    return new ByCondition<>(EdgeSpeed.ratio(1.2), Map.of(FLIGHT, suction));
  }

  private static Panel measured() {
    JudgedBands difference = bands(BandTable.octaves("63", 52.0, 58.0, 64.0, 70.0, 76.0));
    MeasuredPanel data = new MeasuredPanel(difference, single(10.0), Extras.NONE);
    return new Panel(MEASURED, MEASURED, 1, Settings.NONE, data, Evidence.NONE, Extras.NONE);
  }

  static SettingsBuilder settings() {
    return Settings.NONE.edit();
  }

  static Section section(String id, Settings settings, List<Node> children) {
    return new Section(id, id, settings, children, Extras.NONE);
  }

  static Panel panel(String id, int count, Settings settings) {
    return new Panel(id, id, count, settings, null, Evidence.NONE, Extras.NONE);
  }

  static LayerGiven running(double length) {
    return new LayerGiven(Judged.of(length), null, null, null, null, Extras.NONE);
  }

  static CrossSpectrumChoice orders(int along, int across, Rule rule) {
    return CrossSpectrumChoice.DEFAULT.at(along, across, rule);
  }

  static List<Construction> constructions() {
    return List.of(
        plate("glass", 0.004, 70.0e9, 2500.0, 0.23, null, null),
        plate("steel", 0.003, 205.0e9, 7850.0, 0.29, null, null),
        plate("skin", 0.0025, 71.0e9, 2780.0, 0.33, 1.4, Tension.fromCabinPressure(0.6)));
  }

  static PlateConstruction plate(
      String id,
      double thickness,
      double youngsModulus,
      double density,
      double poissonRatio,
      Double radius,
      Tension tension) {
    return new PlateConstruction(
        id,
        id,
        thickness,
        youngsModulus,
        density,
        poissonRatio,
        radius,
        tension,
        Evidence.NONE,
        Extras.NONE);
  }

  static List<LayUp> layUps() {
    return List.of(
        layUp("carpet", bands(BandTable.octaves("63", -2.0, 0.0, 4.0, 9.0, 15.0, 20.0))),
        layUp("liner", bands(thirds(-1.5, 0.8))));
  }

  static TabulatedLayUp layUp(String id, JudgedBands insertionLoss) {
    return new TabulatedLayUp(id, id, insertionLoss, null, Set.of(), Extras.NONE);
  }
}
