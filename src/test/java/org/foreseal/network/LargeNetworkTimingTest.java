package org.foreseal.network;

import java.util.EnumSet;
import java.util.Locale;
import org.foreseal.rule.Provision;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Prints how long a large network takes; asserts nothing about it. */
@Tag("benchmark")
class LargeNetworkTimingTest {
  @Test
  void growsFiftyThousandSpecies() {
    EnumSet<Provision> offered =
        EnumSet.of(
            Provision.WATER,
            Provision.OXIDE,
            Provision.IRON_BEARING,
            Provision.METAL,
            Provision.BASE,
            Provision.HOMOLYSIS);
    long start = System.nanoTime();
    Network network =
        Networks.grow(
            Limits.ofDepth(5).withSpecies(50_000),
            offered,
            "CCC=CCC=CCC=CCCCCCC(=O)O",
            "O=C(CCc1ccccc1)CCc1ccccc1");
    System.out.printf(
        Locale.ROOT,
        "trienoic acid and 1,5-diphenyl-3-pentanone: %d species, %d steps, %.1f s, %s%n",
        network.species().size(),
        network.steps().size(),
        (System.nanoTime() - start) / 1e9,
        network.stoppedBy());
  }
}
