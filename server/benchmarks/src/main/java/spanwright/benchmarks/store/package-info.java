/** What it costs to load, to post and to start, against bare SQLite doing no more than keep the same rows. */
@NullMarked
package spanwright.benchmarks.store;

import org.jspecify.annotations.NullMarked;
