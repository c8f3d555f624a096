/**
 * An outage as the desk follows it: what is down and since when, what is done about it, what it counts to. The book that
 * keeps it is a port to storage.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>An incident and its log only grow: an entry is corrected by a later entry that names it, never erased.
 *   <li>Counts are reckoned from the log and from the records as they stood when the incident was opened.
 *   <li>The program counts and warns; whether an outage is reported, a person decides.
 * </ol>
 */
@NullMarked
package spanwright.incident;

import org.jspecify.annotations.NullMarked;
