/**
 * The product network: balanced steps between species, grown from the charge depth by depth ({@link
 * org.foreseal.network.NetworkExpansion}), the best routes to a species and the export as a graph.
 */
@NullMarked
package org.foreseal.network;

import org.jspecify.annotations.NullMarked;
