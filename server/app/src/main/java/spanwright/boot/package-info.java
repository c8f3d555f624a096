/**
 * Puts the program together: the only package that sees the core and every adapter.
 */
@NullMarked
package spanwright.boot;

import org.jspecify.annotations.NullMarked;
