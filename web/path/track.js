/**
 * The track of a path: points [glass, sheath, route, lon, lat] from its start, metres and degrees, linear between.
 * Each of the first three rises or stays from point to point.
 */

/** @typedef {number[][]} Track */

/** @typedef {"glass" | "sheath" | "route"} Measure */

/**
 * @typedef {object} Place a place on a path
 * @property {number} glass metres of glass from the path's start
 * @property {number} sheath metres of sheath
 * @property {number} route metres of route
 * @property {number} lon degrees
 * @property {number} lat degrees
 */

/** Which member of a point holds each measure. */
const COLUMN = Object.freeze({ glass: 0, sheath: 1, route: 2 });

/**
 * The length of a track in a measure.
 * @param {Track} track
 * @param {Measure} measure
 * @returns {number} metres; 0 for an empty track
 */
export function trackLength(track, measure) {
  return track.at(-1)?.[COLUMN[measure]] ?? 0;
}

/**
 * The place so much glass from the start; beyond the ends, the end.
 * @param {Track} track at least one point
 * @param {number} glass metres
 * @returns {Place}
 */
export function placeAt(track, glass) {
  const [before, after, share] = around(track, 0, glass);
  const mix = (/** @type {number} */ column) => (before[column] ?? 0) + ((after[column] ?? 0) - (before[column] ?? 0)) * share;
  return { glass: mix(0), sheath: mix(1), route: mix(2), lon: mix(3), lat: mix(4) };
}

/**
 * The glass at which a measure reaches a value; where it stays at that value (a coil's route), the first such place.
 * @param {Track} track at least one point
 * @param {Measure} measure
 * @param {number} value metres
 * @returns {number} metres of glass
 */
export function glassAt(track, measure, value) {
  const [before, after, share] = around(track, COLUMN[measure], value);
  return (before[0] ?? 0) + ((after[0] ?? 0) - (before[0] ?? 0)) * share;
}

/**
 * The two points between which a column reaches a value, and how far along.
 * @param {Track} track
 * @param {number} column
 * @param {number} value
 * @returns {[number[], number[], number]} share 0 to 1
 */
function around(track, column, value) {
  let low = 0;
  let high = track.length - 1;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((track[middle]?.[column] ?? 0) < value) low = middle + 1;
    else high = middle;
  }
  const after = track[low] ?? [];
  const before = track[Math.max(0, low - 1)] ?? after;
  const reach = (after[column] ?? 0) - (before[column] ?? 0);
  const share = reach > 0 ? (value - (before[column] ?? 0)) / reach : 1;
  return [before, after, Math.min(1, Math.max(0, share))];
}

/**
 * The place on a track nearest to a point of the map.
 * @param {Track} track
 * @param {number} lon
 * @param {number} lat
 * @returns {{ glass: number, degrees: number } | null} glass from the start, and how far off in degrees of latitude; null for an empty track
 */
export function nearestOn(track, lon, lat) {
  const squeeze = Math.cos((lat * Math.PI) / 180);
  /** @type {{ glass: number, degrees: number } | null} */
  let best = null;
  for (let index = 1; index < track.length; index++) {
    const near = nearestOnPiece(track[index - 1] ?? [], track[index] ?? [], lon, lat, squeeze);
    if (best === null || near.degrees < best.degrees) best = near;
  }
  return best;
}

/**
 * @param {number[]} from
 * @param {number[]} to
 * @param {number} lon
 * @param {number} lat
 * @param {number} squeeze length of a degree of longitude in degrees of latitude
 * @returns {{ glass: number, degrees: number }}
 */
function nearestOnPiece(from, to, lon, lat, squeeze) {
  const [glassFrom = 0, , , lonFrom = 0, latFrom = 0] = from;
  const [glassTo = 0, , , lonTo = 0, latTo = 0] = to;
  const [dx, dy] = [(lonTo - lonFrom) * squeeze, latTo - latFrom];
  const [px, py] = [(lon - lonFrom) * squeeze, lat - latFrom];
  const square = dx * dx + dy * dy;
  const share = square > 0 ? Math.min(1, Math.max(0, (px * dx + py * dy) / square)) : 0;
  return { glass: glassFrom + (glassTo - glassFrom) * share, degrees: Math.hypot(px - dx * share, py - dy * share) };
}
