/** Places and curves on the plane at the false origin, and their longitude and latitude. */
package sallowmere.geo;
