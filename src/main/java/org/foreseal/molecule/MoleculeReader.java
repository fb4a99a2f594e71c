package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;

/**
 * Reads the molecule a user means from a SMILES, a name or the formula of a small species.
 *
 * <p><b>Which is it?</b> A curated name is a name; a text made of SMILES tokens only, or holding a
 * character that no name has, is SMILES; anything else is a name. The formulas of a short list
 * (H2O, CO2, HCl, CH3OH, ...) are taken where they are not SMILES of something else. Where they
 * are, SMILES wins and a note says so: CO is methanol, NO hydroxylamine, COS and CS likewise.
 *
 * <p><b>Normalisation.</b> The species of a forecast are neutral and flat. Counter-ions, hydrogen
 * halides of amines and water of crystallisation are set aside; ions and zwitterions become the
 * neutral molecule; nitro groups, N-oxides, azides, isocyanides and carbon monoxide stay
 * charge-separated, whichever way they were drawn; sulfoxides are S=O. Enols become carbonyl
 * compounds (see {@link KetoForm}). Stereo marks are kept for display only. Every such change is a
 * note.
 *
 * <p><b>Refused</b>, with a place and a hint: isotopes, radicals, metals in a molecule, permanent
 * charges, elements beyond C H N O S P F Cl Br I, more than 60 heavy atoms, reactions, wildcards,
 * several molecules, and what is neither a SMILES nor a known name. No text makes it throw anything
 * but {@link BadInputException}.
 */
public final class MoleculeReader {
  private static final int LONGEST_SMILES = 2000;
  private static final int LONGEST_NAME = 300;
  private static final int MOST_ATOMS_WRITTEN = 250;
  private static final Pattern REGISTRY_NUMBER = Pattern.compile("\\d{2,7}-\\d{2}-\\d");
  private static final Pattern INCHI_KEY = Pattern.compile("[A-Z]{14}-[A-Z]{10}-[A-Z]");
  private static final Pattern SEVERAL = Pattern.compile("\\s*[;+,]\\s+|\\s+[+]\\s*|\\s+and\\s+");
  private static final Pattern FORMULA = Pattern.compile("(?=.*\\d)(?=.*H)([A-Z][a-z]?\\d*)+");

  private final MoleculeNames names;
  private final SmallFormulas formulas = new SmallFormulas();

  /** A reader that knows these names besides the systematic ones. */
  public MoleculeReader(MoleculeNames names) {
    this.names = names;
  }

  /** The molecule of a text from the command line. */
  public ReadMolecule read(String text) {
    return read(text, Place.onCommandLine(text, 1));
  }

  /**
   * The molecule of a text.
   *
   * @param place where the first character of the text stands
   * @throws BadInputException when the text is no molecule this program takes
   */
  public ReadMolecule read(String text, Place place) {
    String trimmed = text.strip();
    Place start = InputAtoms.shifted(place, Math.max(0, text.indexOf(trimmed)));
    refuseUnreadable(trimmed, start);
    Optional<CommonNames.Entry> curated = names.curated(trimmed);
    if (curated.isPresent()) {
      return ofCurated(trimmed, curated.get());
    }
    Optional<SmallFormulas.Entry> formula = formulas.find(trimmed);
    if (formula.isPresent()) {
      return ofFormula(trimmed, formula.get(), start);
    }
    return SmilesText.looksLikeSmiles(trimmed)
        ? ofSmiles(trimmed, start, List.of())
        : ofName(trimmed, start);
  }

  private static void refuseUnreadable(String text, Place start) {
    if (text.isEmpty()) {
      throw new BadInputException(
          start, "no molecule given", "write a SMILES such as OC(=O)Cc1ccccc1, or a name");
    }
    if (text.length() > LONGEST_SMILES) {
      throw new BadInputException(
          start, "a text of " + text.length() + " characters", "give one molecule");
    }
    for (int i = 0; i < text.length(); i++) {
      if (Character.isISOControl(text.charAt(i)) && text.charAt(i) != '\t') {
        throw new BadInputException(
            InputAtoms.shifted(start, i),
            "a control character or line break inside the text",
            "write one molecule on one line");
      }
    }
    if (text.startsWith("InChI=") || INCHI_KEY.matcher(text).matches()) {
      throw new BadInputException(start, "InChI is not read", "write a SMILES or a name");
    }
    if (REGISTRY_NUMBER.matcher(text).matches()) {
      throw new BadInputException(
          start, "registry numbers are not read", "write a SMILES or a name");
    }
  }

  private static ReadMolecule ofCurated(String text, CommonNames.Entry entry) {
    boolean stereo = !entry.stereoSmiles().isEmpty();
    return new ReadMolecule(
        Smiles.read(entry.smiles()),
        text,
        stereo
            ? List.of("stereochemistry is set aside: all stereoisomers count as one species")
            : List.of(),
        stereo ? Optional.of(entry.stereoSmiles()) : Optional.empty());
  }

