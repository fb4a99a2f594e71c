package org.foreseal.experiment;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Smiles;
import org.foreseal.rule.Provision;
import org.foreseal.run.RunSheet;
import org.foreseal.yaml.YamlValue;

/** One published heating experiment of the test resources, and the run sheet it amounts to. */
record PublishedExperiment(
    String id,
    String reactionClass,
    String paper,
    boolean scored,
    boolean coreScope,
    RunSheet sheet,
    List<Product> products,
    Set<Molecule> absent) {
  private static final double UNSTATED_CELSIUS = 300;

  /** A reported product; weight 1 for major, 0.5 for minor and observed, 0.25 for trace. */
  record Product(String name, Molecule molecule, boolean organic, boolean read, double weight) {}

  static List<PublishedExperiment> all() {
    try (InputStream in =
        PublishedExperiment.class.getResourceAsStream("/experiments/published.yaml")) {
      String yaml = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      YamlValue file = YamlValue.parse("published.yaml", yaml);
      return file.itemsOf("records").stream().map(PublishedExperiment::read).toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Products that count: organic, read on the page, and not a substrate once stereo is dropped. */
  List<Product> scoredProducts() {
    Set<Molecule> substrates = new LinkedHashSet<>();
    sheet.substrates().forEach(s -> substrates.add(s.molecule()));
    return products.stream()
        .filter(p -> p.organic() && p.read() && !substrates.contains(p.molecule()))
        .toList();
  }

  private static PublishedExperiment read(YamlValue n) {
    return new PublishedExperiment(
        n.require("id").text(),
        n.require("class").text(),
        n.require("paper").text(),
        n.require("scored").text().equals("true"),
        n.require("coreScope").text().equals("true"),
        sheet(n),
        n.itemsOf("products").stream().map(PublishedExperiment::product).toList(),
        new LinkedHashSet<>(
            n.itemsOf("absent").stream().map(a -> molecule(a.require("smiles"))).toList()));
  }

  private static Molecule molecule(YamlValue n) {
    return Smiles.read(n.text());
  }

  private static Product product(YamlValue n) {
    double weight =
        switch (n.require("level").text()) {
          case "major" -> 1;
          case "trace" -> 0.25;
          default -> 0.5;
        };
    return new Product(
        n.require("name").text(),
        molecule(n.require("smiles")),
        n.require("kind").text().equals("organic"),
        n.require("basis").text().equals("read"),
        weight);
  }

  private static RunSheet sheet(YamlValue n) {
    List<RunSheet.Substrate> substrates =
        n.itemsOf("substrates").stream()
            .map(
                s ->
                    new RunSheet.Substrate(
                        s.require("name").text(), molecule(s.require("smiles")), Optional.empty()))
            .toList();
    List<RunSheet.Solid> solids =
        n.itemsOf("solids").stream()
            .map(
                s ->
                    new RunSheet.Solid(
                        s.require("name").text(),
                        roles(s),
                        OptionalDouble.empty(),
                        OptionalDouble.empty()))
            .toList();
    List<RunSheet.Additive> additives =
        n.itemsOf("additives").stream()
            .map(
                a ->
                    new RunSheet.Additive(
                        a.require("name").text(),
                        a.get("smiles").map(PublishedExperiment::molecule),
                        roles(a),
                        Optional.empty()))
            .toList();
    return RunSheets.of(
        substrates,
        n.require("solvent").text().equals("water"),
        solids,
        additives,
        temperatures(n));
  }

  private static List<Double> temperatures(YamlValue n) {
    Optional<YamlValue> given = n.get("temperatureC");
    if (given.isEmpty()) {
      return List.of(UNSTATED_CELSIUS);
    }
    List<Double> result = new ArrayList<>();
    for (String part : given.get().isList() ? texts(given.get()) : List.of(given.get().text())) {
      result.add(Double.parseDouble(part));
    }
    return result;
  }

  private static List<String> texts(YamlValue n) {
    return n.items().stream().map(YamlValue::text).toList();
  }

  private static Set<Provision> roles(YamlValue n) {
    Set<Provision> roles = EnumSet.noneOf(Provision.class);
    for (YamlValue word : n.itemsOf("actsAs")) {
      roles.add(Provision.of(word.text()).orElseThrow());
    }
    return roles;
  }
}
