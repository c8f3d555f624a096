/**
 * What a crew takes along on paper: the cut list and the crew's page, as HTML to print and as PDF.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>Every page says of which place it is, which of how many it is, and as of which posting the records were read; it
 *       bears the standing line: positions are records, not a locate.
 *   <li>A page breaks where the program says, never where a renderer runs out of room: texts are measured and cut to
 *       their cells, so HTML and PDF have the same pages.
 *   <li>Nothing is told by colour: a sheet printed black is whole. Colours of tubes and fibers are words.
 *   <li>What is written comes from the records as text and never becomes markup.
 * </ol>
 */
@NullMarked
package spanwright.paper;

import org.jspecify.annotations.NullMarked;
