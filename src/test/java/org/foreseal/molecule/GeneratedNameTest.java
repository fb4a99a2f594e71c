package org.foreseal.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.foreseal.quantity.BadInputException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Every built name is read back by the name library; not one may mean another molecule. */
class GeneratedNameTest {
  private static final long SEED = Long.getLong("foreseal.seed", 20261201L);
  private static final int MOLECULES = 6000;
  private static final double PROMISED_SHARE = 0.85;

  private static String fault(Molecule molecule, String name) {
    Optional<SystematicNames.Structure> read = SystematicNames.parse(name);
    if (read.isEmpty() || !read.get().warning().isEmpty()) {
      return molecule + " " + name + ": not read without doubt " + read;
    }
    boolean same = Smiles.readAll(read.get().smiles()).equals(List.of(molecule));
    return same ? "" : molecule + " " + name + ": read as " + read.get().smiles();
  }

  private static Map<String, Molecule> randomMolecules() {
    RandomMolecules source = new RandomMolecules(SEED);
    Map<String, Molecule> result = new LinkedHashMap<>();
    while (result.size() < MOLECULES) {
      molecule(source.next()).ifPresent(m -> result.putIfAbsent(m.key(), m));
    }
    return result;
  }

  /** The generator does not count valences; what has too many bonds is simply no molecule. */
  private static Optional<Molecule> molecule(String smiles) {
    try {
      return Optional.of(Smiles.read(smiles));
    } catch (BadInputException tooManyBonds) {
      return Optional.empty();
    }
  }

  @Test
  void everyBuiltNameOfRandomMoleculesMeansTheMolecule() {
    List<String> faults = new ArrayList<>();
    int named = 0;
    Map<String, Molecule> molecules = randomMolecules();
    for (Molecule m : molecules.values()) {
      Optional<String> name = GeneratedName.of(m);
      String fault = name.map(n -> fault(m, n)).orElse("");
      named += name.isPresent() ? 1 : 0;
      if (!fault.isEmpty()) {
        faults.add(fault);
      }
    }
    assertEquals(List.of(), faults, "seed " + SEED);
    assertTrue(
        named >= PROMISED_SHARE * molecules.size(), "seed " + SEED + ": only " + named + " named");
  }

  @Test
  void everyBuiltNameOfCuratedMoleculesMeansTheMolecule() {
    List<String> faults = new ArrayList<>();
    int named = 0;
    for (CommonNames.Entry entry : new CommonNames().all()) {
      Molecule m = Smiles.read(entry.smiles());
      Optional<String> name = GeneratedName.of(m);
      named += name.isPresent() ? 1 : 0;
      name.map(n -> fault(m, n)).filter(f -> !f.isEmpty()).ifPresent(faults::add);
    }
    assertEquals(List.of(), faults);
    assertTrue(named > 1000, "only " + named);
  }

  /** Checks every locant of the table: a methyl group at each place of each ring. */
  @Test
  void everyPlaceOfEveryRingParentHasItsLocant() throws ImpossibleStructureException {
    List<String> faults = new ArrayList<>();
    int places = 0;
    for (RingParent parent : RingParents.builtIn().all()) {
      Molecule ring = parent.structure();
      for (int atom = 0; atom < ring.atomCount(); atom++) {
        if (ring.hydrogens(atom) > 0) {
          MoleculeBuilder builder = new MoleculeBuilder();
          builder.append(ring);
          builder.changeHydrogens(atom, -1);
          builder.setOrder(atom, builder.addAtom(6, 0, 3), 1);
          Molecule methylated = builder.build().get(0).molecule();
          faults.add(fault(methylated, GeneratedName.of(methylated).orElse("no name")));
          places++;
        }
      }
    }
    faults.removeIf(String::isEmpty);
    assertEquals(List.of(), faults);
    assertTrue(places > 300, "only " + places);
  }

  @Test
  void everyRingParentHasItsName() {
    for (RingParent parent : RingParents.builtIn().all()) {
      assertEquals("", fault(parent.structure(), parent.name()));
    }
  }

