package org.foreseal.rule;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;

/**
 * What a run can offer a reaction: the roles of its solids and additives, and what the medium
 * brings. The words are those of the run sheet ({@code acts_as}) and of the rule files ({@code
 * needs}).
 */
public enum Provision {
  /** Liquid or supercritical water. */
  WATER,
  /** Any oxide surface. */
  OXIDE,
  /** An oxide of the spinel structure. */
  SPINEL_TYPE,
  /** An oxide of the corundum structure. */
  CORUNDUM_TYPE,
  /** An iron-bearing or otherwise redox-active mineral. */
  IRON_BEARING,
  /** Fe(III), Cu(II) or another oxidant in solution. */
  OXIDANT,
  /** A reductant other than hydrogen. */
  REDUCTANT,
  /** A sulfide mineral. */
  SULFIDE,
  /** A metal such as Ni, Pt, Pd, Ru, Cu. */
  METAL,
  /** A Broensted or Lewis acid. */
  ACID,
  /** A base. */
  BASE,
  /** Hydrogen, added or made in the run. */
  HYDROGEN,
  /** A hydrogen donor such as formic acid or tetralin. */
  HYDROGEN_DONOR,
  /** A surface that takes up water. */
  DEHYDRATING,
  /** Air or dioxygen. */
  AIR,
  /** Temperature enough for C-C homolysis, above about 330 C. */
  HOMOLYSIS,
  /** Something that only fills space. */
  INERT;

  /** The word of the run sheet and the rule files. */
  public String word() {
    return name().toLowerCase(Locale.ROOT).replace('_', '-');
  }

  /** The provision of this word, whatever its case. */
  public static Optional<Provision> of(String word) {
    String wanted = word.strip().toLowerCase(Locale.ROOT);
    return Arrays.stream(values()).filter(p -> p.word().equals(wanted)).findFirst();
  }
}
