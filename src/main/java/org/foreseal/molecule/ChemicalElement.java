package org.foreseal.molecule;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/**
 * The elements a molecule of this project can hold, with the neutral valences the valence check
 * allows and the mass of the most abundant isotope.
 *
 * <p>Masses (Da) are from memory of the 2020 atomic mass evaluation; a test compares each with the
 * isotope table of the cheminformatics library. Copper and iron occur only in the redox bookkeeping
 * rules.
 */
public enum ChemicalElement {
  /** Hydrogen; an atom of its own only in H2 and the proton. */
  H(1, 1.00782503, 1),
  /** Carbon. */
  C(6, 12.0, 4),
  /** Nitrogen. */
  N(7, 14.0030740, 3),
  /** Oxygen. */
  O(8, 15.9949146, 2),
  /** Fluorine. */
  F(9, 18.9984032, 1),
  /** Phosphorus. */
  P(15, 30.9737620, 3, 5),
  /** Sulfur. */
  S(16, 31.9720712, 2, 4, 6),
  /** Chlorine. */
  CL(17, 34.9688527, 1),
  /** Iron, as an ion only. */
  FE(26, 55.9349363),
  /** Copper, as an ion only. */
  CU(29, 62.9295977),
  /** Bromine. */
  BR(35, 78.9183376, 1),
  /** Iodine. */
  I(53, 126.9044719, 1);

  private static final @Nullable ChemicalElement[] BY_NUMBER = byNumber();

  private final int atomicNumber;
  private final double monoisotopicMassDalton;
  private final int valenceBits;

  ChemicalElement(int atomicNumber, double monoisotopicMassDalton, int... valences) {
    this.atomicNumber = atomicNumber;
    this.monoisotopicMassDalton = monoisotopicMassDalton;
    this.valenceBits = Arrays.stream(valences).map(v -> 1 << v).sum();
  }

  /** Atomic number. */
  public int atomicNumber() {
    return atomicNumber;
  }

  /** Mass of the most abundant isotope, Da. */
  public double monoisotopicMassDalton() {
    return monoisotopicMassDalton;
  }

  /** Symbol as written in a formula. */
  public String symbol() {
    return name().length() == 1
        ? name()
        : name().charAt(0) + name().substring(1).toLowerCase(Locale.ROOT);
  }

  /** True for the elements an input molecule may hold: C H N O S P F Cl Br I. */
  public boolean isAllowedInInput() {
    return this != FE && this != CU;
  }

  /**
   * Whether an atom of this element with this charge can carry bonds of this total order. A charge
   * of +1 on N, O, P, S adds one bond and a charge of -1 takes one away; a charged carbon has
   * three.
   */
  boolean allowsValence(int charge, int totalOrder) {
    if (valenceBits == 0) {
      return totalOrder == 0;
    }
    if (this == H) {
      return totalOrder == (charge == 0 ? 1 : 0);
    }
    int shift = this == C ? -Math.abs(charge) : charge;
    int neutral = totalOrder - shift;
    return neutral >= 0 && (valenceBits >> neutral & 1) == 1;
  }

  /** The element with this atomic number, if this project knows it. */
  public static Optional<ChemicalElement> of(int atomicNumber) {
    return atomicNumber >= 0 && atomicNumber < BY_NUMBER.length
        ? Optional.ofNullable(BY_NUMBER[atomicNumber])
        : Optional.empty();
  }

  /** The element with this atomic number, which must be one of this enumeration. */
  public static ChemicalElement require(int atomicNumber) {
    ChemicalElement element =
        atomicNumber >= 0 && atomicNumber < BY_NUMBER.length ? BY_NUMBER[atomicNumber] : null;
    if (element == null) {
      throw new IllegalArgumentException("no such element here: atomic number " + atomicNumber);
    }
    return element;
  }

  private static @Nullable ChemicalElement[] byNumber() {
    @Nullable ChemicalElement[] table = new ChemicalElement[I.atomicNumber + 1];
    for (ChemicalElement e : values()) {
      table[e.atomicNumber] = e;
    }
    return table;
  }
}
