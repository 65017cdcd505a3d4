package eddyledger.app;

import eddyledger.model.Held;
import eddyledger.model.Vehicle;
import java.util.Optional;

/**
 * A place in the vehicle that holds one value: how it is read, set, and given back to whatever
 * holds without it. Pure: every change gives a new vehicle.
 *
 * @param <T> what the value is
 */
public interface Slot<T> {
  /** The value that holds there, with the place that sets it; empty if nothing does. */
  Optional<Held<T>> read(Vehicle vehicle);

  /** The vehicle with the value set there. */
  Vehicle write(Vehicle vehicle, T value);

  /** The vehicle without the place's own value; as it was if it has none. */
  Vehicle back(Vehicle vehicle);
}
