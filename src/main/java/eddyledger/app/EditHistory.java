package eddyledger.app;

import eddyledger.model.Vehicle;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Optional;

/**
 * What was done and can be undone, without limit. Vehicles share whatever an edit did not touch, so
 * a step costs little.
 */
final class EditHistory {
  /** One step with the vehicle before and after it. */
  record Step(String label, String mergeKey, String subject, Vehicle before, Vehicle after) {}

  private final Deque<Step> done = new ArrayDeque<>();
  private final Deque<Step> undone = new ArrayDeque<>();

  /** Adds a step; what was undone before is gone. */
  void add(Edit edit, Vehicle before, Vehicle after) {
    undone.clear();
    Step last = done.peek();
    boolean merges =
        last != null && !edit.mergeKey().isEmpty() && last.mergeKey().equals(edit.mergeKey());
    if (merges) {
      done.pop();
    }
    Vehicle from = merges ? last.before() : before;
    if (!from.equals(after)) {
      done.push(new Step(edit.label(), edit.mergeKey(), edit.subject(), from, after));
    }
  }

  /** Ends merging: the next edit is a step of its own, whatever its key. */
  void close() {
    Step last = done.peek();
    if (last != null && !last.mergeKey().isEmpty()) {
      done.pop();
      done.push(new Step(last.label(), "", last.subject(), last.before(), last.after()));
    }
  }

  /** The step that undo would take back. */
  Optional<Step> undoable() {
    return Optional.ofNullable(done.peek());
  }

  /** The step that redo would do again. */
  Optional<Step> redoable() {
    return Optional.ofNullable(undone.peek());
  }

  /** Takes a step back. */
  Step undo() {
    Step step = done.pop();
    undone.push(step);
    return step;
  }

  /** Does a step again. */
  Step redo() {
    Step step = undone.pop();
    done.push(step);
    return step;
  }
}
