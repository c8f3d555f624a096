/**
 * What glass is used for, what of it is spare, and how spare glass leads from one place to another.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>Glass on which a circuit lives is in use, whatever else is said of it.
 *   <li>Unknown never counts as good: glass is spare only where all its joints and end states are known.
 *   <li>A flag holds until somebody lifts it; a reservation that has lapsed still reserves.
 *   <li>A closed tube with a working circuit in it is never opened; glass that meets a splitter is not spare.
 *   <li>A path found uses each piece once, and each of its new joints can be posted.
 * </ol>
 */
@NullMarked
package spanwright.planning;

import org.jspecify.annotations.NullMarked;
