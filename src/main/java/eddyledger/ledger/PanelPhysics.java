package eddyledger.ledger;

import eddyledger.ledger.PanelResult.PlateNumbers;
import eddyledger.physics.Remark;
import eddyledger.physics.flow.AirState;
import eddyledger.physics.flow.BoundaryLayer;
import eddyledger.physics.vibration.FluidFace;
import eddyledger.physics.vibration.PanelCase;
import eddyledger.physics.vibration.PanelResponse;
import eddyledger.physics.vibration.PanelTransfer;
import eddyledger.physics.vibration.Plate;
import eddyledger.physics.vibration.RadiationCache;
import eddyledger.physics.wallpressure.SeparableCrossSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Progress;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Runs the physics of one piece of a panel, for all choices of models at once. */
final class PanelPhysics {
  private final RadiationCache radiation;
  private final Progress progress;

  PanelPhysics(RadiationCache radiation, Progress progress) {
    this.radiation = radiation;
    this.progress = progress;
  }

  /**
   * The result of an input.
   *
   * @throws IllegalArgumentException if the input cannot be, with a sentence that says why
   */
  PanelResult compute(PanelInput input) {
    BoundaryLayer layer = input.flow().boundaryLayer();
    List<Choice> choices = Choice.all();
    // alternatives often share a cross-spectrum; the physics then runs it once
    List<CrossInput> crosses =
        choices.stream().map(choice -> choice.cross(input.cross())).distinct().toList();
    Plate plate = plate(input.plate());
    double convection = input.convectionRatio() * layer.edgeSpeed();
    PanelTransfer transfer = transfer(input, plate, convection, crosses);
    Map<String, WallPressureBands> walls =
        WallPressureBands.under(layer, choices, input.spectrum());
    WallPressureBands chosen = walls.get(input.spectrum());
    double[][] power = new double[choices.size()][];
    double[] velocity = null;
    for (int c = 0; c < choices.size(); c++) {
      Choice choice = choices.get(c);
      double[] slices = walls.get(choice.spectrum(input.spectrum())).slices();
      int which = crosses.indexOf(choice.cross(input.cross()));
      power[c] = transfer.bandPower(slices, which);
      if (c == 0) {
        velocity = transfer.bandMeanSquareVelocity(slices, which);
      }
    }
    double[] speeds = new double[Bands.COUNT];
    Arrays.fill(speeds, convection);
    List<Remark> remarks = new ArrayList<>(layer.edge().remarks());
    remarks.addAll(layer.remarks());
    remarks.addAll(chosen.remarks());
    remarks.addAll(transfer.remarks());
    return new PanelResult(
        layer,
        chosen.densities(),
        chosen.meanSquares(),
        speeds,
        velocity,
        power,
        transfer.modesSummed(),
        new PlateNumbers(
            plate.surfaceMass(),
            plate.meanStiffness(),
            plate.criticalFrequency(input.cabin().soundSpeed()),
            transfer.firstModeFrequency()),
        remarks,
        WallPressureBands.beyond(walls));
  }

  private PanelTransfer transfer(
      PanelInput input, Plate plate, double convection, List<CrossInput> crosses) {
    if (!input.lossFactor().complete()) {
      throw new IllegalArgumentException("the loss factor lacks a value in some band");
    }
    List<SeparableCrossSpectrum> spectra = crosses.stream().map(CrossInput::spectrum).toList();
    PanelCase panel =
        new PanelCase(
            plate,
            input.lossFactor().toArray(),
            Optional.of(face(input.flow().outside())),
            Optional.of(face(input.cabin())),
            spectra,
            frequency -> convection,
            WallPressureBands.SLICES);
    return new PanelResponse(radiation).of(panel, progress);
  }

  private static Plate plate(PlateInput input) {
    Plate plate =
        Plate.isotropic(
                input.length(),
                input.width(),
                input.thickness(),
                input.youngsModulus(),
                input.density(),
                input.poissonRatio())
            .withTension(input.tensionAlong(), input.tensionAcross());
    return Double.isInfinite(input.radius())
        ? plate
        : plate.withRadius(input.youngsModulus(), input.density(), input.radius());
  }

  private static FluidFace face(AirState air) {
    return new FluidFace(air.density(), air.soundSpeed());
  }
}
