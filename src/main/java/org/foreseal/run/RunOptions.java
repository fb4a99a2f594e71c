package org.foreseal.run;

import java.time.Duration;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;

/**
 * A run, or changes to a run sheet, as written on the command line. Every quantity carries its
 * unit.
 *
 * @param substrates name or SMILES, optionally {@code =AMOUNT}; when any is given they replace
 *     those of the sheet
 * @param solids what one run holds each, side by side: {@code NAME[ROLES]=MASS,SURFACE}, joined by
 *     {@code +}; {@code none} for a run without solid; when any is given they replace those of the
 *     sheet
 * @param additives {@code NAME[ROLES]=AMOUNT}; when any is given they replace those of the sheet
 * @param temperature such as {@code 260C}, {@code 533K}, {@code 260C,300C}, {@code 260..300C}
 * @param pressure such as {@code 300bar}
 * @param time such as {@code 48h}
 * @param solvent water or none
 * @param water such as {@code 0.25g}
 * @param hydrogen a buffer, {@code 2bar}, or {@code run}
 * @param acidity pH at 25 C
 * @param depth steps from the charge
 * @param seed random seed
 */
public record RunOptions(
    List<String> substrates,
    List<String> solids,
    List<String> additives,
    Optional<String> temperature,
    Optional<String> pressure,
    Optional<String> time,
    Optional<String> solvent,
    Optional<String> water,
    Optional<String> hydrogen,
    Optional<String> acidity,
    OptionalLong depth,
    OptionalLong seed) {
  /** Keeps unmodifiable copies. */
  public RunOptions {
    substrates = List.copyOf(substrates);
    solids = List.copyOf(solids);
    additives = List.copyOf(additives);
  }

  /** A span of time given to an option, with its unit. */
  public static Duration duration(String option, String text) {
    double seconds = Measures.seconds(text, OptionReader.at(option, text));
    return Duration.ofMillis(Math.max(1, Math.round(seconds * 1000)));
  }
}
