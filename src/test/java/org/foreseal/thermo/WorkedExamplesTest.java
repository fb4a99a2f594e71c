package org.foreseal.thermo;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Smiles;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/**
 * The study fit, section 10: fifteen molecules worked out by an independent implementation of the
 * same method with the same terms. Tolerance 0.05 in kJ/mol or J/(mol K), as the study gives it.
 */
class WorkedExamplesTest {
  private static final double TOLERANCE = 0.05;
  private static final double KELVIN = 573.15;

  @ParameterizedTest(name = "{1}")
  @CsvFileSource(resources = "/thermo/worked-examples.csv", numLinesToSkip = 1)
  void equalsTheStudy(
      String smiles,
      String name,
      double sigma,
      int isomers,
      double enthalpy,
      double enthalpySd,
      double entropy,
      double entropySd,
      double cp300,
      double cp400,
      double cp500,
      double cp600,
      double cp800,
      double gibbs298,
      double gibbs573,
      double gibbs573Sd) {
    Molecule molecule = Smiles.read(smiles);
    Thermochemistry t = GasPhase.standard().of(molecule).value().orElseThrow();
    HeatCapacity cp = t.heatCapacity();
    assertAll(
        name,
        () -> assertEquals(sigma, t.symmetryNumber()),
        () -> assertEquals(isomers, t.opticalIsomers()),
        () -> assertEquals(enthalpy, t.enthalpy298KilojoulesPerMole().value(), TOLERANCE),
        () ->
            assertEquals(
                enthalpySd, t.enthalpy298KilojoulesPerMole().standardDeviation(), TOLERANCE),
        () -> assertEquals(entropy, t.entropy298JoulesPerMoleKelvin().value(), TOLERANCE),
        () ->
            assertEquals(
                entropySd, t.entropy298JoulesPerMoleKelvin().standardDeviation(), TOLERANCE),
        () -> assertEquals(cp300, cp.at(300), TOLERANCE),
        () -> assertEquals(cp400, cp.at(400), TOLERANCE),
        () -> assertEquals(cp500, cp.at(500), TOLERANCE),
        () -> assertEquals(cp600, cp.at(600), TOLERANCE),
        () -> assertEquals(cp800, cp.at(800), TOLERANCE),
        () ->
            assertEquals(
                gibbs298,
                GasPhase.standard().formationGibbs(molecule, 298.15).value().orElseThrow().value(),
                TOLERANCE),
        () -> assertEquals(gibbs573, t.apparentGibbs(KELVIN).value(), TOLERANCE),
        () -> assertEquals(gibbs573Sd, t.apparentGibbs(KELVIN).standardDeviation(), TOLERANCE));
  }
}
