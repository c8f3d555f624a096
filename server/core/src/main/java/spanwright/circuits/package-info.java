/**
 * The services that live on the glass.
 *
 * <p>Invariant: a circuit names as many a ports as z ports, one pair a fiber, joined in order.
 */
@NullMarked
package spanwright.circuits;

import org.jspecify.annotations.NullMarked;
