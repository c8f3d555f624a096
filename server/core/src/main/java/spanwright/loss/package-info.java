/**
 * What a path loses, and how it is known: glass, splices, connector pairs, splitters and jumpers at one wavelength,
 * held against a budget; dispersion.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>Sums are of whole microdecibels: a path's totals are exactly the sums over its elements.
 *   <li>A measured value counts the same in the expected sum and in the limit sum.
 *   <li>Every loss says its basis and its source; what is not known is a sentence, never a zero.
 *   <li>A single way of a two-way measurement is shown, never summed.
 * </ol>
 */
@NullMarked
package spanwright.loss;

import org.jspecify.annotations.NullMarked;
