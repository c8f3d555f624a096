/**
 * Sheets being written: kept at every change, checked while they are typed, submitted, and posted by another person.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>A draft that was acknowledged is kept; a change made upon an old revision is never laid over a newer one.
 *   <li>A check keeps nothing: it answers as if the sheet were posted.
 *   <li>A draft is posted whole, by the one way in, upon the records as they then are.
 * </ol>
 */
@NullMarked
package spanwright.draft;

import org.jspecify.annotations.NullMarked;
