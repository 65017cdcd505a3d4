package eddyledger.window;

import eddyledger.model.Extras;
import eddyledger.model.Receiver;
import eddyledger.model.Vehicle;
import java.util.ArrayList;
import java.util.List;

/** Variations of the example to be looked at. */
final class RegionVehicles {
  private RegionVehicles() {}

  /** With more receivers than the strip has room for, one of a long name, none with a target. */
  static Vehicle many(Vehicle vehicle) {
    List<Receiver> receivers = new ArrayList<>(vehicle.receivers());
    for (int seat : new int[] {4, 7, 11, 14}) {
      receivers.add(
          new Receiver(
              "seat-" + seat,
              "Seat " + seat + " at the aisle beside the forward galley door",
              "cabin-middle",
              List.of(),
              Extras.NONE));
    }
    return vehicle.edit().receivers(receivers).build();
  }
}
