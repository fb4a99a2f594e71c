package org.foreseal.thermo;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class HeatCapacityTest {
  private static final HeatCapacity CURVE = new HeatCapacity(100, 130, 155, 175, 205);

  @Test
  void isLinearBetweenNodesAndFlatOutside() {
    assertEquals(100, CURVE.at(250));
    assertEquals(115, CURVE.at(350), 1e-12);
    assertEquals(190, CURVE.at(700), 1e-12);
    assertEquals(205, CURVE.at(900));
  }

  @Test
  void integratesAConstantExactly() {
    HeatCapacity flat = new HeatCapacity(50, 50, 50, 50, 50);
    assertEquals(50 * (700 - 298.15) / 1000, flat.enthalpyRiseKilojoulesPerMole(700), 1e-12);
    assertEquals(50 * Math.log(700 / 298.15), flat.entropyRiseJoulesPerMoleKelvin(700), 1e-10);
    assertEquals(50 * Math.log(280 / 298.15), flat.entropyRiseJoulesPerMoleKelvin(280), 1e-10);
    assertEquals(0, flat.enthalpyRiseKilojoulesPerMole(298.15));
  }

  /** Against the midpoint rule with 20,000 strips, whose error here is below 1e-6. */
  @ParameterizedTest
  @ValueSource(doubles = {299, 350, 400, 523.15, 600, 780, 1000})
  void integratesLikeASum(double temperatureKelvin) {
    int strips = 20_000;
    double width = (temperatureKelvin - 298.15) / strips;
    double enthalpy = 0;
    double entropy = 0;
    for (int k = 0; k < strips; k++) {
      double middle = 298.15 + (k + 0.5) * width;
      enthalpy += CURVE.at(middle) * width / 1000;
      entropy += CURVE.at(middle) / middle * width;
    }
    assertEquals(enthalpy, CURVE.enthalpyRiseKilojoulesPerMole(temperatureKelvin), 1e-5);
    assertEquals(entropy, CURVE.entropyRiseJoulesPerMoleKelvin(temperatureKelvin), 1e-5);
  }
}
