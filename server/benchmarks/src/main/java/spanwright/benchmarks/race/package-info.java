/**
 * Variants of one task raced in one process, in turn, round by round, so that a machine's good and bad moments fall
 * on all alike; the medians' ratio is the result.
 */
@NullMarked
package spanwright.benchmarks.race;

import org.jspecify.annotations.NullMarked;
