/** Tables and numbers as a records folder writes them. */
package sallowmere.folder;