  private ReadMolecule ofFormula(String text, SmallFormulas.Entry entry, Place start) {
    if (isSmiles(text, start)) {
      Molecule asSmiles = Smiles.readAll(text, start).get(0);
      String note =
          "%s is read as the SMILES of %s; if %s is meant, write its name"
              .formatted(text, names.display(asSmiles), entry.meaning());
      boolean same = !entry.smiles().isEmpty() && Smiles.read(entry.smiles()).equals(asSmiles);
      return ofSmiles(text, start, same ? List.of() : List.of(note));
    }
    if (entry.smiles().isEmpty()) {
      throw new BadInputException(
          start,
          text + " (" + entry.meaning() + ") is no molecule this program can follow",
          "only closed-shell neutral molecules are taken");
    }
    return new ReadMolecule(
        Smiles.read(entry.smiles()), entry.meaning(), List.of(), Optional.empty());
  }

  private static boolean isSmiles(String text, Place start) {
    if (!SmilesText.isAllTokens(text)) {
      return false;
    }
    try {
      return !Smiles.readAll(text, start).isEmpty();
    } catch (BadInputException notSmiles) {
      // CO2, N2 or CCl4 are made of SMILES letters but leave a ring open: they are formulas only.
      return false;
    }
  }

  private ReadMolecule ofSmiles(String text, Place start, List<String> assumed) {
    Optional<SmilesText.Trouble> trouble = SmilesText.trouble(text);
    if (trouble.isPresent()) {
      throw new BadInputException(
          InputAtoms.shifted(start, trouble.get().offset()),
          trouble.get().problem(),
          trouble.get().hint());
    }
    long heavy = SmilesText.heavyAtoms(text);
    if (heavy > MOST_ATOMS_WRITTEN) {
      throw InputStructure.tooLarge(heavy, start);
    }
    int[] offsets = SmilesText.atomOffsets(text);
    InputStructure.Result result = InputStructure.read(Smiles.parse(text, start), offsets, start);
    List<String> notes = new ArrayList<>(assumed);
    notes.addAll(result.notes());
    return new ReadMolecule(
        result.molecule(), names.display(result.molecule()), notes, stereo(text));
  }

  private static Optional<String> stereo(String smiles) {
    boolean marked =
        smiles.indexOf('@') >= 0 || smiles.indexOf('/') >= 0 || smiles.indexOf('\\') >= 0;
    return marked ? Optional.of(smiles) : Optional.empty();
  }

  private ReadMolecule ofName(String text, Place start) {
    if (FORMULA.matcher(text).matches()) {
      throw new BadInputException(
          start, "a formula does not say which isomer", "write a SMILES or a name");
    }
    if (text.length() > LONGEST_NAME) {
      throw new BadInputException(
          start, "a name of " + text.length() + " letters", "write the SMILES instead");
    }
    SystematicNames.Structure structure =
        SystematicNames.parse(text).orElseThrow(() -> unknown(text, start));
    refuseWildcard(structure, start);
    InputStructure.Result result =
        InputStructure.read(Smiles.parse(structure.smiles(), start), new int[0], start);
    List<String> notes = new ArrayList<>(result.notes());
    String name = notes.isEmpty() ? text : names.display(result.molecule());
    if (!structure.warning().isEmpty()) {
      notes.add("the name is ambiguous; check the structure " + result.molecule().smiles());
    }
    return new ReadMolecule(result.molecule(), name, notes, stereo(structure.smiles()));
  }

  private static void refuseWildcard(SystematicNames.Structure structure, Place start) {
    if (structure.smiles().indexOf('*') >= 0) {
      throw new BadInputException(
          start, "a polymer or an open-ended group", "write the SMILES of one closed molecule");
    }
  }

  private BadInputException unknown(String text, Place start) {
    List<String> parts = SEVERAL.splitAsStream(text).toList();
    if (parts.size() > 1 && parts.stream().allMatch(p -> names.curated(p).isPresent())) {
      return new BadInputException(
          start, parts.size() + " molecules in one text", "give each molecule on its own");
    }
    String first = text.split("\\s", 2)[0];
    if (first.length() < text.length() && first.length() > 1 && SmilesText.isAllTokens(first)) {
      return new BadInputException(
          InputAtoms.shifted(start, first.length() + 1),
          "text after the SMILES",
          "write the SMILES alone or the name alone");
    }
    List<String> near = names.closest(text);
    String hint =
        near.isEmpty()
            ? "write its SMILES, or check the spelling"
            : "did you mean " + String.join(", or ", near) + "? Otherwise write its SMILES";
    return new BadInputException(start, "no structure known for this name", hint);
  }
}
