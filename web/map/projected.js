import { boxOf } from "./frame.js";
import { importanceOf, weightOf } from "./tags.js";

/** @typedef {import("../server/contract.d.ts").PlantMap} PlantMap */
/** @typedef {import("../server/contract.d.ts").BaseMap} BaseMap */

/**
 * A place on the world's square, 0 to 256 both ways, as web maps lay it out at zoom 0.
 * @typedef {object} Spot
 * @property {number} x
 * @property {number} y
 */

/**
 * @typedef {object} DrawnStructure
 * @property {string} code
 * @property {string} kind
 * @property {string} state
 * @property {number} enclosures
 * @property {number} importance
 * @property {number} x on the world's square
 * @property {number} y
 */

/**
 * @typedef {object} DrawnSpan
 * @property {string} code
 * @property {string} placement
 * @property {string} state
 * @property {number} width px
 * @property {Float64Array} line x and y in turn, on the world's square
 * @property {import("./frame.js").Box} box round it
 */

/**
 * @typedef {object} DrawnBase
 * @property {string} kind
 * @property {string | null} name
 * @property {number} rank 1 to 5
 * @property {boolean} area
 * @property {Float64Array[]} rings lines, or an area's rings; a place is one point
 * @property {import("./frame.js").Box} box round it
 */

/** A way of the base map that reaches this far without a rank is a road, on the world's square (2 km at 48 degrees). */
const FAR = 0.019;

/**
 * @param {number} lon degrees
 * @param {number} lat degrees
 * @returns {Spot} on the world's square (spherical Mercator, EPSG:3857)
 */
export function worldSpot(lon, lat) {
  const sine = Math.sin((Math.min(85.0511, Math.max(-85.0511, lat)) * Math.PI) / 180);
  return { x: ((lon + 180) / 360) * 256, y: (0.5 - Math.log((1 + sine) / (1 - sine)) / (4 * Math.PI)) * 256 };
}

/**
 * @param {number[][]} points longitudes and latitudes
 * @returns {Float64Array}
 */
export function worldLine(points) {
  const line = new Float64Array(points.length * 2);
  points.forEach(([lon = 0, lat = 0], index) => {
    const spot = worldSpot(lon, lat);
    line[index * 2] = spot.x;
    line[index * 2 + 1] = spot.y;
  });
  return line;
}

/**
 * @param {PlantMap} answer
 * @returns {{ spans: DrawnSpan[], structures: DrawnStructure[] }} structures by importance, the highest first
 */
export function projectPlant(answer) {
  /** @type {DrawnSpan[]} */
  const spans = [];
  /** @type {DrawnStructure[]} */
  const structures = [];
  for (const feature of answer.features) {
    if (feature.properties.record === "span") {
      const { code, placement, state, fibers } = feature.properties;
      const line = worldLine(/** @type {number[][]} */ (feature.geometry.coordinates));
      spans.push({ code, placement, state, width: weightOf(fibers), line, box: boxOf([line]) });
    } else {
      const { code, kind, state, enclosures } = feature.properties;
      const [lon = 0, lat = 0] = /** @type {number[]} */ (feature.geometry.coordinates);
      structures.push({ code, kind, state, enclosures, importance: importanceOf(kind, enclosures), ...worldSpot(lon, lat) });
    }
  }
  structures.sort((one, other) => other.importance - one.importance);
  return { spans, structures };
}

/**
 * @param {BaseMap} answer
 * @returns {DrawnBase[]} areas first, then lines, then places
 */
export function projectBase(answer) {
  const drawn = answer.features.map((feature) => {
    const { type, coordinates } = feature.geometry;
    const { kind, name, rank } = feature.properties;
    const rings = linesOf(type, coordinates).map(worldLine);
    const box = boxOf(rings);
    return { kind, name: name || null, rank: rank ?? rankOf(box), area: type.endsWith("Polygon"), rings, box };
  });
  const order = (/** @type {DrawnBase} */ each) => (each.area ? 0 : (each.rings[0]?.length ?? 0) > 2 ? 1 : 2);
  return drawn.sort((one, other) => order(one) - order(other) || other.rank - one.rank);
}

/**
 * The rank of what has none: the farther it reaches, the more it is needed from afar; a place is in the middle.
 * @param {import("./frame.js").Box} box
 * @returns {number}
 */
function rankOf(box) {
  const reach = Math.max(box.east - box.west, box.south - box.north);
  return reach === 0 ? 3 : reach > FAR ? 2 : 4;
}

/**
 * @param {string} type of a GeoJSON geometry
 * @param {any} coordinates
 * @returns {number[][][]} its lines
 */
function linesOf(type, coordinates) {
  if (type === "Point") return [[coordinates]];
  if (type === "LineString") return [coordinates];
  return type === "MultiPolygon" ? coordinates.flat() : coordinates;
}
