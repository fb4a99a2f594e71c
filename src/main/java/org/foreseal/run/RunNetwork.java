package org.foreseal.run;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.foreseal.network.Limits;
import org.foreseal.network.Network;
import org.foreseal.network.NetworkExpansion;
import org.foreseal.network.RouteFinder;
import org.foreseal.quantity.BadInputException;
import org.foreseal.rule.Rule;
import org.foreseal.rule.RuleCheck;
import org.foreseal.rule.RuleLibrary;

/**
 * The network of one run with everything needed to judge it.
 *
 * @param library rules used
 * @param vessel what stood in the vessel
 * @param network the network
 * @param energies Gibbs energies of its steps
 * @param ranking scores
 * @param routes route search over the scores
 */
record RunNetwork(
    RuleLibrary library,
    ChargedVessel vessel,
    Network network,
    StepEnergies energies,
    Ranking ranking,
    RouteFinder routes) {
  private static final double ZERO_CELSIUS = 273.15;

  /** Grows the network of a run at one temperature. */
  static RunNetwork grow(
      RunSheet sheet, ForecastOptions options, EnergySource energySource, Progress progress) {
    if (sheet.temperatureCelsius().size() != 1) {
      throw new IllegalArgumentException("a forecast is made for one temperature");
    }
    double kelvin = sheet.temperatureCelsius().get(0) + ZERO_CELSIUS;
    RuleLibrary library = library(options.rulesFolder());
    ChargedVessel vessel = ChargedVessel.of(sheet);
    StepEnergies energies = energySource.at(kelvin);
    GibbsPruner pruner = new GibbsPruner(energies, kelvin, vessel.surroundings().offered());
    Network network =
        new NetworkExpansion(
                library,
                vessel.surroundings(),
                pruner,
                limits(sheet, options),
                species -> progress.report("growing the network, species", species))
            .grow(vessel.molecules());
    Ranking ranking = new PlausibilityRanking(network, vessel.surroundings(), energies);
    progress.report("searching routes, steps", network.steps().size());
    RouteFinder routes = new RouteFinder(network, step -> -Math.log(ranking.stepScore(step)));
    return new RunNetwork(library, vessel, network, energies, ranking, routes);
  }

  /** The built-in rules, with those of the user's folder added. */
  static RuleLibrary library(Optional<Path> folder) {
    RuleLibrary builtIn = RuleLibrary.builtIn();
    return folder.map(path -> builtIn.with(checked(own(path), builtIn))).orElse(builtIn);
  }

  /** A user's rules take part only when they pass their own self-tests. */
  private static RuleLibrary checked(RuleLibrary own, RuleLibrary builtIn) {
    Set<String> known = builtIn.rules().stream().map(Rule::id).collect(Collectors.toSet());
    RuleCheck.run(own, known).stream()
        .findFirst()
        .ifPresent(
            f -> {
              throw new BadInputException(
                  f.place(),
                  "rule '" + f.rule() + "' fails its own self-test: " + f.problem(),
                  "mend the rule or its example; 'foreseal rules check DIR' lists every fault");
            });
    return own;
  }

  static RuleLibrary own(Path folder) {
    try {
      return RuleLibrary.folder(folder);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static Limits limits(RunSheet sheet, ForecastOptions options) {
    Limits usual = Limits.ofDepth(sheet.depth());
    return new Limits(
        usual.depth(),
        options.mostSpecies().orElse(usual.species()),
        usual.heavyAtoms(),
        usual.carbons(),
        usual.pairsPerRule(),
        options.longest().orElse(usual.wallTime()),
        usual.threads());
  }

  NetworkSummary summary() {
    return new NetworkSummary(
        network.species().size(),
        network.steps().size(),
        network.depth(),
        network.stoppedBy(),
        network.isCut());
  }
}
