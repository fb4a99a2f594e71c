package org.foreseal.run;

import java.util.List;

/** What sets the hydrogen fugacity of a run. */
public sealed interface Hydrogen {
  /** In words, for the outputs. */
  String words();

  /**
   * A mineral assemblage that holds the hydrogen fugacity.
   *
   * @param assemblage which one
   */
  record Buffered(Assemblage assemblage) implements Hydrogen {
    @Override
    public String words() {
      return "buffer " + assemblage.word();
    }
  }

  /**
   * A fugacity chosen by the user.
   *
   * @param fugacityBar bar, positive
   */
  record Fixed(double fugacityBar) implements Hydrogen {
    @Override
    public String words() {
      return "fugacity " + Quantities.plain(fugacityBar) + " bar";
    }
  }

  /** Made and used up in the run. */
  record FromRun() implements Hydrogen {
    @Override
    public String words() {
      return "from the run";
    }
  }

  /** Buffers of hydrothermal work, each with the abbreviations in use. */
  enum Assemblage {
    /** 6 Fe2O3 = 4 Fe3O4 + O2. */
    HEMATITE_MAGNETITE("hematite-magnetite", "magnetite-hematite", "HM", "MH"),
    /** 3 Fe2SiO4 + O2 = 2 Fe3O4 + 3 SiO2. */
    FAYALITE_MAGNETITE_QUARTZ(
        "fayalite-magnetite-quartz", "quartz-fayalite-magnetite", "FMQ", "QFM"),
    /** 2 Ni + O2 = 2 NiO. */
    NICKEL_NICKEL_OXIDE("nickel-nickel-oxide", "nickel-nickel oxide", "NNO"),
    /** 3 Fe + 2 O2 = Fe3O4. */
    IRON_MAGNETITE("iron-magnetite", "IM"),
    /** Pyrite, pyrrhotite and magnetite with water. */
    PYRITE_PYRRHOTITE_MAGNETITE("pyrite-pyrrhotite-magnetite", "PPM");

    private final String word;
    private final String otherWords;

    Assemblage(String word, String... otherWords) {
      this.word = word;
      this.otherWords = String.join(",", otherWords);
    }

    /** The word of the run sheet. */
    public String word() {
      return word;
    }

    /** Whether this is a spelling or abbreviation of it. */
    public boolean isCalled(String name) {
      return name.equalsIgnoreCase(word)
          || List.of(otherWords.split(",")).stream().anyMatch(name::equalsIgnoreCase);
    }
  }
}
