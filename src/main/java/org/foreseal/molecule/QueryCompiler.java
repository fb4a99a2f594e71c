package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import java.util.regex.Pattern;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IBond;
import org.openscience.cdk.isomorphism.matchers.Expr;
import org.openscience.cdk.isomorphism.matchers.QueryAtom;
import org.openscience.cdk.isomorphism.matchers.QueryBond;
import org.openscience.cdk.silent.SilentChemObjectBuilder;
import org.openscience.cdk.smarts.Smarts;
import org.openscience.cdk.smarts.SmartsResult;

/**
 * Compiles SMARTS into conditions on our own graph. The library parses the text; the conditions are
 * evaluated here, so that matching runs on the canonical molecule without conversions.
 *
 * <p>The spelling {@code [H:1]} means a hydrogen atom in every SMARTS of this project; it is
 * rewritten to {@code [#1:1]} first, because the parser would take it for "one hydrogen attached".
 */
final class QueryCompiler {
  private static final Pattern MAPPED_HYDROGEN = Pattern.compile("\\[H(\\+?:\\d+|\\+)?]");

  private QueryCompiler() {}

  /**
   * Compiles one SMARTS.
   *
   * @throws IllegalArgumentException when it does not parse or uses a primitive that is not
   *     supported
   */
  static QueryGraph compile(String smarts) {
    IAtomContainer query = SilentChemObjectBuilder.getInstance().newAtomContainer();
    SmartsResult result =
        Smarts.parseToResult(
            query, MAPPED_HYDROGEN.matcher(smarts).replaceAll(QueryCompiler::spell));
    if (!result.ok()) {
      throw new IllegalArgumentException("SMARTS not understood: " + result.getMessage());
    }
    return graph(query);
  }

  private static String spell(java.util.regex.MatchResult match) {
    String rest = match.group(1) == null ? "" : match.group(1);
    return "[#1" + rest + "]";
  }

  private static QueryGraph graph(IAtomContainer query) {
    List<QueryGraph.Atom> atoms = new ArrayList<>();
    for (IAtom atom : query.atoms()) {
      Expr expr =
          ((QueryAtom) org.openscience.cdk.interfaces.IAtom.class.cast(unwrap(atom)))
              .getExpression();
      atoms.add(
          new QueryGraph.Atom(
              atomTest(expr),
              atom.getMapIdx(),
              demanded(expr, Expr.Type.FORMAL_CHARGE),
              element(expr),
              isAromatic(expr)));
    }
    List<QueryGraph.Bond> bonds = new ArrayList<>();
    for (IBond bond : query.bonds()) {
      Expr expr = ((QueryBond) unwrap(bond)).getExpression();
      bonds.add(
          new QueryGraph.Bond(
              query.indexOf(bond.getBegin()),
              query.indexOf(bond.getEnd()),
              bondTest(expr),
              written(expr)));
    }
    return new QueryGraph(atoms, bonds);
  }

  private static IAtom unwrap(IAtom atom) {
    return org.openscience.cdk.AtomRef.deref(atom);
  }

  private static IBond unwrap(IBond bond) {
    return org.openscience.cdk.BondRef.deref(bond);
  }

  private static boolean isAromatic(Expr expr) {
    return demanded(expr, Expr.Type.AROMATIC_ELEMENT).isPresent()
        || demanded(expr, Expr.Type.IS_AROMATIC).isPresent();
  }

  private static OptionalInt element(Expr expr) {
    for (Expr.Type type :
        List.of(Expr.Type.ELEMENT, Expr.Type.ALIPHATIC_ELEMENT, Expr.Type.AROMATIC_ELEMENT)) {
      OptionalInt found = demanded(expr, type);
      if (found.isPresent()) {
        return found;
      }
    }
    return OptionalInt.empty();
  }

  /** The value of this primitive where the expression demands it: alone or joined by AND. */
  private static OptionalInt demanded(Expr expr, Expr.Type type) {
    if (expr.type() == type) {
      return OptionalInt.of(expr.value());
    }
    if (expr.type() == Expr.Type.AND) {
      OptionalInt left = demanded(expr.left(), type);
      return left.isPresent() ? left : demanded(expr.right(), type);
    }
    return OptionalInt.empty();
  }

  private static AtomTest atomTest(Expr e) {
    return switch (e.type()) {
      case TRUE, STEREOCHEMISTRY, NONE -> (m, c) -> true;
      case FALSE -> (m, c) -> false;
      case AND -> both(atomTest(e.left()), atomTest(e.right()));
      case OR -> either(atomTest(e.left()), atomTest(e.right()));
      case NOT -> not(atomTest(e.left()));
      case RECURSIVE -> recursive(e.subquery());
      default -> primitive(e.type(), e.value());
    };
  }

