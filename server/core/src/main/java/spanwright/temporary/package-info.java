/**
 * Light another way meanwhile: temporary paths over spare glass for circuits that are down.
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
package spanwright.temporary;

import org.jspecify.annotations.NullMarked;
