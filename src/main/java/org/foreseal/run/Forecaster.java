package org.foreseal.run;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Function;
import org.foreseal.molecule.Molecule;
import org.foreseal.network.NetworkDrawing;
import org.foreseal.network.Route;
import org.foreseal.network.Species;
import org.foreseal.network.Step;
import org.foreseal.rule.Bibliography;
import org.foreseal.rule.Citation;
import org.foreseal.rule.Rule;
import org.foreseal.rule.RuleCheck;
import org.foreseal.rule.RuleLibrary;

/** The pipeline: run sheet to network to ranked candidates. */
public final class Forecaster implements Engine {
  private static final int ROUTES_DRAWN = 5;
  private static final int MOST_RULED_OUT = 500;
  private static final int CANDIDATES_EXPLAINED = 20;
  private static final String GAS_PHASE_NOTE =
      "gas-phase Gibbs energies at 1 bar; what water does to them is not in these figures";
  private static final String SCORE_NOTE =
      "the score orders the list by rules, conditions and Gibbs energies; it is no probability";

  private final Function<Molecule, String> names;
  private final String version;
  private final EnergySource energySource;

  Forecaster(Function<Molecule, String> names, String version, EnergySource energySource) {
    this.names = remembering(names);
    this.version = version;
    this.energySource = energySource;
  }

  /** Names turn up in many equations; each is made once. */
  private static Function<Molecule, String> remembering(Function<Molecule, String> names) {
    Map<Molecule, String> known = new ConcurrentHashMap<>();
    return molecule -> known.computeIfAbsent(molecule, names);
  }

  /** The forecaster with the Gibbs energies of this build. */
  public static Forecaster standard(Function<Molecule, String> names, String version) {
    return new Forecaster(names, version, GasPhaseEnergies::at);
  }

  @Override
  public Forecast forecast(RunSheet sheet, ForecastOptions options, Progress progress) {
    RunNetwork run = RunNetwork.grow(sheet, options, energySource, progress);
    progress.report("ranking species", run.network().species().size());
    List<Candidate> candidates = new CandidateLister(run, sheet, names).list(options.everything());
    List<String> notes = new ArrayList<>(notes(sheet, run));
    notes.addAll(weakEstimates(candidates, run.energies()));
    return new Forecast(
        tool(run.library(), sheet),
        sheet,
        notes,
        candidates,
        RefusalLister.list(
            run.network(), options.everything() ? Integer.MAX_VALUE : MOST_RULED_OUT, names),
        run.summary());
  }

  private ToolInfo tool(RuleLibrary library, RunSheet sheet) {
    return new ToolInfo(version, library.digest(), sheet.seed());
  }

  private static List<String> notes(RunSheet sheet, RunNetwork run) {
    List<String> notes = new ArrayList<>(sheet.notes());
    notes.add(GAS_PHASE_NOTE);
    notes.add(SCORE_NOTE);
    if (run.network().isCut()) {
      notes.add(
          "the network was cut ("
              + run.network().stoppedBy()
              + "); what lies beyond is not in the list");
    }
    return notes;
  }

  /** Which of the best candidates have a weak Gibbs energy, grouped by what is weak about it. */
  private static List<String> weakEstimates(List<Candidate> candidates, StepEnergies energies) {
    Map<String, List<String>> namesByKind = new LinkedHashMap<>();
    Map<String, Set<String>> termsByKind = new LinkedHashMap<>();
    for (Candidate c : candidates.subList(0, Math.min(CANDIDATES_EXPLAINED, candidates.size()))) {
      energies
          .weakness(c.molecule())
          .ifPresent(
              w -> {
                namesByKind.computeIfAbsent(w.kind(), k -> new ArrayList<>()).add(c.name());
                termsByKind.computeIfAbsent(w.kind(), k -> new TreeSet<>()).addAll(w.terms());
              });
    }
    List<String> notes = new ArrayList<>();
    namesByKind.forEach(
        (kind, names) -> {
          Set<String> terms = termsByKind.getOrDefault(kind, Set.of());
          String which = terms.isEmpty() ? "" : " [" + String.join(" ", terms) + "]";
          notes.add(kind + which + ": " + String.join("; ", names));
        });
    return notes;
  }

