package eddyledger.present;

import eddyledger.app.ProjectState;

/** What the title bar says. */
public final class WindowTitle {
  private WindowTitle() {}

  /** Program, file and whether there is unsaved work. */
  public static String of(ProjectState state) {
    if (!state.open()) {
      return "Eddyledger";
    }
    String name =
        state
            .file()
            .map(file -> String.valueOf(file.getFileName()))
            .orElse(state.vehicle().name() + ", not saved yet");
    return name + (state.unsaved() ? ", changed" : "") + " – Eddyledger";
  }
}
