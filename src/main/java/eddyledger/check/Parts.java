package eddyledger.check;

import eddyledger.model.Allowance;
import eddyledger.model.Construction;
import eddyledger.model.JudgedBands;
import eddyledger.model.LayUp;
import eddyledger.model.OtherSource;
import eddyledger.model.PlateConstruction;
import eddyledger.model.TabulatedLayUp;
import eddyledger.model.Target;
import eddyledger.model.Tension;
import eddyledger.model.Vehicle;

/** The values of constructions, lay-ups, other sources, targets and allowances. */
final class Parts {
  private final Findings findings;

  private Parts(Findings findings) {
    this.findings = findings;
  }

  static void check(Vehicle vehicle, Findings findings) {
    Parts parts = new Parts(findings);
    for (int i = 0; i < vehicle.constructions().size(); i++) {
      Construction construction = vehicle.constructions().get(i);
      if (construction instanceof PlateConstruction plate) {
        parts.plate(plate, "constructions[" + i + "]");
      }
    }
    for (int i = 0; i < vehicle.layUps().size(); i++) {
      LayUp layUp = vehicle.layUps().get(i);
      if (layUp instanceof TabulatedLayUp table) {
        parts.table(table, "lay_ups[" + i + "]");
      }
    }
    for (int i = 0; i < vehicle.otherSources().size(); i++) {
      OtherSource source = vehicle.otherSources().get(i);
      String place = "other_sources[" + i + "].levels_dB";
      parts.needed(source.levels(), source.id(), place);
      findings.bands(Limit.LEVEL, source.levels(), source.id(), place);
      parts.noOctaves(source.levels(), source.id(), place);
    }
    for (int i = 0; i < vehicle.targets().size(); i++) {
      parts.target(vehicle.targets().get(i), "targets[" + i + "]");
    }
    for (int i = 0; i < vehicle.allowances().size(); i++) {
      Allowance allowance = vehicle.allowances().get(i);
      String subject = allowance.node() == null ? "" : allowance.node();
      findings.required(Limit.LEVEL, allowance.level(), subject, "allowances[" + i + "].level_dBA");
    }
  }

  private void plate(PlateConstruction plate, String place) {
    String id = plate.id();
    findings.required(Limit.THICKNESS, plate.thickness(), id, place + ".thickness_m");
    findings.required(
        Limit.YOUNGS_MODULUS, plate.youngsModulus(), id, place + ".youngs_modulus_Pa");
    findings.required(Limit.DENSITY, plate.density(), id, place + ".density_kg_per_m3");
    findings.required(Limit.POISSON, plate.poissonRatio(), id, place + ".poisson_ratio");
    findings.within(Limit.RADIUS, plate.radius(), id, place + ".radius_m");
    Tension tension = plate.tension();
    if (tension == null) {
      return;
    }
    String at = place + ".tension";
    boolean entered = tension.along() != null || tension.across() != null;
    if (entered == (tension.skinShare() != null)) {
      findings.add(
          Severity.ERROR,
          "tension",
          id,
          at,
          entered
              ? "The tension is entered and taken from the cabin's overpressure as well."
              : "The tension is neither entered nor taken from the cabin's overpressure.",
          "Give skin_share, or along_N_per_m and across_N_per_m.");
    }
    if (tension.skinShare() != null && plate.radius() == null) {
      findings.add(
          Severity.ERROR,
          "tension",
          id,
          place + ".radius_m",
          "Tension from the cabin's overpressure needs a radius, and there is none.",
          "Give the radius, or enter the tension.");
    }
    findings.judged(Limit.SHARE, tension.skinShare(), id, at + ".skin_share");
    findings.each(
        tension.along(),
        at + ".along_N_per_m",
        (value, where) -> findings.judged(Limit.TENSION, value, id, where));
    findings.each(
        tension.across(),
        at + ".across_N_per_m",
        (value, where) -> findings.judged(Limit.TENSION, value, id, where));
  }

  private void table(TabulatedLayUp table, String place) {
    needed(table.insertionLoss(), table.id(), place + ".insertion_loss_dB");
    findings.bands(Limit.LOSS, table.insertionLoss(), table.id(), place + ".insertion_loss_dB");
    findings.within(
        Limit.SURFACE_MASS,
        table.baseSurfaceMass(),
        table.id(),
        place + ".base_surface_mass_kg_per_m2");
  }

  private void target(Target target, String place) {
    if (target.receivers().isEmpty()) {
      findings.add(
          Severity.ERROR,
          "missing-value",
          target.id(),
          place + ".receivers",
          "The target names no receiver.",
          "Name at least one.");
    }
    if (target.rating() == null) {
      findings.add(
          Severity.ERROR,
          "missing-value",
          target.id(),
          place + ".rating",
          "The rating is missing.",
          "Say what is judged, for instance overall-a.");
    }
    findings.required(Limit.LEVEL, target.value(), target.id(), place + ".value");
    findings.required(Limit.RESERVE, target.reserve(), target.id(), place + ".reserve_dB");
    findings.required(
        Limit.RESERVE, target.rule().tolerance(), target.id(), place + ".pass_rule.tolerance_dB");
  }

  private void noOctaves(JudgedBands levels, String id, String place) {
    if (levels != null && levels.best().interpolated()) {
      findings.add(
          Severity.ERROR,
          "octave-levels",
          id,
          place,
          "Levels are given in octaves, which cannot be split into thirds.",
          "Give them in one-third octaves.");
    }
  }

  private void needed(Object value, String id, String place) {
    if (value == null) {
      findings.add(
          Severity.ERROR,
          "missing-value",
          id,
          place,
          "The band values are missing.",
          "Give 28 third-octave values, or octaves, or one number.");
    }
  }
}
