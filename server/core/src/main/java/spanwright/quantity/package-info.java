/**
 * Quantities with an exact integer inside: lengths, losses, wavelengths.
 *
 * <ol>
 *   <li>A quantity is exact; floating point appears only inside a formula and at the screen.
 *   <li>A value outside its range does not construct.
 * </ol>
 */
@NullMarked
package spanwright.quantity;

import org.jspecify.annotations.NullMarked;
