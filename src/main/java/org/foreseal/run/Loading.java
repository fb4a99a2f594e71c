package org.foreseal.run;

import java.util.Map;
import java.util.OptionalDouble;
import org.foreseal.molecule.ChemicalElement;
import org.foreseal.molecule.Molecule;
import org.foreseal.run.RunSheet.Amount;
import org.foreseal.run.RunSheet.Substrate;

/** Amounts charged, in millimoles. */
public final class Loading {
  /**
   * Abridged standard atomic weights, g/mol, from memory; a test compares each with the isotope
   * table of the cheminformatics library.
   */
  private static final Map<ChemicalElement, Double> ATOMIC_WEIGHTS =
      Map.ofEntries(
          Map.entry(ChemicalElement.H, 1.008),
          Map.entry(ChemicalElement.C, 12.011),
          Map.entry(ChemicalElement.N, 14.007),
          Map.entry(ChemicalElement.O, 15.999),
          Map.entry(ChemicalElement.F, 18.998),
          Map.entry(ChemicalElement.P, 30.974),
          Map.entry(ChemicalElement.S, 32.06),
          Map.entry(ChemicalElement.CL, 35.45),
          Map.entry(ChemicalElement.FE, 55.845),
          Map.entry(ChemicalElement.CU, 63.546),
          Map.entry(ChemicalElement.BR, 79.904),
          Map.entry(ChemicalElement.I, 126.904));

  private Loading() {}

  /** Molar mass, g/mol. */
  public static double gramsPerMole(Molecule molecule) {
    return molecule.formula().counts().entrySet().stream()
        .mapToDouble(e -> e.getValue() * ATOMIC_WEIGHTS.getOrDefault(e.getKey(), Double.NaN))
        .sum();
  }

  /**
   * Millimoles of a substrate; nothing when no amount is given or the mass of water is not known.
   */
  public static OptionalDouble millimoles(RunSheet sheet, Substrate substrate) {
    if (substrate.amount().isEmpty()) {
      return OptionalDouble.empty();
    }
    Amount amount = substrate.amount().get();
    return switch (amount.unit()) {
      case "mmol" -> OptionalDouble.of(amount.value());
      case "mg" -> OptionalDouble.of(amount.value() / gramsPerMole(substrate.molecule()));
      case "mol/kg" ->
          sheet.waterGrams().isPresent()
              ? OptionalDouble.of(amount.value() * sheet.waterGrams().getAsDouble())
              : OptionalDouble.empty();
      default -> OptionalDouble.empty();
    };
  }
}
