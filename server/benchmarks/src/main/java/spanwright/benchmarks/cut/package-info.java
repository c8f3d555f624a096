/** What a cut takes down and where one circuit runs, against recursive SQL over the same network. */
@NullMarked
package spanwright.benchmarks.cut;

import org.jspecify.annotations.NullMarked;
