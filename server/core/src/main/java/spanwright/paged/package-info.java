/**
 * Immutable arrays that are changed by page: an editor copies only the pages it touches, and the array it
 * builds shares all others with the one it came from.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>A built array never changes; any number of threads may read it without a lock.
 *   <li>An editor belongs to one thread and is dead once it has built.
 *   <li>Untouched pages are shared, not copied, so a small change to a large array costs little.
 * </ol>
 */
@NullMarked
package spanwright.paged;

import org.jspecify.annotations.NullMarked;
