package eddyledger.present;

import eddyledger.app.ConstructionEdit;
import eddyledger.app.FixedSlot;
import eddyledger.app.Slot;
import eddyledger.model.Held;
import eddyledger.model.Vehicle;
import java.util.Optional;

/** The construction of a node; a copy that nobody uses any more goes with another choice. */
record ConstructionSlot(FixedSlot<String> plain) implements Slot<String> {
  @Override
  public Optional<Held<String>> read(Vehicle vehicle) {
    return plain.read(vehicle);
  }

  @Override
  public Vehicle write(Vehicle vehicle, String construction) {
    return ConstructionEdit.choose(vehicle, plain.node(), construction);
  }

  @Override
  public Vehicle back(Vehicle vehicle) {
    return ConstructionEdit.choose(vehicle, plain.node(), null);
  }
}
