package org.foreseal.run;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Smiles;

/**
 * Short safety remarks on products that can hurt someone when a vessel is opened. Common practice;
 * they stand beside the product and defer to the rating of the vessel, local codes and licensed
 * practice.
 */
final class Cautions {
  private static final String HOOD = "open the vessel cold and in a hood; local codes decide";

  private static final Map<Molecule, String> OF = table();

  private Cautions() {}

  private static Map<Molecule, String> table() {
    Map<Molecule, String> table = new LinkedHashMap<>();
    put(table, "[H][H]", "flammable gas under pressure; the maker's rating of the vessel decides");
    put(table, "[C-]#[O+]", "toxic gas without smell; " + HOOD);
    put(
        table,
        "O=C=O",
        "gas pressure in a sealed vessel; the maker's rating of the vessel decides");
    put(table, "S", "toxic, dulls the sense of smell; " + HOOD);
    put(table, "N", "toxic, corrosive gas; " + HOOD);
    put(table, "C#N", "very toxic; " + HOOD);
    put(table, "C", "flammable gas under pressure; the maker's rating of the vessel decides");
    put(table, "c1ccccc1", "carcinogen; " + HOOD);
    put(table, "C=O", "carcinogen; " + HOOD);
    put(table, "C=CC=O", "very toxic and irritant; " + HOOD);
    put(table, "CS", "toxic gas; " + HOOD);
    put(table, "C=C", "flammable gas under pressure; the maker's rating of the vessel decides");
    put(table, "c1ccc2ccccc2c1", "suspected carcinogen; " + HOOD);
    put(table, "NN", "toxic, can explode; " + HOOD);
    put(table, "NO", "can explode when heated; " + HOOD);
    return Map.copyOf(table);
  }

  private static void put(Map<Molecule, String> table, String smiles, String text) {
    table.put(Smiles.read(smiles), text);
  }

  static List<String> of(Molecule molecule) {
    return Optional.ofNullable(OF.get(molecule)).map(List::of).orElse(List.of());
  }
}
