package eddyledger.present;

import java.util.ArrayList;
import java.util.List;

/** Who wants to be told that there is something new to show. */
final class Listeners {
  private final List<Runnable> all = new ArrayList<>();

  void add(Runnable listener) {
    all.add(listener);
  }

  void tell() {
    List.copyOf(all).forEach(Runnable::run);
  }
}
