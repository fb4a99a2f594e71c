package org.foreseal.rule;

import org.foreseal.molecule.Transformation;

/**
 * A product one might expect and will not get: a looser pattern than the rule's own, with the
 * reason. Such products are listed among what is ruled out.
 *
 * @param reason why it does not form, in plain words
 * @param transformation the reaction that would make it
 * @param example reactants and the product that is wrongly expected
 */
public record NearMiss(String reason, Transformation transformation, Example example) {}
