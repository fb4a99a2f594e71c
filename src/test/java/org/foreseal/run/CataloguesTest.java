package org.foreseal.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.MoleculeNames;
import org.foreseal.molecule.MoleculeReader;
import org.foreseal.molecule.Smiles;
import org.foreseal.quantity.Place;
import org.foreseal.rule.Provision;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CataloguesTest {
  private static final Place NOWHERE = Place.onCommandLine("", 0);

  @ParameterizedTest
  @CsvSource({
    "magnetite, oxide spinel-type iron-bearing",
    "hematite, oxide corundum-type iron-bearing",
    "alumina, oxide corundum-type",
    "gamma-alumina, oxide acid dehydrating",
    "Gamma Alumina, oxide acid dehydrating",
    "silica, oxide",
    "pyrite, sulfide iron-bearing",
    "sphalerite, sulfide",
    "Pt/C, metal",
    "raney nickel, metal",
    "CuO, oxide oxidant",
    "FeOOH, oxide iron-bearing",
    "MgO, oxide base",
    "montmorillonite, oxide acid dehydrating",
    "calcite, base",
    "activated carbon, inert"
  })
  void knowsSolidsByTheirUsualNames(String name, String roles) {
    Set<Provision> found = SolidCatalogue.builtIn().read(name, Set.of(), NOWHERE).roles();
    assertEquals(
        Set.of(roles.split(" ")), found.stream().map(Provision::word).collect(Collectors.toSet()));
  }

  @Test
  void givesEveryEntryAReasonAndASource() {
    List<Catalogue.Entry> all = new ArrayList<>(SolidCatalogue.builtIn().table().entries());
    all.addAll(AdditiveCatalogue.builtIn().table().entries());
    for (Catalogue.Entry entry : all) {
      assertFalse(entry.why().isEmpty(), entry.name());
      assertEquals("common practice", entry.source(), entry.name());
    }
  }

  @Test
  void givesEverySolidARole() {
    for (Catalogue.Entry entry : SolidCatalogue.builtIn().table().entries()) {
      assertFalse(entry.roles().isEmpty(), entry.name());
      assertTrue(entry.smiles().isEmpty(), entry.name());
      assertFalse(
          entry.roles().contains(Provision.INERT) && entry.roles().size() > 1, entry.name());
    }
  }

  /** Spinel and corundum are structures of oxides, and no solid has both. */
  @Test
  void givesStructureTypesToOxidesOnly() {
    for (Catalogue.Entry entry : SolidCatalogue.builtIn().table().entries()) {
      boolean spinel = entry.roles().contains(Provision.SPINEL_TYPE);
      boolean corundum = entry.roles().contains(Provision.CORUNDUM_TYPE);
      assertFalse(spinel && corundum, entry.name());
      assertTrue(!(spinel || corundum) || entry.roles().contains(Provision.OXIDE), entry.name());
    }
  }

  /** The name reader is a second opinion on every structure whose name it knows. */
  @Test
  void agreesWithTheNameReaderOnStructures() {
    MoleculeReader reader = new MoleculeReader(MoleculeNames.builtIn());
    Set<String> salts =
        Set.of(
            "sodium acetate",
            "sodium formate",
            "ammonium chloride",
            "ammonium carbonate",
            "ammonium sulfate",
            "ammonium formate",
            "copper(II) acetate",
            "sodium sulfide",
            "air",
            "heavy water");
    int compared = 0;
    for (Catalogue.Entry entry : AdditiveCatalogue.builtIn().table().entries()) {
      if (!entry.smiles().isEmpty() && !salts.contains(entry.name())) {
        Molecule byName = reader.read(entry.name(), NOWHERE).molecule();
        assertEquals(byName, Smiles.read(entry.smiles()), entry.name());
        compared++;
      }
    }
    assertTrue(compared > 25, compared + " compared");
  }
}
