/** The same network in plain SQL: what the program's own answers are held against. */
@NullMarked
package spanwright.benchmarks.sql;

import org.jspecify.annotations.NullMarked;
