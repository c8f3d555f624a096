/**
 * The records folder: reading one into the records, writing one out, and single rows of it for postings.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>A folder is entered whole or not at all: every fault is found before anything is kept.
 *   <li>A fault names the file and the line where its row begins, and says what would be right.
 *   <li>What follows from a fault only (a reference to a row that is refused itself) is no fault of its own.
 *   <li>Memory for reading is bounded by one row, whatever the files hold; rows are read one after another.
 *   <li>What is written, read again into a fresh file, gives equal records.
 * </ol>
 */
@NullMarked
package spanwright.exchange;

import org.jspecify.annotations.NullMarked;
