package eddyledger.app;

import eddyledger.model.BandTable;
import eddyledger.model.JudgedBands;
import eddyledger.model.OtherSource;
import eddyledger.model.Panel;
import eddyledger.model.Section;
import eddyledger.model.TreeEdit;
import eddyledger.model.Vehicle;
import eddyledger.quantity.BandSpectrum;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;

/** Changes to what a row is called and made of, beside its settings. */
public final class RowEdit {
  private RowEdit() {}

  /** The vehicle with a panel, section, other source or the vehicle itself renamed. */
  public static Vehicle rename(Vehicle vehicle, String id, String name) {
    if (vehicle.id().equals(id)) {
      return vehicle.edit().name(name).build();
    }
    if (source(vehicle, id).isPresent()) {
      return source(
          vehicle,
          id,
          it ->
              new OtherSource(
                  it.id(), name, it.receiver(), it.condition(), it.levels(), it.extras()));
    }
    return TreeEdit.change(
        vehicle,
        id,
        node ->
            node instanceof Panel panel ? panel.withName(name) : ((Section) node).withName(name));
  }

  /** The vehicle with another number of identical pieces of a panel. */
  public static Vehicle count(Vehicle vehicle, String panel, int count) {
    return TreeEdit.change(
        vehicle, panel, node -> node instanceof Panel it ? it.withCount(count) : node);
  }

  /** The other source of an id; empty if there is none. */
  public static Optional<OtherSource> source(Vehicle vehicle, String id) {
    return vehicle.otherSources().stream().filter(it -> id.equals(it.id())).findFirst();
  }

  /**
   * The vehicle with the level of one band of an other source changed.
   *
   * @param band position 0 .. 27
   * @param level unweighted level, dB re 20 µPa; NaN for a missing one
   */
  public static Vehicle bandLevel(Vehicle vehicle, String source, int band, double level) {
    return source(
        vehicle,
        source,
        it -> {
          JudgedBands levels = it.levels();
          double[] values = levels.best().spectrum().toArray();
          values[band] = level;
          BandTable thirds = BandTable.thirds(BandSpectrum.of(values));
          BandTable best =
              new BandTable(
                  thirds.resolution(),
                  thirds.first(),
                  thirds.values(),
                  levels.best().quantity(),
                  levels.best().unit(),
                  levels.best().extras());
          return new OtherSource(
              it.id(),
              it.name(),
              it.receiver(),
              it.condition(),
              new JudgedBands(best, levels.low(), levels.high(), levels.evidence()),
              it.extras());
        });
  }

  private static Vehicle source(Vehicle vehicle, String id, UnaryOperator<OtherSource> change) {
    List<OtherSource> all =
        vehicle.otherSources().stream()
            .map(it -> it.id().equals(id) ? change.apply(it) : it)
            .toList();
    return vehicle.edit().otherSources(all).build();
  }
}
