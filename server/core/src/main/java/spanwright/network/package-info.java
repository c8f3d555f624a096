/**
 * The network in memory: pieces of glass, ports and splitter terminals, each with two ends, and what joins them.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>A piece p has the ends 2p and 2p + 1. Pieces lie in blocks: the fibers of one cable section, the ports of one
 *       panel, the terminals of one splitter.
 *   <li>Only plant in service is in the network: cables, and what is in enclosures, in service.
 *   <li>Ends are joined in pairs: {@code peer(peer(e)) == e}. A fiber that passes an enclosure uncut is joined too,
 *       without a joint.
 *   <li>Every end is named by one joint in the glass at most, in service or not.
 *   <li>A path holds the pieces that are joined without a choice, each piece alive in exactly one path.
 *   <li>A network never changes; the next one shares all pages that no change touched, or none once too many
 *       pieces were dead. Piece and path numbers hold within one network only; across postings an end is known by its
 *       {@link spanwright.splicing.EndKey}.
 *   <li>At most a quarter of the pieces is dead, but for some thousands.
 * </ol>
 */
@NullMarked
package spanwright.network;

import org.jspecify.annotations.NullMarked;
