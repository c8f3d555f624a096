/**
 * What a person must judge in the records: findings, each with its severity, its place and what would mend it.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>A finding refuses nothing; what can be refused is refused at entry and never found here.
 *   <li>A rule reads one snapshot and keeps nothing, so the rules may be asked in any order.
 *   <li>Findings come in the order of the rules and, within a rule, of identity: the same records, the same list.
 * </ol>
 */
@NullMarked
package spanwright.check;

import org.jspecify.annotations.NullMarked;
