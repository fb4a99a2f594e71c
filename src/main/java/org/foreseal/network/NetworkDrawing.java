package org.foreseal.network;

import java.io.StringWriter;
import java.io.Writer;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Function;
import org.jgrapht.Graph;
import org.jgrapht.graph.DefaultEdge;
import org.jgrapht.graph.DirectedPseudograph;
import org.jgrapht.nio.Attribute;
import org.jgrapht.nio.AttributeType;
import org.jgrapht.nio.DefaultAttribute;
import org.jgrapht.nio.dot.DOTExporter;
import org.jgrapht.nio.graphml.GraphMLExporter;

/**
 * A network as a two-sorted graph, species and steps, with an edge from every reactant to its step
 * and from every step to its products.
 */
public final class NetworkDrawing {
  private final Graph<String, DefaultEdge> graph = new DirectedPseudograph<>(DefaultEdge.class);
  private final Map<String, Map<String, Attribute>> attributes = new LinkedHashMap<>();

  private NetworkDrawing() {}

  /**
   * The drawing of some steps of a network.
   *
   * @param network the network
   * @param steps the steps to show; only the species they touch are shown
   * @param name name of a species
   */
  public static NetworkDrawing of(
      Network network, Collection<Step> steps, Function<Species, String> name) {
    NetworkDrawing drawing = new NetworkDrawing();
    for (Step step : steps) {
      drawing.addStep(network, step, name);
    }
    return drawing;
  }

  private void addStep(Network network, Step step, Function<Species, String> name) {
    String node = "step" + step.id();
    add(
        node,
        Map.of(
            "kind",
            text("step"),
            "label",
            text(step.rule().title()),
            "rule",
            text(step.rule().id())));
    for (int r : step.reactants()) {
      graph.addEdge(addSpecies(network.species().get(r), name), node);
    }
    for (int p : step.products()) {
      graph.addEdge(node, addSpecies(network.species().get(p), name));
    }
  }

  private String addSpecies(Species s, Function<Species, String> name) {
    String node = "species" + s.id();
    if (!attributes.containsKey(node)) {
      Map<String, Attribute> values = new LinkedHashMap<>();
      values.put("kind", text("species"));
      values.put("label", text(name.apply(s)));
      values.put("smiles", text(s.molecule().smiles()));
      values.put("depth", DefaultAttribute.createAttribute(s.depth()));
      add(node, values);
    }
    return node;
  }

  private void add(String node, Map<String, Attribute> values) {
    graph.addVertex(node);
    attributes.put(node, values);
  }

  private static Attribute text(String value) {
    return DefaultAttribute.createAttribute(value);
  }

  /** As GraphML. */
  public String graphMl() {
    GraphMLExporter<String, DefaultEdge> exporter = new GraphMLExporter<>(v -> v);
    exporter.setVertexAttributeProvider(v -> attributes.getOrDefault(v, Map.of()));
    for (String key : new String[] {"kind", "label", "smiles", "rule"}) {
      exporter.registerAttribute(key, GraphMLExporter.AttributeCategory.NODE, AttributeType.STRING);
    }
    exporter.registerAttribute("depth", GraphMLExporter.AttributeCategory.NODE, AttributeType.INT);
    return written(writer -> exporter.exportGraph(graph, writer));
  }

  /** In the DOT language. */
  public String dot() {
    DOTExporter<String, DefaultEdge> exporter = new DOTExporter<>(v -> v);
    exporter.setVertexAttributeProvider(
        v -> {
          Map<String, Attribute> values = new LinkedHashMap<>(attributes.getOrDefault(v, Map.of()));
          values.put("shape", text(v.startsWith("step") ? "box" : "ellipse"));
          return values;
        });
    return written(writer -> exporter.exportGraph(graph, writer));
  }

  private static String written(java.util.function.Consumer<Writer> export) {
    StringWriter writer = new StringWriter();
    export.accept(writer);
    return writer.toString().replace("\r\n", "\n");
  }
}
