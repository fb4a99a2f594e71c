package org.foreseal.network;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.foreseal.molecule.ChemicalElement;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Outcome;
import org.foreseal.molecule.Transformation;
import org.foreseal.rule.AmbientSpecies;
import org.foreseal.rule.Guard;
import org.foreseal.rule.NearMiss;
import org.foreseal.rule.Rule;
import org.foreseal.rule.RuleLibrary;
import org.foreseal.rule.SpeciesLimit;
import org.foreseal.rule.Surroundings;

/**
 * One rule at work. It keeps, for each of its reactant pieces, the species that hold a site for it,
 * and combines only those; a rule whose needs are not met is tried on the charge alone, so that the
 * reader learns what is missing.
 */
final class RuleTask {
  private final Rule rule;
  private final Surroundings surroundings;
  private final Limits limits;
  private final RuleLibrary library;
  private final Optional<String> closed;
  private final List<List<Integer>> candidates = new ArrayList<>();
  private int scanned;

  RuleTask(Rule rule, Surroundings surroundings, Limits limits, RuleLibrary library) {
    this.rule = rule;
    this.surroundings = surroundings;
    this.limits = limits;
    this.library = library;
    closed = rule.closedBecause(surroundings);
    for (int i = 0; i < rule.transformation().reactantCount(); i++) {
      candidates.add(new ArrayList<>());
    }
  }

  /** What one rule found at one depth. */
  static final class Found {
    private final List<Proposal> proposals = new ArrayList<>();
    private final List<Refusal> refusals = new ArrayList<>();
    private int tried;
    private boolean overBudget;
    private boolean outOfTime;

    List<Proposal> proposals() {
      return proposals;
    }

    List<Refusal> refusals() {
      return refusals;
    }

    boolean isOverBudget() {
      return overBudget;
    }

    boolean isOutOfTime() {
      return outOfTime;
    }
  }

  Found run(DepthView view) {
    Found found = new Found();
    boolean first = scanned == 0;
    if (closed.isPresent() && !first) {
      return found;
    }
    scan(view);
    combine(view, 0, new int[candidates.size()], false, found);
    if (first) {
      rule.nearMisses().forEach(miss -> tryNearMiss(view, miss, found));
    }
    return found;
  }

  private void scan(DepthView view) {
    for (int id = scanned; id < view.size(); id++) {
      Molecule m = view.species(id).molecule();
      for (int piece = 0; piece < candidates.size(); piece++) {
        if (rule.transformation().hasSite(piece, m)) {
          candidates.get(piece).add(id);
        }
      }
    }
    scanned = view.size();
  }

  /** All combinations that hold at least one species of the last depth. */
  private void combine(DepthView view, int piece, int[] chosen, boolean holdsNew, Found found) {
    if (found.overBudget || found.outOfTime) {
      return;
    }
    if (piece == chosen.length) {
      if (holdsNew) {
        attempt(view, chosen.clone(), found);
      }
      return;
    }
    boolean last = piece == chosen.length - 1;
    for (int id : candidates.get(piece)) {
      boolean isNew = id >= view.firstNew();
      if (last && !holdsNew && !isNew) {
        continue;
      }
      chosen[piece] = id;
      if (meets(view, chosen, piece)) {
        combine(view, piece + 1, chosen, holdsNew || isNew, found);
      }
    }
  }

  /** Whether the last chosen species can meet those chosen before it. */
  private static boolean meets(DepthView view, int[] chosen, int piece) {
    Species now = view.species(chosen[piece]);
    for (int i = 0; i < piece; i++) {
      Species earlier = view.species(chosen[i]);
      boolean oneIsCharged = now.depth() == 0 || earlier.depth() == 0;
      if (!oneIsCharged
          && Math.max(now.depth(), earlier.depth()) > 1
          && !isAmbient(now)
          && !isAmbient(earlier)) {
        return false;
      }
    }
    return true;
  }

  private static boolean isAmbient(Species s) {
    return AmbientSpecies.includes(s.molecule());
  }

  private void attempt(DepthView view, int[] chosen, Found found) {
    if (++found.tried > limits.pairsPerRule()) {
      found.overBudget = true;
      return;
    }
    if ((found.tried & 63) == 0 && view.isOutOfTime()) {
      found.outOfTime = true;
      return;
    }
    List<Molecule> reactants =
        Arrays.stream(chosen).mapToObj(id -> view.species(id).molecule()).toList();
    if (rule.pairs(reactants) && isWorthApplying(view, chosen, reactants)) {
      int depth = Arrays.stream(chosen).map(id -> view.species(id).depth()).max().orElse(0) + 1;
      for (Outcome outcome : rule.transformation().apply(reactants)) {
        consider(view, new Proposal(rule, chosen, shared(view, outcome)), reactants, depth, found);
      }
    }
  }

