/**
 * A cut cable made whole: a piece let in between two enclosures, as one posting.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>A repair is all of its changes or none.
 *   <li>Glass keeps its joints, its marks and its measurements; what is measured over the repair no longer holds and says so.
 * </ol>
 */
@NullMarked
package spanwright.repair;

import org.jspecify.annotations.NullMarked;
