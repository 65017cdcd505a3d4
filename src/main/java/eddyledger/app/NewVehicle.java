package eddyledger.app;

import eddyledger.model.AirGiven;
import eddyledger.model.BandTable;
import eddyledger.model.ByCondition;
import eddyledger.model.Construction;
import eddyledger.model.EdgeSpeed;
import eddyledger.model.Evidence;
import eddyledger.model.EvidenceGrade;
import eddyledger.model.Extras;
import eddyledger.model.JudgedBands;
import eddyledger.model.LayerGiven;
import eddyledger.model.OperatingCondition;
import eddyledger.model.PlateConstruction;
import eddyledger.model.Receiver;
import eddyledger.model.Settings;
import eddyledger.model.Vehicle;
import eddyledger.model.VehicleBuilder;
import eddyledger.model.Zone;
import java.util.List;

/**
 * A vehicle without panels to begin with: one condition, one zone, one receiver and three plates,
 * so that the first panel added has a level at once. The values are guesses and say so; handbook
 * values of the materials (common practice, no source).
 */
public final class NewVehicle {
  private static final Evidence GUESS = new Evidence(EvidenceGrade.GUESS, null, "to begin with");

  private NewVehicle() {}

  /** The vehicle. */
  public static Vehicle empty() {
    return VehicleBuilder.named("new-vehicle", "New vehicle")
        .conditions(List.of(condition()))
        .zones(
            List.of(
                new Zone("cabin", "Cabin", 3.0, 20.0, ByCondition.always(bands(8.0)), Extras.NONE)))
        .receivers(List.of(new Receiver("seat-1", "Seat 1", "cabin", List.of(), Extras.NONE)))
        .constructions(
            List.of(
                plate("steel-0-8", "Steel sheet 0.8 mm", 0.8e-3, 2.1e11, 7850.0, 0.3),
                plate("glass-3-85", "Toughened glass 3.85 mm", 3.85e-3, 7.0e10, 2500.0, 0.23),
                plate("skin-1-4", "Aluminium skin 1.4 mm", 1.4e-3, 7.1e10, 2780.0, 0.33)))
        .settings(
            Settings.NONE
                .edit()
                .construction("steel-0-8")
                .size(0.9, 0.45)
                .localSpeed(ByCondition.always(EdgeSpeed.ratio(1.0)))
                .boundaryLayer(ByCondition.always(LayerGiven.thickness(0.03)))
                .lossFactor(ByCondition.always(bands(0.03)))
                .zone("cabin")
                .build())
        .build();
  }

  private static JudgedBands bands(double value) {
    return new JudgedBands(BandTable.single(value), null, null, GUESS);
  }

  private static OperatingCondition condition() {
    return new OperatingCondition(
        "cruise",
        "Cruise, 130 km/h",
        130.0 / 3.6,
        null,
        AirGiven.atAltitude(0.0),
        null,
        null,
        null,
        null,
        null,
        null,
        Extras.NONE);
  }

  private static Construction plate(
      String id, String name, double thickness, double modulus, double density, double poisson) {
    return new PlateConstruction(
        id, name, thickness, modulus, density, poisson, null, null, GUESS, Extras.NONE);
  }
}
