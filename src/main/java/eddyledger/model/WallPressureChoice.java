package eddyledger.model;

/**
 * Which wall-pressure spectrum is used, and between which ones the truth is thought to lie.
 *
 * @param model id of the chosen spectrum, for instance {@code goody}
 * @param low id of the spectrum taken as the least, null if not judged
 * @param high id of the spectrum taken as the most, null if not judged
 * @param evidence why it was chosen
 * @param extras unknown properties
 */
public record WallPressureChoice(
    String model, String low, String high, Evidence evidence, Extras extras) {

  /** A choice without low and high. */
  public static WallPressureChoice of(String model) {
    return new WallPressureChoice(model, null, null, Evidence.NONE, Extras.NONE);
  }
}
