package org.foreseal.network;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.foreseal.molecule.Molecule;

/**
 * A finished network. Immutable; species and steps are numbered in an order that depends only on
 * the input.
 */
public final class Network {
  private final List<Species> species;
  private final List<Step> steps;
  private final List<Refusal> refusals;
  private final int depth;
  private final String stoppedBy;
  private final boolean cut;
  private final Map<Molecule, Species> byMolecule = new HashMap<>();
  private final List<List<Step>> makers = new ArrayList<>();

  Network(
      List<Species> species, List<Step> steps, List<Refusal> refusals, int depth, Ending ending) {
    this.species = List.copyOf(species);
    this.steps = List.copyOf(steps);
    this.refusals = List.copyOf(refusals);
    this.depth = depth;
    this.stoppedBy = ending.reason();
    this.cut = ending.isCut();
    for (Species s : species) {
      byMolecule.put(s.molecule(), s);
      makers.add(new ArrayList<>());
    }
    for (Step step : steps) {
      int[] products = step.products();
      for (int i = 0; i < products.length; i++) {
        if (i == 0 || products[i] != products[i - 1]) {
          makers.get(products[i]).add(step);
        }
      }
    }
  }

  /**
   * Why an expansion ended.
   *
   * @param reason in words
   * @param isCut whether a limit other than the depth ended it
   */
  record Ending(String reason, boolean isCut) {}

  /** All species; the id is the index. */
  public List<Species> species() {
    return species;
  }

  /** All steps; the id is the index. */
  public List<Step> steps() {
    return steps;
  }

  /** Steps that were considered and refused, the first reason for each product set and rule. */
  public List<Refusal> refusals() {
    return refusals;
  }

  /** Depths expanded. */
  public int depth() {
    return depth;
  }

  /** Why it ended: {@code depth}, {@code nothing new}, or the limit that cut it. */
  public String stoppedBy() {
    return stoppedBy;
  }

  /** Whether a limit other than the depth cut it. */
  public boolean isCut() {
    return cut;
  }

  /** The species of this structure. */
  public Optional<Species> find(Molecule molecule) {
    return Optional.ofNullable(byMolecule.get(molecule));
  }

  /** The molecules a step consumes, in the order of the rule's pieces. */
  public List<Molecule> reactantsOf(Step step) {
    return molecules(step.reactants());
  }

  /** The molecules a step forms. */
  public List<Molecule> productsOf(Step step) {
    return molecules(step.products());
  }

  private List<Molecule> molecules(int[] ids) {
    return Arrays.stream(ids).mapToObj(id -> species.get(id).molecule()).toList();
  }

  /** The steps that form this species. */
  public List<Step> makersOf(int speciesId) {
    return Collections.unmodifiableList(makers.get(speciesId));
  }
}
