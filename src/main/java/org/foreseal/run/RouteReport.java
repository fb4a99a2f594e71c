package org.foreseal.run;

import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.foreseal.molecule.Molecule;

/**
 * How a product comes about, or why it does not.
 *
 * @param tool what made it
 * @param sheet the run as understood
 * @param name name of the product
 * @param product its structure
 * @param routes best routes first; none when it is not expected
 * @param sourcesByRule for each rule id of the routes, where the rule comes from: a reference and
 *     what it says
 * @param reason why there is no route, in plain words
 * @param notes remarks for the reader
 * @param network size of the network that was searched
 */
public record RouteReport(
    ToolInfo tool,
    RunSheet sheet,
    String name,
    Molecule product,
    List<ForecastRoute> routes,
    Map<String, List<String>> sourcesByRule,
    Optional<String> reason,
    List<String> notes,
    NetworkSummary network) {
  /** Keeps unmodifiable copies. */
  public RouteReport {
    routes = List.copyOf(routes);
    sourcesByRule = Collections.unmodifiableMap(new TreeMap<>(sourcesByRule));
    notes = List.copyOf(notes);
  }
}
