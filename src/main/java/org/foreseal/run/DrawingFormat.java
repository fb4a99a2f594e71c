package org.foreseal.run;

/** Open formats in which a network can be handed to a drawing program. */
public enum DrawingFormat {
  /** GraphML. */
  GRAPHML,
  /** The language of Graphviz. */
  DOT
}
