package org.foreseal.run;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import java.util.function.Predicate;
import org.foreseal.molecule.Molecule;

/**
 * Forecasts of one charge under several conditions, side by side.
 *
 * @param runs in the order asked for, at least one
 */
public record Comparison(List<Run> runs) {
  /** A score below this part of the best one counts as far lower. */
  private static final double FAR_LOWER = 0.2;

  /** Products below this part of the best score of all tell nothing apart that could be seen. */
  private static final double WORTH_TELLING = 0.1;

  /** Keeps an unmodifiable copy. */
  public Comparison {
    if (runs.isEmpty()) {
      throw new IllegalArgumentException("nothing to compare");
    }
    runs = List.copyOf(runs);
  }

  /**
   * One of the runs.
   *
   * @param label what sets it apart, such as the solid or the temperature
   * @param forecast what it shows
   */
  public record Run(String label, Forecast forecast) {}

  /**
   * A product across the runs.
   *
   * @param name its name
   * @param molecule its structure
   * @param gcVisible whether it is seen in the GC
   * @param scores its score in each run, none where it is not listed
   */
  public record Product(
      String name, Molecule molecule, boolean gcVisible, List<OptionalDouble> scores) {
    /** Keeps an unmodifiable copy. */
    public Product {
      scores = List.copyOf(scores);
    }

    /** The best score in any run. */
    public double bestScore() {
      return scores.stream().mapToDouble(s -> s.orElse(0)).max().orElse(0);
    }
  }

  /**
   * A product that tells the runs apart.
   *
   * @param product the product
   * @param shownBy labels of the runs that list it well
   * @param missing the other runs, with the reason
   */
  public record Difference(Product product, List<String> shownBy, List<Missing> missing) {
    /** Keeps unmodifiable copies. */
    public Difference {
      shownBy = List.copyOf(shownBy);
      missing = List.copyOf(missing);
    }
  }

  /**
   * Why a run does not show a product as others do.
   *
   * @param label label of the run
   * @param score its score there, if it is listed at all
   * @param reason why, in plain words
   */
  public record Missing(String label, OptionalDouble score, String reason) {}

  /** Every product of any run but the substrates, best first. */
  public List<Product> products() {
    TreeMap<Molecule, Candidate> found = new TreeMap<>();
    for (Run run : runs) {
      for (Candidate candidate : run.forecast().candidates()) {
        if (!candidate.isSubstrate()) {
          found.putIfAbsent(candidate.molecule(), candidate);
        }
      }
    }
    List<Product> products = new ArrayList<>();
    found.forEach((molecule, candidate) -> products.add(product(candidate)));
    products.sort(
        Comparator.comparingDouble((Product p) -> -p.bestScore()).thenComparing(Product::molecule));
    return products;
  }

  private Product product(Candidate candidate) {
    List<OptionalDouble> scores = new ArrayList<>();
    for (Run run : runs) {
      scores.add(
          run.forecast().candidates().stream()
              .filter(c -> c.molecule().equals(candidate.molecule()))
              .mapToDouble(Candidate::score)
              .findFirst());
    }
    return new Product(candidate.name(), candidate.molecule(), candidate.gcVisible(), scores);
  }

  /** The products that some runs show and others do not, or far less; best first. */
  public List<Difference> differences() {
    List<Product> products = products();
    double best = products.stream().mapToDouble(Product::bestScore).max().orElse(0);
    return products.stream()
        .filter(p -> p.bestScore() >= WORTH_TELLING * best)
        .flatMap(p -> difference(p).stream())
        .toList();
  }

  private Optional<Difference> difference(Product product) {
    List<String> shownBy = new ArrayList<>();
    List<Missing> missing = new ArrayList<>();
    for (int i = 0; i < runs.size(); i++) {
      OptionalDouble score = product.scores().get(i);
      if (score.orElse(0) >= FAR_LOWER * product.bestScore() && score.isPresent()) {
        shownBy.add(runs.get(i).label());
      } else {
        missing.add(
            new Missing(
                runs.get(i).label(), score, reason(product, score, runs.get(i).forecast())));
      }
    }
    return missing.isEmpty()
        ? Optional.empty()
        : Optional.of(new Difference(product, shownBy, missing));
  }

  /**
   * Why a run does not show a product: the step of the others' best route that it refuses, else any
   * refusal of the product or of something on the way.
   */
  private String reason(Product product, OptionalDouble score, Forecast forecast) {
    if (score.isPresent()) {
      return "listed, but far lower";
    }
    List<ForecastRoute.Step> steps = bestRoute(product);
    List<RuledOut> refused = forecast.ruledOut();
    return first(refused, r -> steps.stream().anyMatch(s -> makes(s, r) && isBy(s, r)))
        .or(() -> first(refused, r -> r.smiles().equals(product.molecule().smiles())))
        .or(() -> first(refused, r -> steps.stream().anyMatch(s -> makes(s, r))))
        .map(RuledOut::reason)
        .orElse("no route to it there");
  }

  private List<ForecastRoute.Step> bestRoute(Product product) {
    return runs.stream()
        .flatMap(r -> r.forecast().candidates().stream())
        .filter(c -> c.molecule().equals(product.molecule()))
        .max(Comparator.comparingDouble(Candidate::score))
        .flatMap(c -> c.routes().stream().findFirst())
        .map(ForecastRoute::steps)
        .orElse(List.of());
  }

  private static Optional<RuledOut> first(List<RuledOut> all, Predicate<RuledOut> wanted) {
    return all.stream().filter(wanted).findFirst();
  }

  private static boolean isBy(ForecastRoute.Step step, RuledOut refused) {
    return step.rule().equals(refused.rule());
  }

  /** Whether the refused molecule stands on the right of the step's equation. */
  private static boolean makes(ForecastRoute.Step step, RuledOut refused) {
    String right = step.equationSmiles().substring(step.equationSmiles().indexOf(" = ") + 1);
    return (right + " ").contains(" " + refused.smiles() + " ");
  }
}
