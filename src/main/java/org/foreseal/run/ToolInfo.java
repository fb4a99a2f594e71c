package org.foreseal.run;

/**
 * What made a result.
 *
 * @param version version of this tool
 * @param rulesDigest SHA-256 of the rule library used, as lower-case hexadecimal digits
 * @param seed random seed of the run
 */
public record ToolInfo(String version, String rulesDigest, long seed) {
  /** Name of the tool. */
  public static final String NAME = "foreseal";
}
