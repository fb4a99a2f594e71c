package org.foreseal.run;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import org.foreseal.chromatography.WorkUp;
import org.foreseal.molecule.ChemicalElement;
import org.foreseal.molecule.Molecule;
import org.foreseal.network.Route;
import org.foreseal.network.Species;
import org.foreseal.network.Step;
import org.foreseal.quantity.Uncertain;
import org.foreseal.rule.AmbientSpecies;
import org.foreseal.rule.Provision;

/** Makes the ranked list of candidates of a run. */
final class CandidateLister {
  private static final int ROUTES_EACH = 3;
  private static final double SCORE_FLOOR = 1e-3;

  private final RunNetwork run;
  private final Function<Molecule, String> names;
  private final Set<Molecule> substrates;

  CandidateLister(RunNetwork run, RunSheet sheet, Function<Molecule, String> names) {
    this.run = run;
    this.names = names;
    this.substrates =
        new LinkedHashSet<>(sheet.substrates().stream().map(RunSheet.Substrate::molecule).toList());
  }

  private record Scored(Species species, Optional<Route> best, double score) {}

  /**
   * Every species above the floor, or every one at all, best first; the solvent and unused gases
   * are left out.
   */
  List<Candidate> list(boolean everything) {
    List<Scored> scored = new ArrayList<>();
    for (Species s : run.network().species()) {
      if (!s.molecule().equals(AmbientSpecies.WATER)) {
        score(s).filter(c -> everything || c.score() >= SCORE_FLOOR).ifPresent(scored::add);
      }
    }
    scored.sort(
        Comparator.comparing((Scored c) -> !isSubstrate(c))
            .thenComparing(c -> -c.score())
            .thenComparing(c -> c.species().molecule()));
    List<Candidate> candidates = new ArrayList<>();
    int rank = 0;
    for (Scored c : scored) {
      candidates.add(candidate(c, isSubstrate(c) ? 0 : ++rank));
    }
    return candidates;
  }

  private boolean isSubstrate(Scored c) {
    return substrates.contains(c.species().molecule());
  }

  /**
   * Substrates score 1 as what is left of them; additives and ambient gases count when a step makes
   * them.
   */
  private Optional<Scored> score(Species s) {
    if (s.depth() > 0) {
      return run.routes().routesTo(s.id(), 1).stream()
          .findFirst()
          .map(r -> new Scored(s, Optional.of(r), run.ranking().candidateScore(s.molecule(), r)));
    }
    if (substrates.contains(s.molecule())) {
      return Optional.of(new Scored(s, Optional.empty(), 1));
    }
    return run.network().makersOf(s.id()).stream()
        .mapToDouble(run.ranking()::stepScore)
        .max()
        .stream()
        .boxed()
        .findFirst()
        .map(best -> new Scored(s, Optional.empty(), best));
  }

  private Candidate candidate(Scored c, int rank) {
    Molecule m = c.species().molecule();
    List<ForecastRoute> routes =
        c.best().isPresent() ? routes(c.species().id(), ROUTES_EACH) : List.of();
    return new Candidate(
        rank,
        names.apply(m),
        m,
        isSubstrate(c),
        isOrganic(m),
        c.score(),
        WorkUp.whereFound(m),
        WorkUp.isSeenByGc(m),
        c.species().depth(),
        c.best().map(this::needs).orElse(List.of()),
        Cautions.of(m),
        routes);
  }

  private static boolean isOrganic(Molecule m) {
    return m.formula().count(ChemicalElement.C) > 0
        && !m.equals(AmbientSpecies.CARBON_DIOXIDE)
        && !m.equals(AmbientSpecies.CARBON_MONOXIDE);
  }

  List<ForecastRoute> routes(int species, int most) {
    return run.routes().routesTo(species, most).stream()
        .map(
            r ->
                new ForecastRoute(Math.exp(-r.cost()), r.steps().stream().map(this::step).toList()))
        .toList();
  }

  private ForecastRoute.Step step(Step step) {
    Optional<Uncertain> gibbs =
        run.energies().deltaGibbs(run.molecules(step.reactants()), run.molecules(step.products()));
    return new ForecastRoute.Step(
        step.rule().id(),
        step.rule().title(),
        Equation.of(run.network(), step, names),
        Equation.of(run.network(), step, Molecule::smiles),
        gibbs,
        needs(step));
  }

  /** What the run offers that this step cannot do without; water and heat go without saying. */
  private List<String> needs(Step step) {
    Set<String> words = new LinkedHashSet<>();
    step.rule().metNeed(run.vessel().surroundings()).orElse(Set.of()).stream()
        .filter(p -> p != Provision.WATER && p != Provision.HYDROGEN)
        .sorted()
        .forEach(p -> words.add(p.word()));
    boolean consumesHydrogen =
        Arrays.stream(step.reactants())
            .anyMatch(
                r -> run.network().species().get(r).molecule().equals(AmbientSpecies.HYDROGEN));
    if (consumesHydrogen) {
      words.add("hydrogen");
    }
    return List.copyOf(words);
  }

  private List<String> needs(Route route) {
    Set<String> words = new LinkedHashSet<>();
    route.steps().forEach(s -> words.addAll(needs(s)));
    return List.copyOf(words);
  }
}
