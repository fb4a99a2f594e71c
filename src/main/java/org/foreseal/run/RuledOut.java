package org.foreseal.run;

/**
 * Something that was considered and refused.
 *
 * @param smiles the product that is not expected
 * @param name its name or formula
 * @param rule the rule that would have made it
 * @param reason why not, in plain words
 * @param detail figures or circumstances behind the reason, may be empty
 */
public record RuledOut(String smiles, String name, String rule, String reason, String detail) {}
