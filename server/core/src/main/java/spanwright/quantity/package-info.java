/**
 * Quantities with their unit in the type: lengths, losses, wavelengths.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>Each quantity holds an exact integer (micrometres, microdecibels, picometres), so sums never drift.
 *   <li>Floating point appears only when a formula or a screen asks for it.
 *   <li>A foot is 304,800 micrometres exactly, so a sheath mark in tenths of a foot is exact.
 * </ol>
 */
@NullMarked
package spanwright.quantity;

import org.jspecify.annotations.NullMarked;
