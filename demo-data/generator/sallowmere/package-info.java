/** The demo, from nothing to files: geometry, plant, glass, service, map, stories, and a check. */
package sallowmere;
