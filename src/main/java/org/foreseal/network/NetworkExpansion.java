package org.foreseal.network;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.Callable;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.IntConsumer;
import org.foreseal.molecule.Molecule;
import org.foreseal.rule.Rule;
import org.foreseal.rule.RuleLibrary;
import org.foreseal.rule.Surroundings;

/**
 * Grows a network from the charge, one depth at a time. Every rule is applied to every combination
 * of species that holds at least one species of the last depth; the results are merged in order of
 * rule and combination, so the network is the same whatever the number of threads, and the network
 * of a smaller depth is contained in that of a larger one.
 *
 * <p>Two molecules react with each other only when one of them is part of the charge or both are at
 * most one step away from it: products of products meet too rarely to matter.
 */
public final class NetworkExpansion {
  private static final int MOST_REFUSALS = 20_000;
  private static final int RULES_AT_A_TIME = 24;

  private final RuleLibrary library;
  private final Surroundings surroundings;
  private final StepPruner pruner;
  private final Limits limits;
  private final IntConsumer progress;

  private final List<Species> species = new ArrayList<>();

  /** Grows while slices that look at it are still at work. */
  private final Map<Molecule, Integer> ids = new ConcurrentHashMap<>();

  private final List<Step> steps = new ArrayList<>();
  private final Set<StepIdentity> stepKeys = new HashSet<>();
  private final Map<RefusalIdentity, Refusal> refusals = new LinkedHashMap<>();
  private boolean speciesLimitReached;
  private boolean overBudget;
  private boolean used;

  /**
   * An expansion.
   *
   * @param library the rules
   * @param surroundings what the run offers
   * @param pruner judges every step
   * @param limits where to end
   * @param progress told the number of species after each depth
   */
  public NetworkExpansion(
      RuleLibrary library,
      Surroundings surroundings,
      StepPruner pruner,
      Limits limits,
      IntConsumer progress) {
    this.library = library;
    this.surroundings = surroundings;
    this.pruner = pruner;
    this.limits = limits;
    this.progress = progress;
  }

  private record StepIdentity(String rule, List<Integer> reactants, List<Integer> products) {}

  private record RefusalIdentity(String rule, List<Molecule> products) {}

  /**
   * Grows the network from these molecules, substrates first. An expansion grows one network only.
   */
  public Network grow(List<Molecule> charge) {
    if (used) {
      throw new IllegalStateException("this expansion has grown its network");
    }
    used = true;
    for (Molecule m : charge) {
      intern(m, 0);
    }
    long deadline = System.nanoTime() + limits.wallTime().toNanos();
    List<RuleTask> tasks =
        library.rules().stream().map(r -> new RuleTask(r, surroundings, limits, library)).toList();
    ExecutorService pool = Executors.newFixedThreadPool(limits.threads(), NetworkExpansion::daemon);
    try {
      return grow(tasks, pool, deadline);
    } finally {
      pool.shutdownNow();
    }
  }

  private static Thread daemon(Runnable work) {
    Thread thread = new Thread(work, "network");
    thread.setDaemon(true);
    return thread;
  }

  private Network grow(List<RuleTask> tasks, ExecutorService pool, long deadline) {
    int from = 0;
    for (int depth = 0; depth < limits.depth(); depth++) {
      int to = species.size();
      if (from == to) {
        return finished(depth, new Network.Ending("nothing new", false));
      }
      List<Species> frozen = List.copyOf(species);
      DepthView view = new DepthView(frozen, from, ids, pruner, deadline);
      boolean outOfTime = expand(tasks, view, pool, depth + 1);
      progress.accept(species.size());
      if (outOfTime || speciesLimitReached) {
        String limit =
            outOfTime
                ? "wall time " + limits.wallTime().toSeconds() + " s"
                : limits.species() + " species";
        return finished(depth + 1, new Network.Ending("limit: " + limit, true));
      }
      from = to;
    }
    String reason =
        overBudget ? "limit: " + limits.pairsPerRule() + " combinations per rule" : "depth";
    return finished(limits.depth(), new Network.Ending(reason, overBudget));
  }

