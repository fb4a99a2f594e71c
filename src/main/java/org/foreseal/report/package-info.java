/**
 * Writes results for people and for programs: text that fits 80 columns, CSV, JSON. Every writer
 * turns one result model into a string; the same model always gives the same bytes.
 */
@NullMarked
package org.foreseal.report;

import org.jspecify.annotations.NullMarked;
