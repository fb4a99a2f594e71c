package org.foreseal.molecule;

import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.IntStream;

/** Tells SMILES from names by their letters, and finds where in the text each atom stands. */
final class SmilesText {
  private static final String ATOM = "\\[[0-9A-Za-z@+\\-:#*]*\\]|Cl|Br|[BCNOPSFIbcnops*]";
  private static final Pattern TOKEN =
      Pattern.compile("(" + ATOM + ")|[-=#$:/\\\\.()>~]|%[0-9][0-9]|[0-9]");
  private static final Pattern HYDROGEN = Pattern.compile("\\[[0-9]*H[+\\-0-9]*\\]");

  /** Names never hold these. */
  private static final Pattern ONLY_IN_SMILES = Pattern.compile("[=#@>$\\\\]");

  /** A bond or dot at either end, before a closing bracket, or beside a dot. */
  private static final Pattern DANGLING =
      Pattern.compile("^[-=#:/\\\\.]|[-=#:/\\\\.]$|[-=#:/\\\\.][).]|\\.[-=#:/\\\\]");

  private SmilesText() {}

  /** True when the whole text is made of SMILES tokens, or holds a character no name has. */
  static boolean looksLikeSmiles(String text) {
    return isAllTokens(text) || ONLY_IN_SMILES.matcher(text).find();
  }

  static boolean isAllTokens(String text) {
    Matcher m = TOKEN.matcher(text);
    boolean atoms = false;
    int at = 0;
    while (at < text.length() && m.find() && m.start() == at) {
      at = m.end();
      atoms |= m.group(1) != null;
    }
    return at == text.length() && atoms;
  }

  /** Start of every atom, hydrogens included, in the order written. */
  static int[] atomOffsets(String smiles) {
    Matcher m = TOKEN.matcher(smiles);
    IntStream.Builder starts = IntStream.builder();
    while (m.find()) {
      if (m.group(1) != null) {
        starts.add(m.start());
      }
    }
    return starts.build().toArray();
  }

  /** Atoms other than hydrogen that are written in the text. */
  static long heavyAtoms(String smiles) {
    return TOKEN
        .matcher(smiles)
        .results()
        .filter(r -> r.group(1) != null && !HYDROGEN.matcher(r.group(1)).matches())
        .count();
  }

  /** Symbols of the heavy atoms, sorted; for well-formed SMILES without isotopes. */
  static String heavyAtomsOf(String smiles) {
    return TOKEN
        .matcher(smiles)
        .results()
        .map(r -> r.group(1))
        .filter(atom -> atom != null && !HYDROGEN.matcher(atom).matches())
        .map(SmilesText::symbol)
        .sorted()
        .collect(Collectors.joining());
  }

  private static String symbol(String atom) {
    String inner = atom.startsWith("[") ? atom.substring(1) : atom;
    boolean twoLetters = inner.startsWith("Cl") || inner.startsWith("Br");
    return inner.substring(0, twoLetters ? 2 : 1).toUpperCase(Locale.ROOT);
  }

  /** As {@link #heavyAtomsOf(String)}, of a molecule. */
  static String heavyAtomsOf(Molecule molecule) {
    return IntStream.range(0, molecule.atomCount())
        .filter(i -> molecule.element(i) != 1)
        .mapToObj(
            i -> ChemicalElement.require(molecule.element(i)).symbol().toUpperCase(Locale.ROOT))
        .sorted()
        .collect(Collectors.joining());
  }

  /** The first thing that is SMILES but no molecule of this project: offset and what it is. */
  static Optional<Trouble> trouble(String smiles) {
    for (int i = 0; i < smiles.length(); i++) {
      Optional<Trouble> found = troubleAt(smiles.charAt(i), i);
      if (found.isPresent()) {
        return found;
      }
    }
    Matcher dangling = DANGLING.matcher(smiles);
    return dangling.find()
        ? Optional.of(
            new Trouble(
                dangling.start(),
                "a bond or dot that joins nothing",
                "write an atom on both sides of it"))
        : Optional.empty();
  }

  private static Optional<Trouble> troubleAt(char c, int offset) {
    return switch (c) {
      case '>' ->
          Optional.of(
              new Trouble(offset, "this is a reaction", "give the substrate alone, without >>"));
      case '*' ->
          Optional.of(new Trouble(offset, "* stands for any atom", "write the atom that is there"));
      case '$', '~' ->
          Optional.of(
              new Trouble(
                  offset,
                  "bond " + c + " is not known here",
                  "use single, double or triple bonds"));
      default -> Optional.empty();
    };
  }

  /**
   * A complaint about a place in the text.
   *
   * @param offset from 0
   * @param problem what is wrong
   * @param hint what to do
   */
  record Trouble(int offset, String problem, String hint) {}
}
