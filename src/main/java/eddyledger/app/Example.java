package eddyledger.app;

/**
 * An example that comes with the program.
 *
 * @param id id of its vehicle, and the name of its file without the ending
 * @param title name shown
 * @param sentence what it is about
 * @param holds what it holds, in numbers
 * @param drawing which line drawing stands for it
 */
public record Example(String id, String title, String sentence, String holds, Drawing drawing) {

  /** Line drawings of kinds of vehicle. */
  public enum Drawing {
    /** An aircraft. */
    AIRCRAFT,
    /** No vehicle in particular. */
    SPECTRUM
  }
}
