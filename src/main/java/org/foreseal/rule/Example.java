package org.foreseal.rule;

import java.util.List;

/**
 * A case a rule must get right: these reactants give these products. Kept as SMILES, read only when
 * rules are checked.
 *
 * @param from reactants in the order of the rule's pieces
 * @param to products among those of one outcome
 */
public record Example(List<String> from, List<String> to) {
  /** Keeps unmodifiable copies. */
  public Example {
    from = List.copyOf(from);
    to = List.copyOf(to);
  }
}
