/** River, lake and the edges of the map. */
package sallowmere.land;
