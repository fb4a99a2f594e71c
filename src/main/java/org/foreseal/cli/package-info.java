/**
 * The commands: the only place that prints or exits. Entry point: {@link org.foreseal.cli.Main}.
 */
@NullMarked
package org.foreseal.cli;

import org.jspecify.annotations.NullMarked;
