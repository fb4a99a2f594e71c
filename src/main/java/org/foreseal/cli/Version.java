package org.foreseal.cli;

import java.util.Optional;
import org.foreseal.run.ToolInfo;
import picocli.CommandLine.IVersionProvider;

/** The version of the jar; classes run outside a jar have none. */
final class Version implements IVersionProvider {
  /** Name and version. */
  @Override
  public String[] getVersion() {
    return new String[] {ToolInfo.NAME + " " + text()};
  }

  static String text() {
    return Optional.ofNullable(Version.class.getPackage().getImplementationVersion())
        .orElse("unpackaged");
  }
}
