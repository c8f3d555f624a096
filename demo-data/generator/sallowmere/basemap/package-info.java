/** The invented map as GeoJSON. */
package sallowmere.basemap;
