/**
 * The run sheet and the pipeline that wires the rooms: reads what the chemist wants to run ({@link
 * org.foreseal.run.RunSheet}) and makes the one result model ({@link org.foreseal.run.Forecast})
 * that every writer shows.
 */
@NullMarked
package org.foreseal.run;

import org.jspecify.annotations.NullMarked;