  /**
   * A guard that looks at reactants only is asked before the reaction is carried out. Where it
   * refuses, the products are still worked out for the list of what was ruled out when all partners
   * are part of the charge or a single one is at most one step away from it; refused meetings
   * further on are countless and interest nobody.
   */
  private boolean isWorthApplying(DepthView view, int[] chosen, List<Molecule> reactants) {
    int partners = 0;
    int deepest = 0;
    for (int id : chosen) {
      Species s = view.species(id);
      if (!isAmbient(s)) {
        partners++;
        deepest = Math.max(deepest, s.depth());
      }
    }
    boolean near = deepest == 0 || (partners == 1 && deepest == 1);
    return near || !rule.refusesReactants(reactants, surroundings);
  }

  private static Outcome shared(DepthView view, Outcome outcome) {
    return new Outcome(
        outcome.products().stream().map(view::shared).toList(), outcome.atomMap(), outcome.sites());
  }

  private void consider(
      DepthView view, Proposal proposal, List<Molecule> reactants, int depth, Found found) {
    if (isNoChange(reactants, proposal.products())) {
      return;
    }
    Optional<Refusal> refusal = refusal(view, reactants, proposal.products(), depth);
    if (refusal.isPresent()) {
      found.refusals.add(refusal.get());
    } else {
      found.proposals.add(proposal);
    }
  }

  private static boolean isNoChange(List<Molecule> reactants, List<Molecule> products) {
    return reactants.stream().sorted().toList().equals(products.stream().sorted().toList());
  }

  private Optional<Refusal> refusal(
      DepthView view, List<Molecule> reactants, List<Molecule> products, int depth) {
    if (closed.isPresent()) {
      return Optional.of(refused(reactants, products, Refusal.Kind.NEED, closed.get(), "", depth));
    }
    Optional<Guard> guard = rule.refusedBy(new Guard.Attempt(reactants, products, surroundings));
    if (guard.isPresent()) {
      return Optional.of(
          refused(reactants, products, Refusal.Kind.GUARD, guard.get().reason(), "", depth));
    }
    for (SpeciesLimit limit : library.speciesLimits()) {
      for (Molecule p : products) {
        if (limit.pattern().isIn(p)) {
          return Optional.of(
              refused(reactants, products, Refusal.Kind.GUARD, limit.reason(), "", depth));
        }
      }
    }
    Optional<String> size = tooLarge(products);
    if (size.isPresent()) {
      return Optional.of(refused(reactants, products, Refusal.Kind.LIMIT, size.get(), "", depth));
    }
    if (view.pruner().judge(reactants, products) instanceof Verdict.Pruned p) {
      return Optional.of(
          refused(reactants, products, Refusal.Kind.GIBBS, p.reason(), p.detail(), depth));
    }
    return Optional.empty();
  }

  private Optional<String> tooLarge(List<Molecule> products) {
    for (Molecule p : products) {
      if (p.heavyAtomCount() > limits.heavyAtoms()) {
        return Optional.of("larger than " + limits.heavyAtoms() + " heavy atoms");
      }
      if (p.formula().count(ChemicalElement.C) > limits.carbons()) {
        return Optional.of("larger than " + limits.carbons() + " carbon atoms");
      }
    }
    return Optional.empty();
  }

  private Refusal refused(
      List<Molecule> reactants,
      List<Molecule> products,
      Refusal.Kind kind,
      String reason,
      String detail,
      int depth) {
    return new Refusal(rule, reactants, products, kind, reason, detail, depth);
  }

  /** Near misses are looked for among the charge only: they explain what will not be seen. */
  private void tryNearMiss(DepthView view, NearMiss miss, Found found) {
    Transformation t = miss.transformation();
    List<Molecule> charge = new ArrayList<>();
    for (int id = 0; id < view.size(); id++) {
      charge.add(view.species(id).molecule());
    }
    Set<List<Molecule>> tried = new HashSet<>();
    for (Molecule a : charge) {
      for (Molecule b : t.reactantCount() == 1 ? List.of(a) : charge) {
        List<Molecule> reactants = t.reactantCount() == 1 ? List.of(a) : List.of(a, b);
        if (rule.pairs(reactants) && tried.add(reactants)) {
          for (Outcome o : t.apply(reactants)) {
            found.refusals.add(
                refused(reactants, o.products(), Refusal.Kind.NEAR_MISS, miss.reason(), "", 1));
          }
        }
      }
    }
  }
}
