package org.foreseal.molecule;

import java.util.List;
import java.util.Random;

/** Grows random SMILES of the families that names are built for, and of their neighbours. */
final class RandomMolecules {
  private static final List<String> ENDS =
      List.of("C", "C", "C", "O", "O", "N", "S", "Cl", "F", "Br", "I", "C#N", "C=O", "C(=O)O");

  private final Random random;

  RandomMolecules(long seed) {
    random = new Random(seed);
  }

  /** A molecule of one chain or ring with branches. */
  String next() {
    return switch (random.nextInt(6)) {
      case 0 -> "C" + part(3);
      case 1 -> aromatic(2) + part(2);
      case 2 -> part(3) + part(1);
      case 3 -> straight() + part(2);
      case 4 -> straight() + group() + straight();
      default -> ring(2) + part(2);
    };
  }

  private String straight() {
    return "C".repeat(1 + random.nextInt(9));
  }

  private String group() {
    return pick(
        List.of("C(=O)", "C(=O)O", "O", "S", "SS", "N", "C(=O)N", "C=C", "C#C", "CC(O)", "C(C)"));
  }

  private String pick(List<String> from) {
    return from.get(random.nextInt(from.size()));
  }

  /** Text that begins with an atom and hangs on what stands before it. */
  private String part(int depth) {
    if (depth == 0) {
      return pick(ENDS);
    }
    return switch (random.nextInt(16)) {
      case 0, 1 -> pick(ENDS);
      case 2, 3, 4 -> "C" + part(depth - 1);
      case 5 -> "C(" + part(depth - 1) + ")" + part(depth - 1);
      case 6 -> "C(C)(" + part(depth - 1) + ")" + part(depth - 1);
      case 7 -> "C=C" + part(depth - 1);
      case 8 -> "C(=O)" + part(depth - 1);
      case 9 -> "O" + carbon(depth - 1);
      case 10 -> "C(=O)O" + carbon(depth - 1);
      case 11 -> "C(=O)N" + carbon(depth - 1);
      case 12 ->
          random.nextBoolean()
              ? "N(" + carbon(depth - 1) + ")" + carbon(depth - 1)
              : "N=" + carbon(depth - 1);
      case 13 -> ring(depth);
      default -> aromatic(depth);
    };
  }

  private String carbon(int depth) {
    return "C" + (random.nextBoolean() ? "" : part(depth));
  }

  /** Ring digits differ by depth, so a ring may hang on a ring. */
  private String aromatic(int depth) {
    String d = Integer.toString(depth + 1);
    return switch (random.nextInt(12)) {
      case 0, 1, 2, 3 -> "c" + d + "ccccc" + d;
      case 4 -> "c" + d + "ccc(" + part(depth - 1) + ")cc" + d;
      case 5 -> "c" + d + "cc(" + part(depth - 1) + ")ccc" + d;
      case 6 -> "c" + d + "c(" + part(depth - 1) + ")cccc" + d;
      case 7 -> "c" + d + "c(" + part(depth - 1) + ")cc(" + part(depth - 1) + ")cc" + d;
      case 8 -> "c" + d + "cccc6ccccc" + d + "6";
      case 9 -> "c" + d + "ccc(" + part(depth - 1) + ")o" + d;
      case 10 -> "c" + d + "cccs" + d;
      default -> "c" + d + "cccnc" + d;
    };
  }

  private String ring(int depth) {
    String d = Integer.toString(depth + 1);
    return switch (random.nextInt(14)) {
      case 0 -> "C" + d + "CCCC" + d;
      case 7 -> "C" + d + "C(=O)c6ccccc6C" + d;
      case 8 -> "C" + d + "CC(=O)OC" + d;
      case 9 -> "C" + d + "C(=C" + part(depth - 1) + ")CCC" + d;
      case 10 -> "C(=C" + d + "CCCC" + d + ")" + part(depth - 1);
      case 11 -> "N" + d + "CCC(" + part(depth - 1) + ")C" + d + "=O";
      case 12 -> "C" + d + "CC(=O)c6cc(" + part(depth - 1) + ")ccc6C" + d;
      case 1 -> "C" + d + "CCCCC" + d;
      case 2 -> "C" + d + "CCC(" + part(depth - 1) + ")CC" + d;
      case 3 -> "C" + d + "=CCCCC" + d;
      case 4 -> "C" + d + "CC(=O)CCC" + d;
      case 5 -> "C" + d + "C(" + part(depth - 1) + ")CC=CC" + d;
      case 6 -> "C" + d + "CCc6ccccc" + d + "6";
      default -> "C" + d + "CCCO" + d;
    };
  }
}
