/** Enclosures and everything joined in them, and who took service. */
package sallowmere.glass;