  private static AtomTest both(AtomTest left, AtomTest right) {
    return (m, c) -> left.accepts(m, c) && right.accepts(m, c);
  }

  private static AtomTest either(AtomTest left, AtomTest right) {
    return (m, c) -> left.accepts(m, c) || right.accepts(m, c);
  }

  private static AtomTest not(AtomTest test) {
    return (m, c) -> !test.accepts(m, c);
  }

  private static AtomTest recursive(IAtomContainer subquery) {
    QueryPlan plan = QueryPlan.anchoredAtFirst(graph(subquery));
    return plan::matchesAt;
  }

  private static AtomTest primitive(Expr.Type type, int v) {
    return switch (type) {
      case ELEMENT -> (m, c) -> AtomFacts.element(m, c) == v;
      case ALIPHATIC_ELEMENT ->
          (m, c) -> AtomFacts.element(m, c) == v && !AtomFacts.isAromatic(m, c);
      case AROMATIC_ELEMENT -> (m, c) -> AtomFacts.element(m, c) == v && AtomFacts.isAromatic(m, c);
      case IS_AROMATIC -> AtomFacts::isAromatic;
      case IS_ALIPHATIC -> (m, c) -> !AtomFacts.isAromatic(m, c);
      case TOTAL_H_COUNT -> (m, c) -> AtomFacts.hydrogens(m, c) == v;
      case TOTAL_DEGREE -> (m, c) -> AtomFacts.connections(m, c) == v;
      case DEGREE -> (m, c) -> AtomFacts.heavyNeighbours(m, c) == v;
      case FORMAL_CHARGE -> (m, c) -> AtomFacts.charge(m, c) == v;
      case IS_IN_RING -> (m, c) -> AtomFacts.rings(m, c) > 0;
      case IS_IN_CHAIN -> (m, c) -> AtomFacts.rings(m, c) == 0;
      case RING_COUNT -> (m, c) -> AtomFacts.rings(m, c) == v;
      case RING_SMALLEST -> (m, c) -> AtomFacts.smallestRing(m, c) == v;
      default ->
          throw new IllegalArgumentException(
              "SMARTS primitive " + type + " is not supported on atoms");
    };
  }

  private static BondTest bondTest(Expr e) {
    int v = e.value();
    return switch (e.type()) {
      case TRUE, STEREOCHEMISTRY -> (o, a, r) -> true;
      case SINGLE_OR_AROMATIC -> (o, a, r) -> a || o == 1;
      case DOUBLE_OR_AROMATIC -> (o, a, r) -> a || o == 2;
      case SINGLE_OR_DOUBLE -> (o, a, r) -> !a && o <= 2;
      case IS_AROMATIC -> (o, a, r) -> a;
      case IS_ALIPHATIC -> (o, a, r) -> !a;
      case ALIPHATIC_ORDER -> (o, a, r) -> !a && o == v;
      case ORDER -> (o, a, r) -> o == v;
      case IS_IN_RING -> (o, a, r) -> r;
      case IS_IN_CHAIN -> (o, a, r) -> !r;
      case AND -> both(bondTest(e.left()), bondTest(e.right()));
      case OR -> either(bondTest(e.left()), bondTest(e.right()));
      case NOT -> not(bondTest(e.left()));
      default ->
          throw new IllegalArgumentException(
              "SMARTS primitive " + e.type() + " is not supported on bonds");
    };
  }

  private static BondTest both(BondTest left, BondTest right) {
    return (o, a, r) -> left.accepts(o, a, r) && right.accepts(o, a, r);
  }

  private static BondTest either(BondTest left, BondTest right) {
    return (o, a, r) -> left.accepts(o, a, r) || right.accepts(o, a, r);
  }

  private static BondTest not(BondTest test) {
    return (o, a, r) -> !test.accepts(o, a, r);
  }

  private static QueryGraph.Written written(Expr expr) {
    if (expr.type() == Expr.Type.SINGLE_OR_AROMATIC) {
      return QueryGraph.Written.PLAIN;
    }
    if (expr.type() == Expr.Type.IS_AROMATIC) {
      return QueryGraph.Written.AROMATIC;
    }
    OptionalInt order = demanded(expr, Expr.Type.ALIPHATIC_ORDER);
    if (order.isEmpty()) {
      return QueryGraph.Written.OTHER;
    }
    return switch (order.getAsInt()) {
      case 1 -> QueryGraph.Written.SINGLE;
      case 2 -> QueryGraph.Written.DOUBLE;
      default -> QueryGraph.Written.TRIPLE;
    };
  }
}
