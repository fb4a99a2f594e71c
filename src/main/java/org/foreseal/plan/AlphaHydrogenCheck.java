package org.foreseal.plan;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import org.foreseal.molecule.Molecule;
import org.foreseal.plan.AlphaHydrogenReport.Acid;
import org.foreseal.plan.AlphaHydrogenReport.AlphaCarbon;
import org.foreseal.plan.AlphaHydrogenReport.Ketone;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;

/**
 * Tells which carboxylic acids can ketonize: at least one of the two partners must own an alpha
 * hydrogen. Two blocked acids give nothing; a blocked acid may still be the acyl partner.
 */
public final class AlphaHydrogenCheck {
  private final Function<Molecule, String> names;

  /**
   * A check.
   *
   * @param names what a chemist would call a molecule
   */
  public AlphaHydrogenCheck(Function<Molecule, String> names) {
    this.names = names;
  }

  /**
   * An acid as asked for.
   *
   * @param place where it was written, for complaints
   */
  public record Given(String name, Molecule molecule, Place place) {}

  private record Sites(
      Acid acid, Molecule molecule, List<Carboxyl> groups, List<AlphaPosition> positions) {
    /** The group that is lost as CO2 when this acid is the enolate. */
    Optional<Carboxyl> enolizableGroup() {
      for (int i = 0; i < groups.size(); i++) {
        if (positions.get(i).isEnolizable()) {
          return Optional.of(groups.get(i));
        }
      }
      return Optional.empty();
    }

    boolean isFormicAcid() {
      return groups.get(0).alpha().isEmpty();
    }

    String name() {
      return acid.name();
    }
  }

  /**
   * The report on these acids.
   *
   * @throws BadInputException when one is no carboxylic acid or is given twice
   */
  public AlphaHydrogenReport check(List<Given> acids) {
    List<Sites> sites = new ArrayList<>();
    for (Given given : acids) {
      Sites read = sites(given);
      if (sites.stream().anyMatch(s -> s.molecule().equals(read.molecule()))) {
        throw new BadInputException(
            given.place(), given.name() + " is given twice", "each acid once: pairs are made here");
      }
      sites.add(read);
    }
    List<Ketone> ketones = new ArrayList<>();
    for (int i = 0; i < sites.size(); i++) {
      for (int j = i; j < sites.size(); j++) {
        ketones.add(
            i == j ? withItself(i, sites.get(i)) : crossed(i, sites.get(i), j, sites.get(j)));
      }
    }
    return new AlphaHydrogenReport(sites.stream().map(Sites::acid).toList(), ketones);
  }

  private static Sites sites(Given given) {
    Molecule molecule = given.molecule();
    List<Carboxyl> groups = Carboxyl.of(molecule);
    if (groups.isEmpty()) {
      throw new BadInputException(
          given.place(),
          given.name() + " is not a carboxylic acid",
          "give acids with a COOH group; of an ester or anhydride give the acid it hydrolyses to");
    }
    List<AlphaPosition> positions =
        groups.stream().map(g -> AlphaPosition.of(molecule, g, groups)).toList();
    return new Sites(acid(given, groups, positions), molecule, groups, positions);
  }

  private static Acid acid(Given given, List<Carboxyl> groups, List<AlphaPosition> positions) {
    Map<Integer, AlphaPosition> byAtom = new LinkedHashMap<>();
    for (int i = 0; i < groups.size(); i++) {
      if (groups.get(i).alpha().isPresent()) {
        byAtom.put(groups.get(i).alpha().getAsInt(), positions.get(i));
      }
    }
    int hydrogens =
        byAtom.values().stream()
            .filter(AlphaPosition::isEnolizable)
            .mapToInt(AlphaPosition::hydrogens)
            .sum();
    boolean canGiveEnolate = positions.stream().anyMatch(AlphaPosition::isEnolizable);
    List<String> reasons =
        positions.stream()
            .filter(p -> p.isEnolizable() == canGiveEnolate)
            .map(AlphaPosition::reason)
            .distinct()
            .toList();
    return new Acid(
        given.name(),
        given.molecule(),
        byAtom.values().stream().map(p -> new AlphaCarbon(p.kind(), p.hydrogens())).toList(),
        hydrogens,
        canGiveEnolate,
        String.join("; ", reasons),
        positions.stream().flatMap(p -> p.caution().stream()).distinct().toList());
  }

  private Ketone withItself(int index, Sites acid) {
    Optional<Carboxyl> lost = acid.enolizableGroup();
    if (lost.isEmpty()) {
      return none(index, index, acid.name() + ": " + acid.acid().reason());
    }
    Optional<Molecule> ring =
        KetoneBuilder.ring(
            acid.molecule(),
            acid.groups(),
            acid.positions().stream().map(AlphaPosition::isEnolizable).toList());
    if (ring.isPresent()) {
      return ketone(index, index, ring.get(), "ring ketone within one molecule", List.of(acid));
    }
    Molecule open = KetoneBuilder.between(acid.molecule(), lost.get(), acid.molecule(), lost.get());
    String how =
        acid.groups().size() > 1
            ? "between two molecules; the acid groups left over can go on to oligomers"
            : "one molecule gives the enolate, another the acyl group";
    return ketone(index, index, open, how, List.of(acid));
  }

  private Ketone crossed(int i, Sites a, int j, Sites b) {
    if (a.isFormicAcid() || b.isFormicAcid()) {
      return none(i, j, "formic acid has no carbon group to put into a ketone");
    }
    if (a.enolizableGroup().isEmpty() && b.enolizableGroup().isEmpty()) {
      return none(i, j, "no alpha-H on either side; " + reason(a) + "; " + reason(b));
    }
    boolean firstIsEnolate = a.enolizableGroup().isPresent();
    Sites enolate = firstIsEnolate ? a : b;
    Sites acyl = firstIsEnolate ? b : a;
    Molecule ketone =
        KetoneBuilder.between(
            enolate.molecule(),
            enolate.enolizableGroup().orElseThrow(),
            acyl.molecule(),
            acyl.enolizableGroup().orElse(acyl.groups().get(0)));
    String how =
        acyl.enolizableGroup().isPresent()
            ? "either acid can give the enolate"
            : enolate.name() + " gives the enolate, " + acyl.name() + " the acyl group";
    return ketone(i, j, ketone, how, List.of(a, b));
  }

  private static String reason(Sites sites) {
    return sites.name() + ": " + sites.acid().reason();
  }

  private static Ketone none(int i, int j, String reason) {
    return new Ketone(i, j, Optional.empty(), "", reason);
  }

  private Ketone ketone(int i, int j, Molecule ketone, String how, List<Sites> acids) {
    List<String> cautions =
        acids.stream().flatMap(s -> s.acid().cautions().stream()).distinct().toList();
    String reason = cautions.isEmpty() ? how : how + "; caution: " + String.join("; ", cautions);
    return new Ketone(i, j, Optional.of(ketone), names.apply(ketone), reason);
  }
}
