/** Circuits, flags, numberings, measurements, settings, and the sheets that wait. */
package sallowmere.service;
