package org.foreseal.run;

import java.util.Collections;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.foreseal.molecule.Molecule;
import org.foreseal.rule.Provision;

/**
 * A run as the chemist means it, validated: everything that decides the chemistry, with units in
 * the names.
 *
 * @param title title of the run, may be empty
 * @param substrates what is studied, at least one
 * @param inWater whether the solvent is water; otherwise vapour phase or neat
 * @param waterGrams water charged, g
 * @param solids minerals and catalysts
 * @param additives acids, bases, salts, oxidants, gases, hydrogen donors
 * @param temperatureCelsius one or more temperatures, 0 to 600 C, ascending
 * @param pressureBar pressure, bar
 * @param durationHours time at temperature, h
 * @param depth steps from the charge to expand, 0 to 6
 * @param seed random seed
 * @param notes how the input was understood where that is not obvious
 * @param hydrogen what sets the hydrogen fugacity, absent when nothing was said
 * @param acidityAtRoomTemperature pH measured at 25 C, 0 to 14; absent when it follows from the
 *     solutes
 * @param vessel what the run is sealed in
 * @param chromatograph how the extract is looked at
 */
public record RunSheet(
    String title,
    List<Substrate> substrates,
    boolean inWater,
    OptionalDouble waterGrams,
    List<Solid> solids,
    List<Additive> additives,
    List<Double> temperatureCelsius,
    OptionalDouble pressureBar,
    OptionalDouble durationHours,
    int depth,
    long seed,
    List<String> notes,
    Optional<Hydrogen> hydrogen,
    OptionalDouble acidityAtRoomTemperature,
    Optional<Vessel> vessel,
    Optional<Chromatograph> chromatograph) {
  /** Default of {@link #depth}: the literature study found nothing more at a fourth step. */
  public static final int DEFAULT_DEPTH = 3;

  /** Default of {@link #seed}. */
  public static final long DEFAULT_SEED = 1;

  private static final double USUAL_LOW_CELSIUS = 150;
  private static final double USUAL_HIGH_CELSIUS = 400;

  /** Keeps unmodifiable copies. */
  public RunSheet {
    substrates = List.copyOf(substrates);
    solids = List.copyOf(solids);
    additives = List.copyOf(additives);
    temperatureCelsius = List.copyOf(temperatureCelsius);
    notes = List.copyOf(notes);
  }

  /** A run of which hydrogen, pH, vessel and chromatograph are not known. */
  public RunSheet(
      String title,
      List<Substrate> substrates,
      boolean inWater,
      OptionalDouble waterGrams,
      List<Solid> solids,
      List<Additive> additives,
      List<Double> temperatureCelsius,
      OptionalDouble pressureBar,
      OptionalDouble durationHours,
      int depth,
      long seed,
      List<String> notes) {
    this(
        title,
        substrates,
        inWater,
        waterGrams,
        solids,
        additives,
        temperatureCelsius,
        pressureBar,
        durationHours,
        depth,
        seed,
        notes,
        Optional.empty(),
        OptionalDouble.empty(),
        Optional.empty(),
        Optional.empty());
  }

  /** Remarks on temperatures for which the rules were not collected; none is the usual case. */
  public List<String> outsideUsualRange() {
    return temperatureCelsius.stream()
        .filter(t -> t < USUAL_LOW_CELSIUS || t > USUAL_HIGH_CELSIUS)
        .map(
            t ->
                Quantities.plain(t)
                    + " C lies outside "
                    + Quantities.plain(USUAL_LOW_CELSIUS)
                    + " to "
                    + Quantities.plain(USUAL_HIGH_CELSIUS)
                    + " C, for which the rules were collected")
        .toList();
  }

  /** The same run at one temperature, C. */
  public RunSheet atCelsius(double temperature) {
    return new RunSheet(
        title,
        substrates,
        inWater,
        waterGrams,
        solids,
        additives,
        List.of(temperature),
        pressureBar,
        durationHours,
        depth,
        seed,
        notes,
        hydrogen,
        acidityAtRoomTemperature,
        vessel,
        chromatograph);
  }

  /**
   * A compound under study.
   *
   * @param name name shown
   * @param molecule neutral structure
   * @param amount amount as given, with its unit
   */
  public record Substrate(String name, Molecule molecule, Optional<Amount> amount) {}

  /**
   * A mineral or catalyst.
   *
   * @param name name as given
   * @param roles what it offers
   * @param milligrams mass, mg
   * @param surfaceSquareMetresPerGram specific surface, m2/g
   */
  public record Solid(
      String name,
      Set<Provision> roles,
      OptionalDouble milligrams,
      OptionalDouble surfaceSquareMetresPerGram) {
    /** Keeps an unmodifiable copy. */
    public Solid {
      roles = inOrder(roles);
    }
  }

  /**
   * Something added besides substrates and solids.
   *
   * @param name name as given
   * @param molecule its structure when it is a molecule that can react as such
   * @param roles what it offers
   * @param amount amount as given, with its unit
   */
  public record Additive(
      String name, Optional<Molecule> molecule, Set<Provision> roles, Optional<Amount> amount) {
    /** Keeps an unmodifiable copy. */
    public Additive {
      roles = inOrder(roles);
    }
  }

  /**
   * An amount with the unit it was given in.
   *
   * @param value the number, positive
   * @param unit one of mol/kg, mmol, mg, bar
   */
  public record Amount(double value, String unit) {}

  /**
   * What the run is sealed in.
   *
   * @param volumeMillilitres inner volume, mL
   * @param kind words such as gold capsule, may be empty
   */
  public record Vessel(OptionalDouble volumeMillilitres, String kind) {}

  /**
   * How the extract is looked at.
   *
   * @param detector FID or MS
   * @param phase stationary phase
   * @param solvent extraction solvent, may be empty
   * @param derivatization what is done to polar products before the injection
   * @param detectionLimitMolePercent smallest amount seen, mole % of the substrate charged
   */
  public record Chromatograph(
      Detector detector,
      StationaryPhase phase,
      String solvent,
      Derivatization derivatization,
      double detectionLimitMolePercent) {
    /** A detection limit that a usual extract reaches, mole %; common practice. */
    public static final double USUAL_LIMIT_MOLE_PERCENT = 0.1;
  }

  /** What the column ends in. */
  public enum Detector {
    /** Flame ionization. */
    FID,
    /** Mass spectrometer, electron ionization. */
    MS
  }

  /** Stationary phases with published retention indices. */
  public enum StationaryPhase {
    /** 100 % dimethylpolysiloxane. */
    DIMETHYLPOLYSILOXANE("dimethylpolysiloxane"),
    /** 5 % phenyl, 95 % dimethylpolysiloxane. */
    FIVE_PERCENT_PHENYL("5-percent-phenyl"),
    /** Polyethylene glycol. */
    POLYETHYLENE_GLYCOL("polyethylene-glycol");

    private final String word;

    StationaryPhase(String word) {
      this.word = word;
    }

    /** The word of the run sheet. */
    public String word() {
      return word;
    }
  }

  /** What is done to polar products before the injection. */
  public enum Derivatization {
    /** Nothing. */
    NONE,
    /** Trimethylsilyl ethers and esters. */
    TRIMETHYLSILYL,
    /** Methyl esters of the acids. */
    METHYL_ESTER;

    /** The word of the run sheet. */
    public String word() {
      return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
  }

  private static Set<Provision> inOrder(Set<Provision> roles) {
    return roles.isEmpty() ? Set.of() : Collections.unmodifiableSet(EnumSet.copyOf(roles));
  }
}
