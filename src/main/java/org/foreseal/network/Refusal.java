package org.foreseal.network;

import java.util.List;
import org.foreseal.molecule.Molecule;
import org.foreseal.rule.Rule;

/**
 * A step that was considered and refused.
 *
 * @param rule the rule
 * @param reactants what would react
 * @param products what would form
 * @param kind what stood against it
 * @param reason why, in plain words
 * @param detail figures or circumstances, may be empty
 * @param depth depth the products would have had
 */
public record Refusal(
    Rule rule,
    List<Molecule> reactants,
    List<Molecule> products,
    Kind kind,
    String reason,
    String detail,
    int depth) {
  /** What stood against a step. */
  public enum Kind {
    /** The run does not offer what the rule needs. */
    NEED,
    /** A guard of the rule, or a species that does not last. */
    GUARD,
    /** The chemistry looks alike but does not run: a near miss of the rule. */
    NEAR_MISS,
    /** Gibbs energy. */
    GIBBS,
    /** A size limit. */
    LIMIT
  }

  /** Keeps unmodifiable copies. */
  public Refusal {
    reactants = List.copyOf(reactants);
    products = List.copyOf(products);
  }
}
