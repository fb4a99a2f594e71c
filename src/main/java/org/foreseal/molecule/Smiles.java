package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.List;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;
import org.openscience.cdk.exception.InvalidSmilesException;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.silent.SilentChemObjectBuilder;
import org.openscience.cdk.smiles.SmilesParser;

/**
 * Reads SMILES exactly as written: nothing is neutralised, any element and charge of this project
 * is taken.
 */
public final class Smiles {
  private static final int LONGEST = 2000;

  private Smiles() {}

  /**
   * Every molecule of a SMILES, in the order written.
   *
   * @throws BadInputException when it cannot be read or an atom has an impossible valence
   */
  public static List<Molecule> readAll(String smiles) {
    return readAll(smiles, Place.onCommandLine(smiles, 1));
  }

  /** As {@link #readAll(String)} for a text whose place is known. */
  public static List<Molecule> readAll(String smiles, Place place) {
    IAtomContainer container = parse(smiles, place);
    try {
      List<Molecule> molecules = new ArrayList<>();
      for (Fragment fragment : CdkBridge.fromLibrary(container).build()) {
        molecules.add(fragment.molecule());
      }
      return molecules;
    } catch (ImpossibleStructureException | IllegalArgumentException e) {
      throw new BadInputException(
          place, "not a molecule: " + e.getMessage(), "check the valences of this SMILES");
    }
  }

  /** The single molecule of a SMILES. */
  public static Molecule read(String smiles) {
    List<Molecule> all = readAll(smiles);
    if (all.size() != 1) {
      throw new BadInputException(
          Place.onCommandLine(smiles, smiles.indexOf('.') + 1),
          all.size() + " molecules where one is wanted",
          "write each molecule as its own SMILES");
    }
    return all.get(0);
  }

  static IAtomContainer parse(String smiles, Place place) {
    if (smiles.isBlank()) {
      throw new BadInputException(
          place, "no structure given", "write a SMILES such as OC(=O)Cc1ccccc1 or a name");
    }
    if (smiles.length() > LONGEST) {
      throw new BadInputException(
          place, "a SMILES of " + smiles.length() + " characters", "give one molecule");
    }
    try {
      return new SmilesParser(SilentChemObjectBuilder.getInstance()).parseSmiles(smiles);
    } catch (InvalidSmilesException e) {
      throw new BadInputException(
          new Place(place.source(), place.line(), column(e, place), place.text()),
          "SMILES not understood: " + problem(e),
          "close every ring and bracket; aromatic nitrogen with H is [nH]");
    }
  }

  /**
   * The parser prints the text with a caret below it; the caret's column is counted from the start
   * of the SMILES.
   */
  private static int column(InvalidSmilesException e, Place place) {
    String message = String.valueOf(e.getMessage());
    int lastBreak = message.lastIndexOf('\n');
    int caret = message.lastIndexOf('^');
    int offset = caret > lastBreak && lastBreak >= 0 ? caret - lastBreak - 1 : 0;
    return Math.max(1, place.column()) + offset;
  }

  private static String problem(InvalidSmilesException e) {
    String first = String.valueOf(e.getMessage()).lines().findFirst().orElse("");
    int comma = first.lastIndexOf("', ");
    return (comma >= 0 ? first.substring(comma + 3) : first).replaceAll(":$", "");
  }
}
