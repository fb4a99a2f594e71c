package org.foreseal.run;

/**
 * Size of the network.
 *
 * @param species number of species
 * @param steps number of balanced steps
 * @param depth steps from the charge that were expanded
 * @param stoppedBy {@code "depth"} or {@code "nothing new"} when complete, else the limit that cut
 *     it
 * @param isCut whether a limit cut it before the depth was reached
 */
public record NetworkSummary(int species, int steps, int depth, String stoppedBy, boolean isCut) {}
