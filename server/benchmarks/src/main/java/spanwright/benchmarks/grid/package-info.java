/**
 * Plants of any size for measuring: closures on a square grid, feeder, distribution and small cables between
 * neighbours, circuits on random walks, some of them behind splitters, the rest of the glass straight or dark.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>The same size and seed give the same plant.
 *   <li>Neighbouring cables are not neighbours in identity, which is the worst case for memory.
 *   <li>Every joint stands in a range as long as the fibers run side by side, as crews write them.
 * </ol>
 */
@NullMarked
package spanwright.benchmarks.grid;

import org.jspecify.annotations.NullMarked;
