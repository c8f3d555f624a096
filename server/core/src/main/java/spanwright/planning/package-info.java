/**
 * What glass is used for, and what of it is spare.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>Glass on which a circuit lives is in use, whatever else is said of it.
 *   <li>Unknown never counts as good: glass is spare only where all its joints and end states are known.
 *   <li>A flag holds until somebody lifts it; a reservation that has lapsed still reserves.
 * </ol>
 */
@NullMarked
package spanwright.planning;

import org.jspecify.annotations.NullMarked;
