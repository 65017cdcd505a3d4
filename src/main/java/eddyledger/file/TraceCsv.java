package eddyledger.file;

import eddyledger.ledger.Trace;
import eddyledger.ledger.TraceBands;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Decibels;
import java.util.List;

/** The bands of a trace as a table of comma-separated values, one row per band. */
public final class TraceCsv {
  private static final List<String> COLUMNS =
      List.of(
          "band",
          "x",
          "wall_pressure_psd_Pa2_per_Hz",
          "wall_pressure_band_dB",
          "convection_speed_m_per_s",
          "velocity_squared_m2_per_s2",
          "radiated_power_W",
          "insertion_loss_dB",
          "zone_power_W",
          "receiver_pressure_squared_Pa2",
          "level_dB");

  private TraceCsv() {}

  /** The table, header first; without a value the header alone. */
  public static String text(Trace trace) {
    CsvText csv = new CsvText().line(COLUMNS);
    if (!trace.hasValue()) {
      return csv.toString();
    }
    TraceBands bands = trace.bands();
    for (int band = 0; band < Bands.COUNT; band++) {
      double meanSquare = bands.meanSquare().value(band);
      csv.line(
          List.of(
              Bands.label(band),
              Integer.toString(Bands.index(band)),
              CsvText.number(bands.wallPressureDensity().value(band)),
              CsvText.number(Decibels.pressureLevel(bands.wallPressure().value(band))),
              CsvText.number(bands.convectionSpeed().value(band)),
              CsvText.number(bands.velocitySquared().value(band)),
              CsvText.number(bands.radiatedPower().value(band)),
              CsvText.number(bands.insertionLoss().value(band)),
              CsvText.number(bands.zonePower().value(band)),
              CsvText.number(meanSquare),
              CsvText.number(Decibels.pressureLevel(meanSquare))));
    }
    return csv.toString();
  }
}
