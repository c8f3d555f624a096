/**
 * The answers as JSON documents, the same whichever way they are asked for; and the questions as they are written.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>Numbers are plain decimals, never with an exponent: lengths to the micrometre, losses to the microdecibel.
 *   <li>A member that has nothing to say is null; it is never left out, unless its document says so.
 *   <li>Whoever asks for what is not there hears what would be right ({@link spanwright.answers.Unanswerable}).
 * </ol>
 */
@NullMarked
package spanwright.answers;

import org.jspecify.annotations.NullMarked;
