/**
 * Where a distance read on an OTDR lies, on the glass, on the sheath and on the map, and how sure that is.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>Glass is used up in the order in which light meets it: the launch fiber, then piece after piece; without known
 *       events the records' glass holds to the micrometre.
 *   <li>Known events stretch glass between them and nothing else; tray glass is never stretched.
 *   <li>A place is on a span, or at one structure: in a coil, in tray glass or at a joint, in a jumper.
 *   <li>What cannot be placed is a sentence, never a guess.
 *   <li>The window is twice the root of the summed squares of its causes, and each cause can be read.
 * </ol>
 */
@NullMarked
package spanwright.fault;

import org.jspecify.annotations.NullMarked;
