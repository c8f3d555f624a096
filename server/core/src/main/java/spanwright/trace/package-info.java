/**
 * Where a fiber goes: walks over the network from a port, a fiber or a circuit, as paths of elements end to end.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>Elements stand in the order in which the walk meets them; each is met once.
 *   <li>Light crosses a splitter from an input to every output, and from an output to the inputs only.
 *   <li>Every walk ends: where nothing is joined, at a choice that it may not make, or where it comes to what it has
 *       walked already (a circle). The number of paths of one answer is bounded; beyond the bound a path ends at the
 *       splitter before which it stands.
 *   <li>The glass of a path is the sum of the glass of its fibers and jumpers; its track rises or stays.
 * </ol>
 */
@NullMarked
package spanwright.trace;

import org.jspecify.annotations.NullMarked;
