/** @typedef {import("./frame.js").Frame} Frame */
/** @typedef {import("./projected.js").DrawnSpan} DrawnSpan */
/** @typedef {import("./projected.js").DrawnStructure} DrawnStructure */

/** @typedef {{ view: "structure" | "span", code: string, kind: string }} Hit */

/** How near a structure, and a span, must be to be meant, px. */
const STRUCTURE_REACH = 14;
const SPAN_REACH = 7;

/**
 * What is meant by a point of the screen: the nearest structure within reach, else the nearest span.
 * @param {Frame} frame
 * @param {DrawnStructure[]} structures
 * @param {DrawnSpan[]} spans
 * @param {number} x px
 * @param {number} y px
 * @param {number} [further] px of reach more, for a press by keyboard or finger
 * @returns {Hit | null}
 */
export function hitAt(frame, structures, spans, x, y, further = 0) {
  const structure = nearestStructure(frame, structures, x, y, STRUCTURE_REACH + further);
  if (structure) return { view: "structure", code: structure.code, kind: structure.kind };
  const span = nearestSpan(frame, spans, x, y, SPAN_REACH + further);
  return span ? { view: "span", code: span.code, kind: `${span.placement} span` } : null;
}

/**
 * @param {Frame} frame
 * @param {DrawnStructure[]} structures
 * @param {number} x
 * @param {number} y
 * @param {number} reach
 * @returns {DrawnStructure | null}
 */
function nearestStructure(frame, structures, x, y, reach) {
  let best = null;
  let least = reach;
  for (const each of structures) {
    const off = Math.hypot(frame.x(each.x) - x, frame.y(each.y) - y) - each.importance;
    if (off < least) {
      least = off;
      best = each;
    }
  }
  return best;
}

/**
 * @param {Frame} frame
 * @param {DrawnSpan[]} spans
 * @param {number} x
 * @param {number} y
 * @param {number} reach
 * @returns {DrawnSpan | null}
 */
function nearestSpan(frame, spans, x, y, reach) {
  let best = null;
  let least = reach;
  for (const each of spans) {
    const off = distanceTo(frame, each.line, x, y);
    if (off < least) {
      least = off;
      best = each;
    }
  }
  return best;
}

/**
 * @param {Frame} frame
 * @param {Float64Array} line
 * @param {number} x
 * @param {number} y
 * @returns {number} px
 */
export function distanceTo(frame, line, x, y) {
  let least = Infinity;
  for (let index = 0; index + 3 < line.length; index += 2) {
    const [ax, ay] = [frame.x(line[index] ?? 0), frame.y(line[index + 1] ?? 0)];
    const [dx, dy] = [frame.x(line[index + 2] ?? 0) - ax, frame.y(line[index + 3] ?? 0) - ay];
    const square = dx * dx + dy * dy;
    const share = square > 0 ? Math.min(1, Math.max(0, ((x - ax) * dx + (y - ay) * dy) / square)) : 0;
    least = Math.min(least, Math.hypot(ax + dx * share - x, ay + dy * share - y));
  }
  return least;
}
