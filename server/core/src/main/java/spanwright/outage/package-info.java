/**
 * What to do when plant is cut: light another way meanwhile.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>A temporary path is offered only where every circuit of its group is whole again over it and keeps its budget.
 *   <li>Nothing is offered over the places to avoid, nor along the path of a circuit that protects.
 *   <li>Spare glass is shared so that no piece is promised twice.
 * </ol>
 */
@NullMarked
package spanwright.outage;

import org.jspecify.annotations.NullMarked;
