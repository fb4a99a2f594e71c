/**
 * What to do at the bench: which acids can ketonize ({@link org.foreseal.plan.AlphaHydrogenCheck}).
 */
@NullMarked
package org.foreseal.plan;

import org.jspecify.annotations.NullMarked;
