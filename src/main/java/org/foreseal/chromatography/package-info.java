/**
 * How products are seen: which stay in the gas or the water, which pass the column. Entry point:
 * {@link org.foreseal.chromatography.WorkUp}.
 */
@NullMarked
package org.foreseal.chromatography;

import org.jspecify.annotations.NullMarked;
