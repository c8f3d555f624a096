/** Reads the folder back and checks it by the rules of the format, apart from all that made it. */
package sallowmere.check;
