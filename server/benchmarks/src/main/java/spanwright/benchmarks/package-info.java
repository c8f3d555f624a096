/**
 * What is measured, and the plants it is measured on.
 */
@NullMarked
package spanwright.benchmarks;

import org.jspecify.annotations.NullMarked;
