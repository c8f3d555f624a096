/**
 * What an outage asks of the records: where a distance read on an OTDR lies, what is down and since when, what may be the
 * cause, what is done about it, and light another way meanwhile.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>An incident and its log only grow: an entry is corrected by a later entry that names it, never erased.
 *   <li>Counts are reckoned from the log and from the records as they stood when the incident was opened.
 *   <li>The program counts and warns; whether an outage is reported, a person decides.
 *   <li>A temporary path is offered only where every circuit of its group is whole again over it and keeps its budget.
 *   <li>Nothing is offered over the places to avoid, nor along the path of a circuit that protects.
 *   <li>Spare glass is shared so that no piece is promised twice.
 *   <li>Glass is used up in the order in which light meets it: the launch fiber, then piece after piece; without known
 *       events the records' glass holds to the micrometre.
 *   <li>Known events stretch glass between them and nothing else; tray glass is never stretched.
 *   <li>A place is on a span, or at one structure: in a coil, in tray glass or at a joint, in a jumper.
 *   <li>What cannot be placed is a sentence, never a guess.
 *   <li>The window is twice the root of the summed squares of its causes, and each cause can be read.
 *   <li>A circuit's path is the one that a trace of the circuit gives, incomplete ones too.
 *   <li>A circuit on several fibers is hit when any of its paths is.
 *   <li>A circuit of a protection group is down only where no other working one of its group has a whole path left.
 * </ol>
 */
@NullMarked
package spanwright.outage;

import org.jspecify.annotations.NullMarked;
