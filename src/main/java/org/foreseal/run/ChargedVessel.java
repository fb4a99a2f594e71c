package org.foreseal.run;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.foreseal.molecule.ChemicalElement;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Pattern;
import org.foreseal.rule.AmbientSpecies;
import org.foreseal.rule.Provision;
import org.foreseal.rule.Surroundings;

/**
 * What stands in the vessel at the start of a run, as the rules see it: the molecules put in, the
 * small ones that are always about, and what solids, additives, medium and temperature offer.
 *
 * <p>Hydrogen is always offered, since every organic run makes some; the ranking asks how much. A
 * carboxylic acid among the substrates makes the run acid. Air is an oxidant too, and water among
 * the additives counts as water. Homolysis opens above {@link #HOMOLYSIS_CELSIUS}.
 *
 * @param surroundings what the rules are told
 * @param molecules the molecules at the start, substrates first
 */
public record ChargedVessel(Surroundings surroundings, List<Molecule> molecules) {
  /**
   * Temperature above which carbon-carbon bonds of about 300 kJ/mol break at a rate that matters, C
   * (common practice).
   */
  public static final double HOMOLYSIS_CELSIUS = 330;

  private static final Pattern CARBOXYLIC_ACID = Pattern.of("C(=O)[OX2H1]");

  /** Keeps an unmodifiable copy. */
  public ChargedVessel {
    molecules = List.copyOf(molecules);
  }

  /** The start of this run. */
  public static ChargedVessel of(RunSheet sheet) {
    Set<Molecule> charged = new LinkedHashSet<>();
    sheet.substrates().forEach(s -> charged.add(s.molecule()));
    sheet.additives().forEach(a -> a.molecule().ifPresent(charged::add));
    Set<Provision> offered = offered(sheet, charged);
    List<Double> temperatures = sheet.temperatureCelsius();
    Surroundings surroundings =
        new Surroundings(
            offered, charged, temperatures.get(0), temperatures.get(temperatures.size() - 1));
    Set<Molecule> all = new LinkedHashSet<>(charged);
    all.addAll(ambient(offered, charged));
    return new ChargedVessel(surroundings, new ArrayList<>(all));
  }

  private static Set<Provision> offered(RunSheet sheet, Set<Molecule> charged) {
    Set<Provision> offered = EnumSet.of(Provision.HYDROGEN);
    sheet.solids().forEach(s -> offered.addAll(s.roles()));
    sheet.additives().forEach(a -> offered.addAll(a.roles()));
    if (offered.contains(Provision.AIR)) {
      offered.add(Provision.OXIDANT);
    }
    if (sheet.inWater() || charged.contains(AmbientSpecies.WATER)) {
      offered.add(Provision.WATER);
    }
    if (charged.stream().anyMatch(CARBOXYLIC_ACID::isIn)) {
      offered.add(Provision.ACID);
    }
    List<Double> temperatures = sheet.temperatureCelsius();
    if (temperatures.get(temperatures.size() - 1) > HOMOLYSIS_CELSIUS) {
      offered.add(Provision.HOMOLYSIS);
    }
    return offered;
  }

  private static List<Molecule> ambient(Set<Provision> offered, Set<Molecule> charged) {
    List<Molecule> result = new ArrayList<>();
    if (offered.contains(Provision.WATER)) {
      result.add(AmbientSpecies.WATER);
    }
    result.add(AmbientSpecies.HYDROGEN);
    if (holds(charged, ChemicalElement.N)) {
      result.add(AmbientSpecies.AMMONIA);
    }
    if (holds(charged, ChemicalElement.S) || offered.contains(Provision.SULFIDE)) {
      result.add(AmbientSpecies.HYDROGEN_SULFIDE);
    }
    if (offered.contains(Provision.AIR)) {
      result.add(AmbientSpecies.OXYGEN);
    }
    return result;
  }

  private static boolean holds(Set<Molecule> molecules, ChemicalElement element) {
    return molecules.stream().anyMatch(m -> m.formula().count(element) > 0);
  }
}
