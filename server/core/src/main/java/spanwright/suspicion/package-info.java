/**
 * What may be the cause of an outage, by which circuits are down and which are up. The model and its formula are in
 * {@code docs/SUSPECTS.md}.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>A suspect says what it explains, what contradicts it, and what it rests on.
 *   <li>Places that the alarms cannot tell apart are one suspect.
 *   <li>A protected circuit that is up proves nothing of the leg that it is not on.
 * </ol>
 */
@NullMarked
package spanwright.suspicion;

import org.jspecify.annotations.NullMarked;
