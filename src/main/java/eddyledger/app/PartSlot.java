package eddyledger.app;

import eddyledger.model.Held;
import eddyledger.model.Vehicle;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Function;

/**
 * One part of a setting that is inherited as a whole. Setting a part gives the node a copy of the
 * whole; when the last part that differs is given back, the copy goes.
 *
 * @param <W> what the whole is
 * @param <T> what the part is
 * @param whole the whole setting
 * @param get reads the part; null where it is not given
 * @param put the whole with the part changed; null takes it away
 * @param blank the whole where nothing holds yet
 * @param essence what of the whole counts when two are compared
 */
public record PartSlot<W, T>(
    VaryingSlot<W> whole,
    Function<W, T> get,
    BiFunction<W, T, W> put,
    W blank,
    Function<W, Object> essence)
    implements Slot<T> {

  @Override
  public Optional<Held<T>> read(Vehicle vehicle) {
    return whole
        .read(vehicle)
        .filter(held -> get.apply(held.value()) != null)
        .map(held -> held(held, get.apply(held.value())));
  }

  private static <T> Held<T> held(Held<?> like, T value) {
    return new Held<>(value, like.holder(), like.own(), like.override());
  }

  @Override
  public Vehicle write(Vehicle vehicle, T value) {
    W now = whole.read(vehicle).map(Held::value).orElse(blank);
    return whole.write(vehicle, put.apply(now, value));
  }

  @Override
  public Vehicle back(Vehicle vehicle) {
    Optional<Held<W>> now = whole.read(vehicle);
    if (now.isEmpty() || !now.get().own()) {
      return vehicle;
    }
    Vehicle without = whole.back(vehicle);
    W above = whole.read(without).map(Held::value).orElse(blank);
    W mixed = put.apply(now.get().value(), get.apply(above));
    return essence.apply(mixed).equals(essence.apply(above))
        ? without
        : whole.write(vehicle, mixed);
  }

  /** Whether nothing of the whole would be given without this part. */
  public boolean last(Vehicle vehicle) {
    W now = whole.read(vehicle).map(Held::value).orElse(blank);
    return essence.apply(put.apply(now, null)).equals(essence.apply(blank));
  }
}
