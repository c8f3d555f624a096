/**
 * Drives the pages in a real browser, as people do.
 */
@NullMarked
package spanwright.browser;

import org.jspecify.annotations.NullMarked;
