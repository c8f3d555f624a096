/**
 * The command line.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>With {@code --json} standard output carries one JSON document and nothing else; what a person should know goes
 *       to standard error.
 *   <li>Exit status 0: done; 1: the input is wrong, and standard error says what would be right; 2: wrong usage; 3: the
 *       program failed.
 *   <li>A table for a person is 100 columns wide at most.
 * </ol>
 */
@NullMarked
package spanwright.cli;

import org.jspecify.annotations.NullMarked;
