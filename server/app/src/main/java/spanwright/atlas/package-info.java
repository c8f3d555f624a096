/**
 * Where things are and what they are called: finds plant by place, and anything by what is typed.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>An index answers for one state of the records; for a state near it, it answers with what changed since looked
 *       at one by one, so that a posting costs what it changes and not what is kept.
 *   <li>An index holds identities, boxes and keys; what is shown is always read from the records asked.
 *   <li>Every answer equals that of looking at every record in turn.
 * </ol>
 */
@NullMarked
package spanwright.atlas;

import org.jspecify.annotations.NullMarked;
