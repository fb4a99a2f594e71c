package org.foreseal.run;

import java.nio.file.Path;
import java.time.Duration;
import java.util.Optional;
import java.util.OptionalInt;

/**
 * What is wanted from a forecast beside the run itself.
 *
 * @param everything whether every product is listed, however unlikely
 * @param rulesFolder the user's own rules, which add to or replace built-in ones
 * @param mostSpecies size at which the network is cut, at least 1
 * @param longest wall time after which the network is cut
 */
public record ForecastOptions(
    boolean everything,
    Optional<Path> rulesFolder,
    OptionalInt mostSpecies,
    Optional<Duration> longest) {
  /** The usual list by the built-in rules with the built-in limits. */
  public static ForecastOptions usual() {
    return new ForecastOptions(false, Optional.empty(), OptionalInt.empty(), Optional.empty());
  }
}
