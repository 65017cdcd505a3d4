package eddyledger.file;

import eddyledger.model.ByCondition;
import eddyledger.model.CrossSpectrumChoice;
import eddyledger.model.EdgeSpeed;
import eddyledger.model.EdgeSpeed.Way;
import eddyledger.model.Evidence;
import eddyledger.model.EvidenceGrade;
import eddyledger.model.Extras;
import eddyledger.model.Judged;
import eddyledger.model.JudgedBands;
import eddyledger.model.LayerGiven;
import eddyledger.model.MeasuredPanel;
import eddyledger.model.Node;
import eddyledger.model.Panel;
import eddyledger.model.Section;
import eddyledger.model.Settings;
import eddyledger.model.WallPressureChoice;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** A tree whose nodes set everything that can be set, in every form that the file knows. */
final class RichTree {
  private RichTree() {}

  static Settings vehicleSettings() {
    return Settings.NONE
        .edit()
        .localSpeed(ByCondition.always(EdgeSpeed.ratio(1.05)))
        .boundaryLayer(ByCondition.always(LayerGiven.thickness(0.02)))
        .wallPressure(ByCondition.always(WallPressureChoice.of("goody")))
        .crossSpectrum(ByCondition.always(CrossSpectrumChoice.DEFAULT))
        .convectionRatio(ByCondition.always(Judged.of(0.7)))
        .lossFactor(RichValues.plain(0.02))
        .zone("front")
        .build();
  }

  static List<Node> tree() {
    Panel window =
        new Panel(
            "front-window",
            "front window =A1",
            2,
            everything(),
            null,
            new Evidence(EvidenceGrade.CALCULATION, null, "sheet 4"),
            RichVehicle.extras("panel"));
    Panel roof =
        new Panel(
            "roof-panel",
            "roof panel",
            1,
            Settings.NONE,
            new MeasuredPanel(
                RichValues.thirds(30.0), RichValues.octaves(), RichVehicle.extras("measured")),
            RichVehicle.evidence("tunnel"),
            Extras.NONE);
    Panel hatch =
        new Panel(
            "hatch",
            "hatch",
            1,
            overridesOnly(),
            new MeasuredPanel(JudgedBands.of(RichValues.octaves().best()), null, Extras.NONE),
            Evidence.NONE,
            new Extras(Map.of("local_speed", Map.of("x-later", "kept"))));
    Section inner =
        new Section("roof", "roof", Settings.NONE, List.of(roof), RichVehicle.extras("section"));
    return List.of(
        new Section("upper", "upper", sectionSettings(), List.of(window, inner), Extras.NONE),
        hatch,
        new Section("empty", "empty", Settings.NONE, List.of(), Extras.NONE));
  }

  private static Settings sectionSettings() {
    return Settings.NONE
        .edit()
        .construction("skin")
        .size(1.5, 0.8)
        .layUp("lining")
        .supplier("glass-works")
        .zone("rear")
        .build();
  }

  private static Settings everything() {
    Map<String, EdgeSpeed> speeds = new LinkedHashMap<>();
    speeds.put("climb.2", speed(Way.PRESSURE_COEFFICIENT, Judged.of(-0.5)));
    speeds.put("cruise", speed(Way.PRESSURE_COEFFICIENT_INCOMPRESSIBLE, RichVehicle.judged(0.1)));
    speeds.put("rest", speed(Way.RATIO, Judged.of(1.25)));
    return Settings.NONE
        .edit()
        .construction("glass-5")
        .size(1.0 / 3.0, 0.45)
        .localSpeed(new ByCondition<>(speed(Way.SPEED, RichVehicle.judged(44.0)), speeds))
        .boundaryLayer(new ByCondition<>(layer(), Map.of("cruise", LayerGiven.thickness(0.01))))
        .wallPressure(
            new ByCondition<>(
                WallPressureChoice.of("goody"),
                Map.of(
                    "cruise",
                    new WallPressureChoice(
                        "efimtsov",
                        "goody",
                        "efimtsov",
                        RichVehicle.evidence("judged"),
                        RichVehicle.extras("choice")))))
        .crossSpectrum(
            new ByCondition<>(
                new CrossSpectrumChoice(
                    1,
                    3,
                    RichVehicle.judged(0.1),
                    Judged.of(0.77),
                    2,
                    5,
                    CrossSpectrumChoice.Rule.CORRELATION_LENGTH,
                    RichVehicle.evidence("fit"),
                    RichVehicle.extras("cross")),
                Map.of("rest", CrossSpectrumChoice.DEFAULT)))
        .convectionRatio(
            new ByCondition<>(Judged.of(0.65), Map.of("cruise", RichVehicle.judged(0.7))))
        .lossFactor(new ByCondition<>(RichValues.single(), Map.of("rest", RichValues.octaves())))
        .layUp(Settings.NO_LAY_UP)
        .zone("front")
        .supplier("glass-works")
        .build();
  }

  private static EdgeSpeed speed(Way way, Judged value) {
    return new EdgeSpeed(way, value, RichVehicle.extras(way.key()));
  }

  private static LayerGiven layer() {
    return new LayerGiven(
        Judged.of(2.5),
        RichVehicle.judged(0.03),
        Judged.of(0.004),
        Judged.of(0.003),
        RichVehicle.judged(1.75),
        RichVehicle.extras("layer"));
  }

  private static Settings overridesOnly() {
    return Settings.NONE
        .edit()
        .localSpeed(new ByCondition<>(null, Map.of("cruise", EdgeSpeed.ratio(0.9))))
        .boundaryLayer(new ByCondition<>(null, Map.of()))
        .wallPressure(new ByCondition<>(null, Map.of("rest", WallPressureChoice.of("goody"))))
        .crossSpectrum(new ByCondition<>(null, Map.of("rest", CrossSpectrumChoice.DEFAULT)))
        .convectionRatio(new ByCondition<>(null, Map.of("rest", Judged.of(0.8))))
        .lossFactor(new ByCondition<>(null, Map.of("rest", RichValues.single())))
        .build();
  }
}
