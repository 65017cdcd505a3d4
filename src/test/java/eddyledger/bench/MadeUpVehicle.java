package eddyledger.bench;

import eddyledger.model.AirGiven;
import eddyledger.model.BandTable;
import eddyledger.model.ByCondition;
import eddyledger.model.EdgeSpeed;
import eddyledger.model.Evidence;
import eddyledger.model.Extras;
import eddyledger.model.JudgedBands;
import eddyledger.model.LayerGiven;
import eddyledger.model.Node;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Panel;
import eddyledger.model.PlateConstruction;
import eddyledger.model.Receiver;
import eddyledger.model.Section;
import eddyledger.model.Settings;
import eddyledger.model.Vehicle;
import eddyledger.model.VehicleBuilder;
import eddyledger.model.Zone;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;

/**
 * A made-up vehicle of so many different panels, three conditions of the same cabin air, one zone
 * and two receivers. Sizes are those of car and aircraft panels: 0.2 to 0.9 m by 0.2 to 0.6 m,
 * glass, steel and aluminium.
 */
public final class MadeUpVehicle {
  private static final int PANELS_A_SECTION = 20;

  private MadeUpVehicle() {}

  /** A vehicle of so many panels, none like another. */
  public static Vehicle of(int panels) {
    Random random = new Random(20261201L);
    List<Node> sections = new ArrayList<>();
    List<Node> children = new ArrayList<>();
    for (int i = 0; i < panels; i++) {
      children.add(panel(i, random));
      if (children.size() == PANELS_A_SECTION || i == panels - 1) {
        String id = "section-" + sections.size();
        sections.add(new Section(id, id, Settings.NONE, children, Extras.NONE));
        children = new ArrayList<>();
      }
    }
    JudgedBands absorption = JudgedBands.of(BandTable.single(9.0));
    return VehicleBuilder.named("made-up", "Made-up vehicle")
        .conditions(
            List.of(condition("slow", 28.0), condition("usual", 36.0), condition("fast", 50.0)))
        .zones(
            List.of(
                new Zone("cabin", "Cabin", 3.2, 21.0, ByCondition.always(absorption), Extras.NONE)))
        .receivers(
            List.of(
                new Receiver("front", "Front", "cabin", List.of(), Extras.NONE),
                new Receiver("rear", "Rear", "cabin", List.of(), Extras.NONE)))
        .constructions(
            List.of(
                plate("glass", 3.85e-3, 7.0e10, 2500.0, 0.23),
                plate("steel", 0.8e-3, 2.1e11, 7850.0, 0.3),
                plate("aluminium", 1.4e-3, 7.1e10, 2780.0, 0.33)))
        .settings(Settings.NONE.edit().zone("cabin").build())
        .tree(sections)
        .build();
  }

  private static Panel panel(int i, Random random) {
    String[] constructions = {"glass", "steel", "aluminium"};
    double speed = 0.8 + 0.6 * random.nextDouble();
    double thickness = 0.008 + 0.04 * random.nextDouble();
    double loss = 0.02 + 0.08 * random.nextDouble();
    Settings settings =
        Settings.NONE
            .edit()
            .construction(constructions[i % constructions.length])
            .size(0.2 + 0.7 * random.nextDouble(), 0.2 + 0.4 * random.nextDouble())
            .localSpeed(ByCondition.always(EdgeSpeed.ratio(speed)))
            .boundaryLayer(ByCondition.always(LayerGiven.thickness(thickness)))
            .lossFactor(ByCondition.always(JudgedBands.of(BandTable.single(loss))))
            .build();
    String id = "panel-" + i;
    return new Panel(id, id, 1, settings, null, Evidence.NONE, Extras.NONE);
  }

  private static OperatingCondition condition(String id, double speed) {
    return new OperatingCondition(
        id,
        id,
        speed,
        null,
        AirGiven.of(288.15, 101325.0),
        AirGiven.of(293.15, 101325.0),
        null,
        null,
        null,
        null,
        null,
        Extras.NONE);
  }

  private static PlateConstruction plate(
      String id, double thickness, double modulus, double density, double poisson) {
    return new PlateConstruction(
        id, id, thickness, modulus, density, poisson, null, null, Evidence.NONE, Extras.NONE);
  }
}
