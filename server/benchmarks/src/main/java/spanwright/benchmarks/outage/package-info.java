/** How often the true place of a fault lies within the window that is told, and how wide that window is. */
@NullMarked
package spanwright.benchmarks.outage;

import org.jspecify.annotations.NullMarked;
