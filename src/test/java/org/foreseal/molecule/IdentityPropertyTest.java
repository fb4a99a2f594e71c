package org.foreseal.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Identity under random atom orders and against the InChIKey. The structures were made by a
 * combinatorial generator: acyclic molecules with hetero atoms, fused, bridged, spiro and cage
 * skeletons, benzenoids, polyphenyls, macrocycles, and highly symmetric or look-alike graphs (cubic
 * and quartic cages, prismanes, tori, a pair of strongly regular graphs of hexavalent sulfur, a
 * pair of gadget cages that colour refinement alone cannot tell apart).
 */
class IdentityPropertyTest {
  private static final long SEED = Long.getLong("foreseal.seed", 20261201L);
  private static final int ORDERS = 10;
  private static final int PROMISED = 2000;

  private static List<String> lines(String resource) {
    InputStream in =
        Objects.requireNonNull(IdentityPropertyTest.class.getResourceAsStream(resource), resource);
    try (BufferedReader reader =
        new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8))) {
      return reader.lines().filter(line -> !line.isBlank()).toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static List<Molecule> structures() {
    return lines("/molecule/structures.smi").stream()
        .map(line -> Smiles.read(line.substring(0, line.indexOf('\t'))))
        .toList();
  }

  /** Everything a user of the molecule can see of its rings and bonds. */
  private static String visible(Molecule m) {
    StringBuilder text = new StringBuilder(m.smiles());
    for (int r = 0; r < m.ringCount(); r++) {
      text.append(Arrays.toString(m.ring(r)));
    }
    for (int i = 0; i < m.atomCount(); i++) {
      for (int k = 0; k < m.degree(i); k++) {
        text.append(m.neighbour(i, k)).append(m.order(i, k)).append(m.isAromaticBond(i, k));
      }
    }
    return text.toString();
  }

  @Test
  void everyAtomOrderGivesTheSameMoleculeDownToItsRings() throws ImpossibleStructureException {
    Reordering reordering = new Reordering(new Random(SEED));
    List<String> split = new ArrayList<>();
    for (Molecule m : structures()) {
      for (int i = 0; i < ORDERS; i++) {
        Molecule again = reordering.of(m);
        if (!again.equals(m) || !visible(again).equals(visible(m))) {
          split.add(m + " and " + again);
        }
      }
    }
    assertEquals(List.of(), split, "seed " + SEED);
  }

  @Test
  void thereAreTwoThousandDifferentMolecules() {
    Set<String> keys = new HashSet<>();
    structures().forEach(m -> keys.add(m.key()));
    assertTrue(keys.size() >= PROMISED, keys.size() + " keys");
    assertEquals(structures().size(), keys.size(), "two lines of the list are one molecule");
  }

  /** Equal keys would have failed above, so different InChIKeys always mean different keys. */
  @Test
  void inchiMergesOnlyTheListedBondShiftIsomers() {
    Map<String, Set<String>> byInchi = new HashMap<>();
    for (Molecule m : structures()) {
      byInchi
          .computeIfAbsent(InchiKeys.of(m).orElseThrow(), key -> new TreeSet<>())
          .add(m.smiles());
    }
    Set<String> merged = new TreeSet<>();
    byInchi.values().stream().filter(s -> s.size() > 1).forEach(merged::addAll);
    Set<String> listed = new TreeSet<>();
    for (String line : lines("/molecule/bond-shift-isomers.smi")) {
      listed.add(Smiles.read(line).smiles());
    }
    assertEquals(listed, merged);
  }

  /**
   * InChI takes these pairs for one: it lets a hydrogen move between hetero atoms and does not see
   * where localised double bonds are. Here they are species of their own, since a network turns one
   * into the other by a step with its own Gibbs energy.
   */
  @ParameterizedTest
  @CsvSource({
    // Mobile hydrogen between N and O of a ring: lactam and lactim.
    "Oc1ccccn1, O=C1C=CC=CN1",
    "Oc1ncccn1, O=C1N=CC=CN1",
    // Mobile hydrogen between two ring nitrogens.
    "Cc1c[nH]cn1, Cc1cnc[nH]1",
    "Cc1cc[nH]n1, Cc1ccn[nH]1",
    // Mobile hydrogen of amidines.
    "CN=C(C)N, CNC(C)=N",
    // Thioacid: hydrogen on S or on O.
    "CC(=O)S, CC(O)=S",
    // Localised double bonds shifted by one place.
    "CC1=C(C)C=CC=CC=C1, CC1=CC=CC=CC=C1C"
  })
  void inchiMergesWhatIsKeptApartHere(String one, String other) {
    assertNotEquals(Smiles.read(one), Smiles.read(other));
    assertEquals(
        InchiKeys.of(Smiles.read(one)).orElseThrow(),
        InchiKeys.of(Smiles.read(other)).orElseThrow());
  }

  /** Keto form here, two compounds for InChI: hydrogen on carbon is not mobile for it. */
  @ParameterizedTest
  @CsvSource({"OC=C, CC=O", "CC(O)=CC(C)=O, CC(=O)CC(C)=O", "OC1=CCCCC1, O=C1CCCCC1"})
  void enolsAreTheirKetonesHere(String enol, String ketone) {
    assertEquals(Smiles.read(enol), Smiles.read(ketone));
  }

  @ParameterizedTest
  @CsvSource({
    // Equal neighbourhoods of every atom, different graphs.
    "C1CCC(C1)C1CCCC1, C1CCC2CCCCC2C1",
    // Equal eigenvalues of the adjacency matrix.
    "C=Cc1ccc(C=C)cc1, C=CC(=C)c1ccccc1",
    "C1CCCCCCCCCCC1, C1CCCCC1"
  })
  void tellsLookAlikesApart(String one, String other) {
    assertNotEquals(Smiles.read(one).key(), Smiles.read(other).key());
  }
}
