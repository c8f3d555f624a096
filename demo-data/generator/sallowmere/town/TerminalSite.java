package sallowmere.town;

import sallowmere.plant.Cable;

/**
 * Where a terminal hangs on a distribution cable.
 *
 * @param code its code
 * @param cable the cable
 * @param seq the row of its run
 * @param firstFiber the first of the fibers set aside for it
 * @param ports how many drop ports and fibers it has: 12 or 24
 */
public record TerminalSite(String code, Cable cable, int seq, int firstFiber, int ports) {}
