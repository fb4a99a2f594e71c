package org.foreseal.molecule;

import io.github.dan2097.jnainchi.InchiStatus;
import java.util.Optional;
import org.openscience.cdk.exception.CDKException;
import org.openscience.cdk.inchi.InChIGenerator;
import org.openscience.cdk.inchi.InChIGeneratorFactory;

/** InChIKeys of the flat structure, by the InChI library. */
public final class InchiKeys {
  private InchiKeys() {}

  /**
   * The InChIKey, or nothing where the InChI library has no native code for this machine or refuses
   * the structure.
   */
  public static Optional<String> of(Molecule molecule) {
    try {
      InChIGenerator generator =
          InChIGeneratorFactory.getInChIGenerator(CdkBridge.toLibrary(molecule));
      return generator.getStatus() == InchiStatus.ERROR
          ? Optional.empty()
          : Optional.of(generator.getInchiKey());
    } catch (CDKException | UnsatisfiedLinkError | NoClassDefFoundError e) {
      return Optional.empty();
    }
  }
}
