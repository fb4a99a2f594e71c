package org.foreseal.run;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;
import org.foreseal.rule.Provision;
import org.foreseal.run.RunSheet.Solid;

/** Minerals and catalysts by their usual names, with what each offers a reaction. */
public final class SolidCatalogue {
  private final Catalogue table;

  private SolidCatalogue(Catalogue table) {
    this.table = table;
  }

  /** The solids that come with the tool. */
  public static SolidCatalogue builtIn() {
    return new SolidCatalogue(Catalogue.load("solids.csv"));
  }

  /**
   * A known solid, without amounts.
   *
   * @param statedRoles roles the user gave; they stand in for the built-in ones when not empty
   * @throws BadInputException when the name is not known and no roles are stated
   */
  public Solid read(String name, Set<Provision> statedRoles, Place place) {
    Optional<Catalogue.Entry> known = table.find(name);
    if (known.isEmpty() && statedRoles.isEmpty()) {
      throw new BadInputException(place, "no solid called " + name + " is known", hint(name));
    }
    Set<Provision> roles = statedRoles.isEmpty() ? known.orElseThrow().roles() : statedRoles;
    String shown = known.map(Catalogue.Entry::name).orElse(name);
    return new Solid(shown, roles, OptionalDouble.empty(), OptionalDouble.empty());
  }

  private String hint(String name) {
    String near = String.join(" or ", Nearest.to(name, table.words()));
    return (near.isEmpty() ? "" : "did you mean " + near + "? Otherwise ")
        + "say what it does: acts_as: [oxide, acid] or \""
        + name
        + "[oxide,acid]\"; roles: "
        + String.join(", ", Roles.words());
  }

  Catalogue table() {
    return table;
  }
}
