/**
 * Values with their units, uncertainty and source, and the one exception for input a user can mend
 * ({@link org.foreseal.quantity.BadInputException}). Depends on nothing but the JDK.
 */
@NullMarked
package org.foreseal.quantity;

import org.jspecify.annotations.NullMarked;
