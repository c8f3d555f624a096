import { latLngBounds } from "leaflet";

/** @typedef {import("leaflet").Map} LeafletMap */
/** @typedef {{ lat: number, lon: number, zoom: number }} Standpoint */

/** How close a place is looked at that the screen does not show yet. */
const CLOSE = 16.5;

/** A place is left where it is on the screen from this zoom on. */
const NEAR_ENOUGH = 14;

/**
 * Brings a place or a line onto the screen; leaves the map alone where it is there already.
 * @param {LeafletMap} map
 * @param {number[][]} points longitudes and latitudes, one at least
 */
export function bringToView(map, points) {
  const [lon = 0, lat = 0] = points[0] ?? [];
  if (points.length === 1) {
    const inner = map.getBounds().pad(-0.12);
    if (!inner.contains([lat, lon]) || map.getZoom() < NEAR_ENOUGH) map.setView([lat, lon], Math.max(map.getZoom(), CLOSE));
    return;
  }
  fit(map, points);
}

/**
 * Fits a line to the screen.
 * @param {LeafletMap} map
 * @param {number[][]} points longitudes and latitudes, one at least
 */
export function fit(map, points) {
  const bounds = latLngBounds(points.map(([lon = 0, lat = 0]) => /** @type {[number, number]} */ ([lat, lon])));
  map.fitBounds(bounds, { padding: [40, 40], maxZoom: 18 });
}

/**
 * Fits a box to the screen.
 * @param {LeafletMap} map
 * @param {number[]} extent west, south, east, north
 */
export function fitExtent(map, [west = -180, south = -60, east = 180, north = 60]) {
  map.fitBounds([[south, west], [north, east]], { padding: [16, 16], maxZoom: 17 });
}

/**
 * @param {LeafletMap} map
 * @returns {Standpoint}
 */
export function standpointOf(map) {
  const { lat, lng } = map.getCenter();
  return { lat: Number(lat.toFixed(6)), lon: Number(lng.toFixed(6)), zoom: map.getZoom() };
}
