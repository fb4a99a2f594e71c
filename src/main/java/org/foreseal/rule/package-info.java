/**
 * The rule library: rule files, the reactions they describe, the guards that refuse a site with a
 * reason, and the self-tests every rule carries. Entry point: {@code RuleLibrary}.
 */
@NullMarked
package org.foreseal.rule;

import org.jspecify.annotations.NullMarked;
