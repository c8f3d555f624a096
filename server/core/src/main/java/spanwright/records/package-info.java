/**
 * The whole of the records at one posting, its indexes, and the rules by which records are entered.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>A {@link spanwright.records.Records} never changes; an editor builds the next, sharing all it did not touch.
 *   <li>Every index follows from the records alone; no index can say what the records do not.
 *   <li>A refusal is a value with a stable code and a sentence that says what would be right.
 * </ol>
 */
@NullMarked
package spanwright.records;

import org.jspecify.annotations.NullMarked;
