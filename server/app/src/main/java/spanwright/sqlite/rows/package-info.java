/**
 * Records as rows: which columns each kind of record has, and rows packed into pages of bytes.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>A record written as a row and read back is equal to what was written, to the last bit.
 *   <li>A packed page names its columns, so a page of an older layout can still be read: a column that it lacks is
 *       read as nothing, one that is no longer known is passed over.
 *   <li>The tables of the migrations have exactly the columns named here.
 * </ol>
 */
@NullMarked
package spanwright.sqlite.rows;

import org.jspecify.annotations.NullMarked;
