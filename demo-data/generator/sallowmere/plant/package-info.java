/** Structures, spans and cables as laid, and the tables that tell of them. */
package sallowmere.plant;
