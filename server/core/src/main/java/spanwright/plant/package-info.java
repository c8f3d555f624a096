/**
 * What is built outside: structures, spans between them, cables along the spans, enclosures in the structures.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>Each record is immutable and valid by itself; whether it fits the others is for the rules of entry.
 *   <li>Records refer to each other by lasting identity, never by code.
 *   <li>Fibers are numbered from 1; a run row's seq from 0.
 * </ol>
 */
@NullMarked
package spanwright.plant;

import org.jspecify.annotations.NullMarked;