  @ParameterizedTest
  @CsvSource({
    "CCCCC(=O)C(C)C, 2-methyl-3-heptanone",
    "CC(C)C(=O)CCC, 2-methyl-3-hexanone",
    "CCCCCCOC(=O)CCCCC, hexyl hexanoate",
    "CC=CC(=O)C, (E)-3-penten-2-one",
    "CCC=CC=CCO, '(2E,4E)-2,4-heptadien-1-ol'",
    "c1ccccc1C=CCC, (E)-1-phenyl-1-butene",
    "CC(c1ccccc1)CCC, 2-phenylpentane",
    "CC(c1ccccc1)C(C)c1ccccc1, '2,3-diphenylbutane'",
    "OCC(c1ccccc1)CCC, 2-phenyl-1-pentanol",
    "Cc1ccc(CCC(=O)O)cc1, 3-(4-methylphenyl)propanoic acid",
    "CCc1cc(C)c(O)cc1, 4-ethyl-2-methylphenol",
    "CCc1ccc(C(=O)O)c(C)c1, 4-ethyl-2-methylbenzoic acid",
    "Cc1cc(C)c(CC=O)cc1, '(2,4-dimethylphenyl)acetaldehyde'",
    "CCCCCCC=O, heptanal",
    "CCCCCC(C)S, 2-heptanethiol",
    "CCCC(N)CC, 3-hexanamine",
    "CCCCCCCN, heptylamine",
    "CCCCCCC#N, heptanenitrile",
    "CCCCOCCCCC, butyl pentyl ether",
    "CCCCCCNC(=O)CCCCC, N-hexylhexanamide",
    "CCCCCC=NCCCCCC, N-hexylidene-1-hexanamine",
    "OC1CCCCC1CC, 2-ethylcyclohexanol",
    "CC1=CC(=O)CCC1, 3-methyl-2-cyclohexen-1-one",
    "c1ccc2c(c1)CCC2Cc1ccccc1, 1-benzylindane",
    "CC(C)(C)c1cc(C(C)(C)C)c(O)cc1, '2,4-di-tert-butylphenol'",
    "CN(C1CCCC1)CC(=O)O, [cyclopentyl(methyl)amino]acetic acid",
    "COc1ccc(CCC)cc1, 1-methoxy-4-propylbenzene",
    "O=C1C(=C2CCCC2)CCC1, 2-cyclopentylidenecyclopentanone",
    "O=C1c2ccccc2CC1=C1c2ccccc2CC1, 2-(indan-1-ylidene)-1-indanone",
    "O=C(O)CCc1ccc(cc1)C1c2ccccc2C(=O)C1, 3-[4-(3-oxoindan-1-yl)phenyl]propanoic acid",
    "O=C1OC(CCCC)CC1, 5-butyloxolan-2-one"
  })
  void saysItTheWayChemistsDo(String smiles, String name) {
    assertEquals(Optional.of(name), GeneratedName.of(Smiles.read(smiles)));
    assertEquals("", fault(Smiles.read(smiles), name));
  }

  @ParameterizedTest
  @ValueSource(strings = {"CCC(C)=C(C)CCC", "CC(=CC)C(C)C", "CC(C)=CC", "C=CCC"})
  void givesNoDescriptorWhereTransIsNotTheStableIsomerForSure(String smiles) {
    assertFalse(GeneratedName.of(Smiles.read(smiles)).orElseThrow().contains("E"));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "O",
        "[H][H]",
        "C1CC2CCC1C2",
        "C[N+](C)(C)C",
        "CC(=O)OO",
        "CS(C)=O",
        "CC=C=O",
        "C=CC#C",
        "NC(=O)OC",
        "CP(C)C",
        "C1CCCCCCCCCCCC1",
        "N=Cc1ccccc1"
      })
  void staysSilentBeyondItsFamilies(String smiles) {
    assertEquals(Optional.empty(), GeneratedName.of(Smiles.read(smiles)));
  }
}
