/** Seeded random plants to test with, and the plain, slow twin of the network. */
@NullMarked
package spanwright.plants;

import org.jspecify.annotations.NullMarked;
