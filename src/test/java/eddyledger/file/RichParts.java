package eddyledger.file;

import eddyledger.model.BandTable;
import eddyledger.model.ByCondition;
import eddyledger.model.Construction;
import eddyledger.model.Evidence;
import eddyledger.model.Extras;
import eddyledger.model.Judged;
import eddyledger.model.JudgedBands;
import eddyledger.model.LayUp;
import eddyledger.model.PlateConstruction;
import eddyledger.model.TableContent;
import eddyledger.model.TabulatedLayUp;
import eddyledger.model.Tension;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** Constructions and lay-ups in every form that the file knows. */
final class RichParts {
  private RichParts() {}

  static List<Construction> constructions() {
    Tension entered =
        new Tension(
            null,
            new ByCondition<>(Judged.of(1000.0), Map.of("cruise", RichVehicle.judged(1200.0))),
            new ByCondition<>(
                null,
                Map.of(
                    "cruise", Judged.of(800.0), "climb.2", Judged.of(0.0), "rest", Judged.of(1.0))),
            new Extras(Map.of("x-note", "tension", "across_N_per_m", Map.of("x-later", 1))));
    return List.of(
        new PlateConstruction(
            "glass-5",
            "glass 5 mm",
            0.005,
            7.0e10,
            2500.0,
            0.23,
            null,
            null,
            RichVehicle.evidence("data sheet"),
            RichVehicle.extras("plate")),
        new PlateConstruction(
            "skin",
            "skin",
            0.0016,
            7.1e10,
            2770.0,
            0.33,
            1.98,
            new Tension(RichVehicle.judged(0.7), null, null, Extras.NONE),
            Evidence.NONE,
            Extras.NONE),
        new PlateConstruction(
            "belt", "belt", 0.001, 2.0e11, 7850.0, 0.3, 4.0, entered, Evidence.NONE, Extras.NONE));
  }

  static List<LayUp> layUps() {
    return List.of(
        new TabulatedLayUp(
            "lining",
            "lining",
            RichValues.thirds(3.0),
            4.05,
            Set.of(TableContent.DAMPING, TableContent.MASS),
            RichVehicle.extras("lay-up")),
        new TabulatedLayUp(
            "carpet",
            "carpet",
            JudgedBands.of(BandTable.octaves("125", -1.5, 3.0)),
            null,
            Set.of(),
            Extras.NONE));
  }
}
