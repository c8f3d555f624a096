/**
 * As-built splice sheets: what a clerk writes of one enclosure, a line a range, read into joints and states of ends and
 * written out of them. The notation is in {@code docs/RECORDS-DESK.md}.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>A sheet states what is true of the ends that it names; of the others it says nothing.
 *   <li>What cannot be understood is a {@link spanwright.sheet.Mistake} with its place and what would be right; nothing
 *       is guessed, and nothing that was written is lost.
 *   <li>What is written out of the records and read again is the same.
 * </ol>
 */
@NullMarked
package spanwright.sheet;

import org.jspecify.annotations.NullMarked;
