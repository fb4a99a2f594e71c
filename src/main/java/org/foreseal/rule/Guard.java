package org.foreseal.rule;

import java.util.List;
import java.util.Set;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Pattern;

/**
 * A condition under which a rule is refused although its pattern fits, with the reason the output
 * repeats.
 */
public sealed interface Guard {
  /** Why, in plain words. */
  String reason();

  /** Reactants, as SMILES, that the pattern of the rule takes and this guard refuses. */
  List<String> stops();

  /** Whether this guard refuses the attempt. */
  boolean refuses(Attempt attempt);

  /**
   * What a guard looks at.
   *
   * @param reactants in the order of the rule's pieces
   * @param products what would form
   * @param surroundings the run
   */
  record Attempt(List<Molecule> reactants, List<Molecule> products, Surroundings surroundings) {
    boolean isCharged(Molecule molecule) {
      return surroundings.charged().contains(molecule);
    }

    List<Molecule> partners() {
      return reactants.stream().filter(m -> !AmbientSpecies.includes(m)).toList();
    }
  }

  /** When a structural guard is lifted. */
  enum Unless {
    /** Never. */
    NEVER,
    /** When the molecule looked at was put in by the user. */
    CHARGED,
    /** When all partners were put in by the user. */
    ALL_CHARGED,
    /** When at least one partner was put in by the user. */
    ANY_CHARGED
  }

  /**
   * A reactant holds a structural feature too often.
   *
   * @param reactant which one, numbered from 0; -1 for any
   * @param pattern the feature
   * @param atMost how often it is tolerated
   * @param unless when the guard is lifted
   */
  record ReactantHolds(
      String reason, List<String> stops, int reactant, Pattern pattern, int atMost, Unless unless)
      implements Guard {
    /** Keeps an unmodifiable copy. */
    public ReactantHolds {
      stops = List.copyOf(stops);
    }

    @Override
    public boolean refuses(Attempt attempt) {
      if (isLiftedFor(attempt)) {
        return false;
      }
      for (int i = 0; i < attempt.reactants().size(); i++) {
        Molecule m = attempt.reactants().get(i);
        boolean looked = reactant < 0 || reactant == i;
        if (looked && !(unless == Unless.CHARGED && attempt.isCharged(m)) && exceeds(m)) {
          return true;
        }
      }
      return false;
    }

    private boolean isLiftedFor(Attempt attempt) {
      return switch (unless) {
        case ALL_CHARGED -> attempt.partners().stream().allMatch(attempt::isCharged);
        case ANY_CHARGED -> attempt.partners().stream().anyMatch(attempt::isCharged);
        case NEVER, CHARGED -> false;
      };
    }

    private boolean exceeds(Molecule m) {
      return atMost == 0 ? pattern.isIn(m) : pattern.count(m) > atMost;
    }
  }

  /** A product would hold a structural feature. */
  record ProductHolds(String reason, List<String> stops, Pattern pattern) implements Guard {
    /** Keeps an unmodifiable copy. */
    public ProductHolds {
      stops = List.copyOf(stops);
    }

    @Override
    public boolean refuses(Attempt attempt) {
      return attempt.products().stream().anyMatch(pattern::isIn);
    }
  }

  /** Which partners must have been put in by the user. */
  enum Partners {
    /** All of them. */
    ALL_CHARGED,
    /** At least one. */
    ONE_CHARGED,
    /** All of them, unless they are the same molecule. */
    SAME_OR_CHARGED
  }

  /** The partners were not put in by the user but formed on the way. */
  record PartnersAre(String reason, List<String> stops, Partners partners) implements Guard {
    /** Keeps an unmodifiable copy. */
    public PartnersAre {
      stops = List.copyOf(stops);
    }

    @Override
    public boolean refuses(Attempt attempt) {
      List<Molecule> organic = attempt.partners();
      return switch (partners) {
        case ALL_CHARGED -> !organic.stream().allMatch(attempt::isCharged);
        case ONE_CHARGED -> organic.stream().noneMatch(attempt::isCharged);
        case SAME_OR_CHARGED ->
            organic.stream().distinct().count() > 1
                && !organic.stream().allMatch(attempt::isCharged);
      };
    }
  }

  /** These molecules count as reactants only when the user put them in. */
  record OnlyIfCharged(String reason, List<String> stops, Set<Molecule> molecules)
      implements Guard {
    /** Keeps unmodifiable copies. */
    public OnlyIfCharged {
      stops = List.copyOf(stops);
      molecules = Set.copyOf(molecules);
    }

    @Override
    public boolean refuses(Attempt attempt) {
      return attempt.reactants().stream()
          .anyMatch(m -> molecules.contains(m) && !attempt.isCharged(m));
    }
  }

  /** The run offers something that stands against the reaction. */
  record NotWith(String reason, List<String> stops, Provision provision) implements Guard {
    /** Keeps an unmodifiable copy. */
    public NotWith {
      stops = List.copyOf(stops);
    }

    @Override
    public boolean refuses(Attempt attempt) {
      return attempt.surroundings().offered().contains(provision);
    }
  }

  /** None of these molecules was put in by the user. */
  record ChargeLacks(String reason, List<String> stops, Set<Molecule> molecules) implements Guard {
    /** Keeps unmodifiable copies. */
    public ChargeLacks {
      stops = List.copyOf(stops);
      molecules = Set.copyOf(molecules);
    }

    @Override
    public boolean refuses(Attempt attempt) {
      return molecules.stream().noneMatch(attempt::isCharged);
    }
  }
}
