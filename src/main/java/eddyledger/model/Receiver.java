package eddyledger.model;

import java.util.List;

/**
 * A place in a zone where a level is wanted.
 *
 * @param id identity
 * @param name name shown
 * @param zone id of its zone
 * @param direct panels whose direct sound is counted, with their distances; may be empty
 * @param extras unknown properties
 */
public record Receiver(
    String id, String name, String zone, List<DirectPath> direct, Extras extras) {
  public Receiver {
    direct = List.copyOf(direct);
  }

  /**
   * Line of sight from a panel to a receiver.
   *
   * @param panel id of a panel that radiates into the receiver's zone
   * @param distance distance from the panel's face, m
   * @param extras unknown properties
   */
  public record DirectPath(String panel, double distance, Extras extras) {}
}
