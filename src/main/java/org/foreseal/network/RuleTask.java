package org.foreseal.network;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.Callable;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Outcome;
import org.foreseal.molecule.Transformation;
import org.foreseal.rule.NearMiss;
import org.foreseal.rule.Rule;
import org.foreseal.rule.RuleLibrary;
import org.foreseal.rule.Surroundings;

/**
 * One rule at work. It keeps, for each of its reactant pieces, the species that hold a site for it,
 * and combines only those, in slices that can run at the same time; a rule that the run closes is
 * tried on the charge alone, so that the reader learns what is missing.
 */
final class RuleTask {
  private static final int SLICE = 64;

  private final Rule rule;
  private final Limits limits;
  private final StepJudge judge;
  private final List<List<Integer>> candidates = new ArrayList<>();
  private int scanned;

  RuleTask(Rule rule, Surroundings surroundings, Limits limits, RuleLibrary library) {
    this.rule = rule;
    this.limits = limits;
    judge = new StepJudge(rule, surroundings, limits, library.speciesLimits());
    for (int i = 0; i < rule.transformation().reactantCount(); i++) {
      candidates.add(new ArrayList<>());
    }
  }

  /** Looks through the species added since the last call for sites of this rule. */
  void scan(DepthView view) {
    if (judge.isClosed() && scanned > 0) {
      return;
    }
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

  /** The work of this depth, in slices over the species for the first piece. */
  List<Callable<Found>> slices(DepthView view) {
    List<Callable<Found>> slices = new ArrayList<>();
    boolean first = view.firstNew() == 0;
    if (judge.isClosed() && !first) {
      return slices;
    }
    List<Integer> heads = candidates.get(0);
    for (int from = 0; from < heads.size(); from += SLICE) {
      List<Integer> slice = heads.subList(from, Math.min(from + SLICE, heads.size()));
      slices.add(() -> run(view, slice));
    }
    if (first && !rule.nearMisses().isEmpty()) {
      slices.add(() -> nearMisses(view));
    }
    return slices;
  }

  private Found run(DepthView view, List<Integer> heads) {
    Found found = new Found();
    int[] chosen = new int[candidates.size()];
    for (int head : heads) {
      boolean isNew = head >= view.firstNew();
      if (isNew || chosen.length > 1) {
        chosen[0] = head;
        combine(view, 1, chosen, isNew, found);
      }
    }
    return found;
  }

  /** All combinations that hold at least one species of the last depth. */
  private void combine(DepthView view, int piece, int[] chosen, boolean holdsNew, Found found) {
    if (found.isOutOfTime() || found.tried() > limits.pairsPerRule()) {
      return;
    }
    if (piece == chosen.length) {
      attempt(view, chosen.clone(), found);
      return;
    }
    List<Integer> options = candidates.get(piece);
    boolean mustBeNew = piece == chosen.length - 1 && !holdsNew;
    int deepest = deepestPartner(view, chosen, piece);
    for (int i = mustBeNew ? firstNewIn(options, view) : 0; i < options.size(); i++) {
      int id = options.get(i);
      if (view.species(id).depth() <= deepest || view.isAmbient(id)) {
        chosen[piece] = id;
        combine(view, piece + 1, chosen, holdsNew || id >= view.firstNew(), found);
      }
    }
  }

  private static int firstNewIn(List<Integer> options, DepthView view) {
    int at = Collections.binarySearch(options, view.firstNew());
    return at >= 0 ? at : -at - 1;
  }

  /**
   * How many steps from the charge a further partner may be: any number when those chosen are part
   * of the charge or ambient, one when they are one step away, none when they are further.
   */
  private static int deepestPartner(DepthView view, int[] chosen, int piece) {
    int deepest = Integer.MAX_VALUE;
    for (int i = 0; i < piece; i++) {
      int depth = view.isAmbient(chosen[i]) ? 0 : view.species(chosen[i]).depth();
      if (depth > 0) {
        deepest = Math.min(deepest, depth == 1 ? 1 : 0);
      }
    }
    return deepest;
  }

  private void attempt(DepthView view, int[] chosen, Found found) {
    if ((found.countTry() & 63) == 0 && view.isOutOfTime()) {
      found.endForTime();
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
      if (!view.isAmbient(id)) {
        partners++;
        deepest = Math.max(deepest, view.species(id).depth());
      }
    }
    boolean near = deepest == 0 || (partners == 1 && deepest == 1);
    return near || !judge.refusesReactants(reactants);
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
    Optional<Refusal> refusal = judge.refusal(view.pruner(), reactants, proposal.products(), depth);
    refusal.ifPresentOrElse(found::add, () -> found.add(proposal));
  }

  private static boolean isNoChange(List<Molecule> reactants, List<Molecule> products) {
    return reactants.size() == products.size()
        && reactants.stream().sorted().toList().equals(products.stream().sorted().toList());
  }

  /** Near misses are looked for among the charge only: they explain what will not be seen. */
  private Found nearMisses(DepthView view) {
    Found found = new Found();
    List<Molecule> charge = new ArrayList<>();
    for (int id = 0; id < view.size(); id++) {
      charge.add(view.species(id).molecule());
    }
    for (NearMiss miss : rule.nearMisses()) {
      tryNearMiss(miss, charge, found);
    }
    return found;
  }

  private void tryNearMiss(NearMiss miss, List<Molecule> charge, Found found) {
    Transformation t = miss.transformation();
    Set<List<Molecule>> tried = new HashSet<>();
    for (Molecule a : charge) {
      for (Molecule b : t.reactantCount() == 1 ? List.of(a) : charge) {
        List<Molecule> reactants = t.reactantCount() == 1 ? List.of(a) : List.of(a, b);
        if (rule.pairs(reactants) && tried.add(reactants)) {
          t.apply(reactants)
              .forEach(o -> found.add(judge.nearMiss(reactants, o.products(), miss.reason())));
        }
      }
    }
  }
}