  @Override
  public RouteReport routes(
      RunSheet sheet, Molecule product, int most, ForecastOptions options, Progress progress) {
    RunNetwork run = RunNetwork.grow(sheet, options, energySource, progress);
    Optional<Species> species = run.network().find(product);
    List<ForecastRoute> routes =
        species
            .map(s -> new CandidateLister(run, sheet, names).routes(s.id(), most))
            .orElse(List.of());
    return new RouteReport(
        tool(run.library(), sheet),
        sheet,
        names.apply(product),
        product,
        routes,
        sources(routes, run.library()),
        routes.isEmpty() ? Optional.of(reason(product, species, run)) : Optional.empty(),
        notes(sheet, run),
        run.summary());
  }

  private String reason(Molecule product, Optional<Species> species, RunNetwork run) {
    if (species.isPresent()) {
      return "it is part of the charge";
    }
    return RefusalLister.list(run.network(), Integer.MAX_VALUE, names).stream()
        .filter(r -> r.smiles().equals(product.smiles()))
        .map(
            r ->
                r.reason()
                    + (r.detail().isEmpty() ? "" : " (" + r.detail() + ")")
                    + "; rule "
                    + r.rule())
        .findFirst()
        .orElse("no rule leads to it within " + run.network().depth() + " steps");
  }

  private static Map<String, List<String>> sources(
      List<ForecastRoute> routes, RuleLibrary library) {
    Map<String, List<String>> sources = new TreeMap<>();
    for (ForecastRoute route : routes) {
      for (ForecastRoute.Step step : route.steps()) {
        library.find(step.rule()).ifPresent(rule -> sources.put(rule.id(), sources(rule)));
      }
    }
    return sources;
  }

  private static List<String> sources(Rule rule) {
    return rule.sources().stream().map(Forecaster::words).distinct().toList();
  }

  private static String words(Citation source) {
    return source.says().isEmpty() ? source.key() : source.key() + ": " + source.says();
  }

  @Override
  public String drawing(
      RunSheet sheet,
      Optional<Molecule> product,
      DrawingFormat format,
      ForecastOptions options,
      Progress progress) {
    RunNetwork run = RunNetwork.grow(sheet, options, energySource, progress);
    List<Step> steps = product.map(p -> stepsTo(p, run)).orElse(run.network().steps());
    NetworkDrawing drawing =
        NetworkDrawing.of(run.network(), steps, s -> names.apply(s.molecule()));
    return format == DrawingFormat.DOT ? drawing.dot() : drawing.graphMl();
  }

  private static List<Step> stepsTo(Molecule product, RunNetwork run) {
    Set<Step> steps = new LinkedHashSet<>();
    run.network()
        .find(product)
        .ifPresent(
            s ->
                run.routes().routesTo(s.id(), ROUTES_DRAWN).stream()
                    .map(Route::steps)
                    .forEach(steps::addAll));
    return List.copyOf(steps);
  }

  @Override
  public List<RuleSummary> rules(Optional<Path> folder) {
    Bibliography references = Bibliography.builtIn();
    return RunNetwork.library(folder).rules().stream()
        .map(rule -> RuleWords.summary(rule, references))
        .toList();
  }

  @Override
  public RuleCheckReport checkRules(Optional<Path> folder) {
    RuleLibrary builtIn = RuleLibrary.builtIn();
    RuleLibrary library = folder.map(RunNetwork::own).orElse(builtIn);
    Set<String> known = new LinkedHashSet<>(builtIn.rules().stream().map(Rule::id).toList());
    List<RuleCheckReport.Fault> faults =
        RuleCheck.run(library, known).stream()
            .map(f -> new RuleCheckReport.Fault(f.place().label(), f.rule(), f.problem()))
            .toList();
    return new RuleCheckReport(library.rules().size(), RuleCheck.count(library), faults);
  }
}
