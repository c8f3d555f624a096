/**
 * What is done in enclosures: ends of glass joined by splices, terminations and jumpers, splitters, panels.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>An end is named by lasting identity ({@link spanwright.splicing.Leg} and number), never by a code.
 *   <li>A {@link spanwright.splicing.Joint} joins two ranges of ends of the same count, in order.
 *   <li>A joint of trust planned is not in the glass.
 * </ol>
 */
@NullMarked
package spanwright.splicing;

import org.jspecify.annotations.NullMarked;
