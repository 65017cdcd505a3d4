package eddyledger.chart;

import eddyledger.ledger.Judgement;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.State;
import eddyledger.ledger.Status;
import eddyledger.ledger.Way;
import eddyledger.model.Extras;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Receiver;
import eddyledger.quantity.AWeighting;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Decibels;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * A sheet written row by row. Every row has the same A-weighted level in every band, so that shares
 * are seen at once; the total is summed from the rows at its top.
 */
final class SmallSheet {
  static final String TOTAL = "van";

  private final List<LedgerRow> rows = new ArrayList<>();

  /** Mean squares with one A-weighted level in all bands, in energies of 1 = 60 dB(A) a band. */
  static BandSpectrum energy(double energy) {
    double[] values = new double[Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      double a = AWeighting.weights().value(band);
      values[band] = energy * Decibels.meanSquarePressure(60.0 - a);
    }
    return BandSpectrum.of(values);
  }

  static BandSpectrum nothing() {
    double[] values = new double[Bands.COUNT];
    Arrays.fill(values, Double.NaN);
    return BandSpectrum.of(values);
  }

  SmallSheet section(String id, String parent, double energy) {
    return row(id, parent, RowKind.SECTION, Way.ALL, energy(energy), Status.OK, "");
  }

  SmallSheet panel(String id, String parent, double energy) {
    row(id, parent, RowKind.PANEL, Way.ALL, energy(energy), Status.OK, "");
    return row(id, parent, RowKind.PANEL, Way.BOUNDARY_LAYER, energy(energy), Status.OK, "");
  }

  SmallSheet leak(String id, String parent, double energy) {
    row(id, parent, RowKind.PANEL, Way.ALL, energy(energy), Status.OK, "");
    row(id, parent, RowKind.PANEL, Way.BOUNDARY_LAYER, energy(0.0), Status.OK, "");
    return row(id, parent, RowKind.PANEL, Way.LEAK, energy(energy), Status.OK, "");
  }

  SmallSheet other(String id, double energy) {
    return row(id, TOTAL, RowKind.OTHER, Way.ALL, energy(energy), Status.OK, "");
  }

  SmallSheet missing(String id, String parent, String reason) {
    return row(id, parent, RowKind.PANEL, Way.ALL, nothing(), Status.MISSING, reason);
  }

  SmallSheet row(
      String id, String parent, RowKind kind, Way way, BandSpectrum ms, Status status, String why) {
    String name = Character.toUpperCase(id.charAt(0)) + id.substring(1);
    rows.add(
        new LedgerRow(id, parent, 1, name, kind, way, "chosen", ms, Judgement.NONE, status, why));
    return this;
  }

  /** The sheet without a target. */
  ReceiverSheet sheet(Status status) {
    return sheet(status, Judgement.NONE);
  }

  /** The sheet with an allowed level and a state. */
  ReceiverSheet sheet(Status status, double allowed, State state) {
    double margin = allowed - total(status, Judgement.NONE).levelA();
    return sheet(status, new Judgement(allowed, 0.0, allowed, margin, state));
  }

  private ReceiverSheet sheet(Status status, Judgement judgement) {
    List<LedgerRow> all = new ArrayList<>();
    all.add(total(status, judgement));
    all.addAll(rows);
    OperatingCondition road =
        new OperatingCondition(
            "road", "Road", null, null, null, null, null, null, null, null, null, Extras.NONE);
    Receiver driver = new Receiver("driver", "Driver", "cabin", List.of(), Extras.NONE);
    return new ReceiverSheet(road, driver, all, List.of());
  }

  private LedgerRow total(Status status, Judgement judgement) {
    List<LedgerRow> top =
        rows.stream().filter(row -> row.parent().equals(TOTAL) && row.way() == Way.ALL).toList();
    BandSpectrum sum = Energies.sum(top);
    return new LedgerRow(
        TOTAL, "", 0, "Van", RowKind.TOTAL, Way.ALL, "chosen", sum, judgement, status, "");
  }
}