  private Network finished(int depth, Network.Ending ending) {
    List<Refusal> open =
        refusals.values().stream()
            .filter(r -> r.products().stream().anyMatch(p -> !ids.containsKey(p)))
            .toList();
    return new Network(species, steps, open, depth, ending);
  }

  /**
   * Expands one depth, a few rules at a time. Slices run at the same time; what they found is
   * merged in the order of rules and slices as it comes in, and once a limit is reached the rest is
   * given up. Answers whether the time ran out.
   */
  private boolean expand(List<RuleTask> tasks, DepthView view, ExecutorService pool, int depth) {
    try {
      for (int from = 0; from < tasks.size() && !speciesLimitReached; from += RULES_AT_A_TIME) {
        List<RuleTask> some = tasks.subList(from, Math.min(from + RULES_AT_A_TIME, tasks.size()));
        if (expandSome(some, view, pool, depth)) {
          return true;
        }
      }
      return false;
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException("interrupted while the network grew", e);
    } catch (ExecutionException e) {
      throw new IllegalStateException("a rule failed while the network grew", e.getCause());
    }
  }

  private boolean expandSome(List<RuleTask> tasks, DepthView view, ExecutorService pool, int depth)
      throws InterruptedException, ExecutionException {
    List<Callable<Boolean>> scans = new ArrayList<>();
    tasks.forEach(task -> scans.add(() -> scanned(task, view)));
    for (Future<Boolean> scan : pool.invokeAll(scans)) {
      scan.get();
    }
    List<List<Future<Found>>> futures = new ArrayList<>();
    for (RuleTask task : tasks) {
      futures.add(task.slices(view).stream().map(pool::submit).toList());
    }
    for (List<Future<Found>> slices : futures) {
      if (mergeRule(slices, depth)) {
        return true;
      }
    }
    return false;
  }

  private static boolean scanned(RuleTask task, DepthView view) {
    task.scan(view);
    return true;
  }

  /** Numbers species and steps of one rule; answers whether the time ran out. */
  private boolean mergeRule(List<Future<Found>> slices, int depth)
      throws InterruptedException, ExecutionException {
    int tried = 0;
    for (Future<Found> slice : slices) {
      boolean exhausted = tried > limits.pairsPerRule();
      overBudget |= exhausted;
      if (exhausted || speciesLimitReached) {
        slice.cancel(false);
      } else {
        Found found = slice.get();
        tried += found.tried();
        found.refusals().forEach(this::remember);
        found.proposals().forEach(proposal -> merge(proposal, depth));
        if (found.isOutOfTime()) {
          return true;
        }
      }
    }
    return false;
  }

  private void remember(Refusal refusal) {
    if (refusals.size() < MOST_REFUSALS) {
      refusals.putIfAbsent(new RefusalIdentity(refusal.rule().id(), refusal.products()), refusal);
    }
  }

  private void merge(Proposal proposal, int depth) {
    int[] products = new int[proposal.products().size()];
    boolean fits = true;
    for (int i = 0; i < products.length; i++) {
      products[i] = intern(proposal.products().get(i), depth);
      fits &= products[i] >= 0;
    }
    if (fits && stepKeys.add(identity(proposal.rule(), proposal.reactants(), products))) {
      steps.add(
          new Step(
              steps.size(),
              proposal.rule(),
              proposal.reactants(),
              products,
              proposal.outcome().atomMap(),
              proposal.outcome().sites()));
    }
  }

  private static StepIdentity identity(Rule rule, int[] reactants, int[] products) {
    return new StepIdentity(rule.id(), sorted(reactants), sorted(products));
  }

  private static List<Integer> sorted(int[] ids) {
    return Arrays.stream(ids).sorted().boxed().toList();
  }

  private int intern(Molecule molecule, int depth) {
    Integer known = ids.get(molecule);
    if (known != null) {
      return known;
    }
    if (species.size() >= limits.species()) {
      speciesLimitReached = true;
      return -1;
    }
    species.add(new Species(species.size(), molecule, depth));
    ids.put(molecule, species.size() - 1);
    return species.size() - 1;
  }
}
