package eddyledger.command;

import picocli.CommandLine.IVersionProvider;

/** The version of the program, from the jar it runs from. */
final class Version implements IVersionProvider {
  @Override
  public String[] getVersion() {
    String version = Version.class.getPackage().getImplementationVersion();
    return new String[] {"Eddyledger " + (version == null ? "(not packaged)" : version)};
  }
}
