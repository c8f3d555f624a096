/**
 * How the records change: only by postings, each a set of changes by one person with a reason.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>Whatever is kept has an identity that lasts, a number within its kind that is never given twice.
 *   <li>A change holds the record before and after, so it can be undone and replayed.
 *   <li>Postings are numbered 1, 2, 3 ... without gaps; posting 0 is the empty file.
 * </ol>
 */
@NullMarked
package spanwright.journal;

import org.jspecify.annotations.NullMarked;
