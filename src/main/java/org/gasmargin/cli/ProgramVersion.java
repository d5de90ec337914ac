package org.gasmargin.cli;

import picocli.CommandLine.IVersionProvider;

/** The version of the program, from the manifest of its jar. */
final class ProgramVersion implements IVersionProvider {
  @Override
  public String[] getVersion() {
    return new String[] {"gasmargin " + number()};
  }

  /** The version number alone. */
  static String number() {
    String version = ProgramVersion.class.getPackage().getImplementationVersion();
    return version == null ? "unpackaged" : version;
  }
}
