/** How long it takes from the launch of the jar to the first answered page, against a server that does nothing else. */
@NullMarked
package spanwright.benchmarks.start;

import org.jspecify.annotations.NullMarked;
