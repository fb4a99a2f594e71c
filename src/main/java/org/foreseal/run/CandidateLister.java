package org.foreseal.run;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.IntStream;
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

  /** Here the usual list ends, whatever the score; the whole list is there on request. */
  private static final int MOST_LISTED = 1000;

  /**
   * In longer lists every candidate shows its best route only; the search for others takes time.
   */
  private static final int LISTED_WITH_OTHER_ROUTES = 400;

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
   * The best species above the floor, or every one at all, best first, substrates before products;
   * the solvent and unused gases are left out.
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
    List<Scored> listed =
        everything ? scored : scored.subList(0, Math.min(MOST_LISTED, scored.size()));
    int routesEach = listed.size() <= LISTED_WITH_OTHER_ROUTES ? ROUTES_EACH : 1;
    int charged = (int) listed.stream().filter(this::isSubstrate).count();
    return IntStream.range(0, listed.size())
        .parallel()
        .mapToObj(i -> candidate(listed.get(i), Math.max(0, i + 1 - charged), routesEach))
        .toList();
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
      return run.routes()
          .cheapestRoute(s.id())
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

  private Candidate candidate(Scored c, int rank, int routesEach) {
    Molecule m = c.species().molecule();
    List<ForecastRoute> routes =
        c.best().map(best -> routes(c.species().id(), best, routesEach)).orElse(List.of());
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

  /** The best route, then others that differ from it, cheapest first. */
  List<ForecastRoute> routes(int species, int most) {
    return run.routes()
        .cheapestRoute(species)
        .map(best -> routes(species, best, most))
        .orElse(List.of());
  }

  private List<ForecastRoute> routes(int species, Route best, int most) {
    List<Route> routes = new ArrayList<>(List.of(best));
    if (most > 1) {
      run.routes().routesTo(species, most).stream()
          .filter(r -> !r.steps().equals(best.steps()))
          .limit(most - 1L)
          .forEach(routes::add);
    }
    routes.sort(Comparator.comparingDouble(Route::cost));
    return routes.stream()
        .map(
            r ->
                new ForecastRoute(Math.exp(-r.cost()), r.steps().stream().map(this::step).toList()))
        .toList();
  }

  private ForecastRoute.Step step(Step step) {
    Optional<Uncertain> gibbs =
        run.energies().deltaGibbs(run.network().reactantsOf(step), run.network().productsOf(step));
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
    if (run.network().reactantsOf(step).contains(AmbientSpecies.HYDROGEN)) {
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
