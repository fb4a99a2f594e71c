package org.foreseal.thermo;

import java.util.List;
import java.util.Optional;
import org.foreseal.molecule.Molecule;
import org.foreseal.quantity.Uncertain;

/** Values of a molecule from the table or from its groups, or why there are none. */
final class GroupMethod {
  private final Coefficients coefficients = Coefficients.read();
  private final Calibration calibration = Calibration.read();
  private final ElementReference elements = ElementReference.read();
  private final SmallMolecules small = SmallMolecules.read(elements);

  GroupMethod() {
    CovarianceFactor covariance = CovarianceFactor.standard();
    if (coefficients.enthalpyTerms() != covariance.enthalpyTerms()
        || coefficients.entropyTerms() != covariance.entropyTerms()) {
      throw new IllegalStateException("terms and covariance in thermo/ do not belong together");
    }
  }

  ElementReference elements() {
    return elements;
  }

  /** Spread of a Gibbs energy with these parts. */
  GibbsSpread spread(double residualSquared, TermVariance terms) {
    return calibration.gibbsSpread(residualSquared, terms);
  }

  Estimate<Species> species(Molecule molecule) {
    Optional<Species> tabulated = small.find(molecule);
    if (tabulated.isPresent()) {
      return Estimate.of(tabulated.get());
    }
    Optional<String> obstacle = TypeCheck.obstacle(molecule);
    return obstacle.isPresent() ? Estimate.none(obstacle.get()) : fromGroups(molecule);
  }

  private Estimate<Species> fromGroups(Molecule molecule) {
    TypedMolecule typed = new TypedMolecule(molecule);
    FeatureCounts counts = FeatureCounts.of(typed);
    TermSum sum = new TermSum(coefficients, calibration);
    counts.asMap().forEach(sum::add);
    if (!sum.obstacles().isEmpty()) {
      return Estimate.none("no gas-phase term for " + String.join(", ", sum.obstacles()));
    }
    List<String> outside = FitScope.outside(typed, counts);
    outside.forEach(sum::addOutOfScope);
    Optional<Symmetry> symmetry = SymmetryFinder.of(typed);
    if (symmetry.isEmpty()) {
      return Estimate.none("its symmetry number is out of reach");
    }
    return Estimate.of(species(molecule, sum, symmetry.get(), !outside.isEmpty()));
  }

  private Species species(Molecule molecule, TermSum sum, Symmetry symmetry, boolean outOfScope) {
    TermVector terms = sum.vector();
    TermVariance variance = new NetTerms(CovarianceFactor.standard()).add(terms, 1).variance();
    ElementCounts counts = ElementCounts.of(molecule);
    Origin inScope = sum.fallbacks().isEmpty() ? Origin.GROUPS : Origin.GROUPS_WITH_FALLBACK;
    Thermochemistry values =
        new Thermochemistry(
            new Uncertain(sum.enthalpy(), calibration.enthalpyDeviation(variance.enthalpy())),
            new Uncertain(
                sum.entropy() + symmetry.entropyJoulesPerMoleKelvin(),
                calibration.entropyDeviation(variance.entropy())),
            sum.heatCapacity(),
            symmetry.number(),
            symmetry.opticalIsomers(),
            outOfScope ? Origin.OUT_OF_SCOPE : inScope,
            sum.fallbacks(),
            calibration.gibbsSpread(calibration.gibbsResidualSquared(), variance),
            elements.entropy298(counts));
    return new Species(values, terms, counts);
  }
}
