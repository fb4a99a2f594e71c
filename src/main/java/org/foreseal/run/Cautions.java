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
    put(
        table,
        "[H][H]",
        "hydrogen: flammable gas under pressure; the maker's rating of the vessel decides");
    put(table, "[C-]#[O+]", "carbon monoxide: toxic gas without smell; " + HOOD);
    put(
        table,
        "O=C=O",
        "carbon dioxide: gas pressure in a sealed vessel; the maker's rating of the vessel decides");
    put(table, "S", "hydrogen sulfide: toxic, dulls the sense of smell; " + HOOD);
    put(table, "N", "ammonia: toxic, corrosive gas; " + HOOD);
    put(table, "C#N", "hydrogen cyanide: very toxic; " + HOOD);
    put(
        table,
        "C",
        "methane: flammable gas under pressure; the maker's rating of the vessel decides");
    put(table, "c1ccccc1", "benzene: carcinogen; " + HOOD);
    put(table, "C=O", "formaldehyde: carcinogen; " + HOOD);
    put(table, "C=CC=O", "acrolein: very toxic and irritant; " + HOOD);
    put(table, "CS", "methanethiol: toxic gas; " + HOOD);
    put(
        table,
        "C=C",
        "ethene: flammable gas under pressure; the maker's rating of the vessel decides");
    put(table, "c1ccc2ccccc2c1", "naphthalene: suspected carcinogen; " + HOOD);
    put(table, "NN", "hydrazine: toxic, can explode; " + HOOD);
    put(table, "NO", "hydroxylamine: can explode when heated; " + HOOD);
    return Map.copyOf(table);
  }

  private static void put(Map<Molecule, String> table, String smiles, String text) {
    table.put(Smiles.read(smiles), text);
  }

  static List<String> of(Molecule molecule) {
    return Optional.ofNullable(OF.get(molecule)).map(List::of).orElse(List.of());
  }
}
