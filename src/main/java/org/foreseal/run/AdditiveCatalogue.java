package org.foreseal.run;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.MoleculeReader;
import org.foreseal.molecule.ReadMolecule;
import org.foreseal.molecule.Smiles;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;
import org.foreseal.rule.Provision;
import org.foreseal.run.RunSheet.Additive;

/** Acids, bases, salts, oxidants, gases and hydrogen donors by their usual names. */
public final class AdditiveCatalogue {
  /** A formula that is the SMILES of another molecule. */
  private static final String AMBIGUOUS = "CO";

  private final Catalogue table;

  private AdditiveCatalogue(Catalogue table) {
    this.table = table;
  }

  /** The additives that come with the tool. */
  public static AdditiveCatalogue builtIn() {
    return new AdditiveCatalogue(Catalogue.load("additives.csv"));
  }

  /**
   * An additive, without its amount: a known one, one whose roles are stated, or any molecule,
   * whose roles are then read off its structure.
   *
   * @param smiles its SMILES where the user gave one
   * @param statedRoles roles the user gave; they stand in for all others when not empty
   * @param notes receives how it was understood
   * @throws org.foreseal.quantity.BadInputException when it is none of these
   */
  Additive read(
      String name,
      Optional<Molecule> smiles,
      Set<Provision> statedRoles,
      MoleculeReader molecules,
      Place place,
      List<String> notes) {
    if (AMBIGUOUS.equals(name) && smiles.isEmpty()) {
      throw new BadInputException(
          place,
          "CO could be carbon monoxide or methanol",
          "write its name; as a SMILES CO is methanol, [C-]#[O+] carbon monoxide");
    }
    Optional<Catalogue.Entry> known = table.find(name);
    if (known.isPresent() && smiles.isPresent()) {
      refuseDisagreement(known.get(), smiles.get(), place);
    }
    if (known.isPresent() && smiles.isEmpty()) {
      return additive(known.get(), statedRoles);
    }
    if (smiles.isEmpty() && !statedRoles.isEmpty()) {
      return new Additive(name, Optional.empty(), statedRoles, Optional.empty());
    }
    if (smiles.isPresent()) {
      return molecule(name, smiles.get(), statedRoles, notes);
    }
    ReadMolecule read = molecules.read(name, place);
    notes.addAll(read.notes());
    return molecule(read.name(), read.molecule(), statedRoles, notes);
  }

  private static void refuseDisagreement(Catalogue.Entry entry, Molecule given, Place place) {
    if (!entry.smiles().isEmpty() && !Smiles.read(entry.smiles()).equals(given)) {
      throw new BadInputException(
          place,
          "name and smiles disagree: " + entry.name() + " is " + entry.smiles(),
          "keep the one that is meant");
    }
  }

  private static Additive additive(Catalogue.Entry entry, Set<Provision> statedRoles) {
    return new Additive(
        entry.name(),
        Optional.of(entry.smiles()).filter(s -> !s.isEmpty()).map(Smiles::read),
        statedRoles.isEmpty() ? entry.roles() : statedRoles,
        Optional.empty());
  }

  private Additive molecule(
      String name, Molecule molecule, Set<Provision> statedRoles, List<String> notes) {
    Optional<Catalogue.Entry> known =
        table.entries().stream()
            .filter(e -> !e.smiles().isEmpty() && Smiles.read(e.smiles()).equals(molecule))
            .findFirst();
    Set<Provision> roles =
        statedRoles.isEmpty()
            ? known.map(Catalogue.Entry::roles).orElseGet(() -> Roles.of(molecule))
            : statedRoles;
    if (known.isEmpty() && statedRoles.isEmpty()) {
      notes.add("additive " + name + ": " + rolesInWords(roles) + ", by its structure");
    }
    return new Additive(name, Optional.of(molecule), roles, Optional.empty());
  }

  private static String rolesInWords(Set<Provision> roles) {
    List<String> words = new ArrayList<>();
    roles.forEach(role -> words.add(role.word()));
    return words.isEmpty()
        ? "a molecule without a role"
        : "taken as " + String.join(" and ", words);
  }

  Catalogue table() {
    return table;
  }
}
