/**
 * The records file: an SQLite database that holds the state and the journal, written in one transaction.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>What a posting changed in the tables of the state, and its pages in the journal, are committed together or
 *       not at all; nobody is told that a posting is made before its commit has returned.
 *   <li>One process writes at a time, and in it one thread; any number of processes and threads read meanwhile.
 *   <li>The journal, replayed from the first posting, makes the tables of the state again, content for content.
 *   <li>A records file is there whole or not at all: a new one is made beside its place and moved there.
 *   <li>The side file follows from the records file and may be deleted at any time.
 * </ol>
 */
@NullMarked
package spanwright.sqlite;

import org.jspecify.annotations.NullMarked;
