/**
 * What a cut takes down: which circuits, which are left single, in which order to restore them, and what every fiber of
 * the sheath carries.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>A circuit's path is the one that a trace of the circuit gives, incomplete ones too.
 *   <li>A circuit on several fibers is hit when any of its paths is.
 *   <li>A circuit of a protection group is down only where no other working one of its group has a whole path left.
 * </ol>
 */
@NullMarked
package spanwright.outage;

import org.jspecify.annotations.NullMarked;
