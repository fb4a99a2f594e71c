package org.foreseal.rule;

/**
 * Where a statement comes from.
 *
 * @param key reference key, resolved in the reference list
 * @param says what the source says about it, may be empty
 */
public record Citation(String key, String says) {}
