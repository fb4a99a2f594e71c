package org.foreseal.network;

import static org.junit.jupiter.api.Assertions.assertTrue;

import org.foreseal.molecule.Smiles;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Species that the unguarded catalogue made from simple substrates in hot water over an iron oxide
 * and that no chemist would look for. Each is stopped by a guard or limit of the rule files;
 * verdicts are common practice.
 */
class ImplausibleSpeciesTest {
  @ParameterizedTest
  @CsvSource({
    "OC(=O)Cc1ccccc1, O=CC(=C(O)c1ccccc1)c1ccccc1, free enol of an aldol",
    "OC(=O)Cc1ccccc1, O=C(O)C(C(=O)C(C(=O)O)c1ccccc1)c1ccccc1, two beta-keto acids in one",
    "OC(=O)Cc1ccccc1, O=C(O)C(Cc1ccccc1)c1ccccc1, a beta-keto acid loses CO2 and never CO",
    "OC(=O)Cc1ccccc1, O=C(C(=O)C(O)c1ccccc1)c1ccccc1, oxidised twice before cleavage",
    "OC(=O)Cc1ccccc1, O=COC(Cc1ccccc1)C(C(=O)Cc1ccccc1)c1ccccc1, formate of an aldol in water",
    "OC(=O)Cc1ccccc1, O=C(COC(=O)c1ccccc1)c1ccccc1, Tishchenko ester oxidised",
    "OC(=O)Cc1ccccc1, C=C, ethene from the carbon of CO2",
    "OC(=O)CCCCC, CCCCCCC(=O)O, chain growth on an acid",
    "OC(=O)CCCCC, CC=CC=CC(=O)O, dienoic acid under hydrogen",
    "OC(=O)CCCCC, CC=CCCC(=O)C=CCCC, ketone of two dehydro acids",
    "OC(=O)CCCCC, CCCCC(=O)OC, methyl ester from CO2",
    "OC1CCCCC1, CC1=CCCC1O, ring contraction next to OH",
    "OC1CCCCC1, O=C1CCCC(=O)C1=O, cyclic triketone",
    "OC1CCCCC1, O=COc1ccccc1, phenyl formate in water",
    "OC1CCCCC1, Oc1ccccc1CC1=CCCC1, contraction of an allylphenol",
    "O=Cc1ccccc1, O=C(O)c1cccc(Cc2ccccc2)c1, benzylation of benzoic acid",
    "O=Cc1ccccc1, O=C(OCc1cccc(C(=O)c2ccccc2)c1)c1ccccc1, substituted benzyl benzoate in hot water",
    "NCC(=O)O, N#CC(N)CN=CCN, Strecker at 300 C",
    "NCC(=O)O, O=CN(CC(=O)O)CC(=O)NCC(=O)O, tertiary N-formyl peptide in water"
  })
  void absurdProductsAreNotInTheNetwork(String substrate, String species, String why) {
    Network network = Networks.grow(Limits.ofDepth(3), substrate);
    assertTrue(network.find(Smiles.read(species)).isEmpty(), why);
  }
}
