import { said } from "./paint-hand.js";
import { worldLine, worldSpot } from "./projected.js";

/** @typedef {import("./frame.js").Frame} Frame */
/** @typedef {import("./inks.js").Inks} Inks */
/** @typedef {import("./projected.js").Spot} Spot */

/** @typedef {"suspect" | "down" | "spare"} Kind a state that is drawn: suspect, cut, or a way round it */

/**
 * A stretch of plant in one state.
 * @typedef {object} Stretch
 * @property {Kind} kind
 * @property {string} sign its letter and number, so that it is told apart without colour
 * @property {boolean} chosen
 * @property {number[][][]} lines longitudes and latitudes
 * @property {number[][]} places longitudes and latitudes, of what is no line
 */

/**
 * A place with the window in which it lies.
 * @typedef {object} FaultSign
 * @property {number[]} point longitude and latitude
 * @property {number[][]} window the line of it; one point where it does not leave a structure
 * @property {string} label
 */

/**
 * What a desk draws upon the plant.
 * @typedef {object} Marks
 * @property {Stretch[]} stretches the chosen one last
 * @property {FaultSign[]} faults
 * @property {number[][]} focus what the map goes to; empty: it stays
 */

/**
 * @typedef {object} DrawnMarks the same on the world's square
 * @property {Array<{ kind: Kind, sign: string, chosen: boolean, lines: Float64Array[], places: Spot[] }>} stretches
 * @property {Array<{ spot: Spot, window: Float64Array, label: string }>} faults
 */

/**
 * @param {Marks | null} marks
 * @returns {DrawnMarks}
 */
export function projectMarks(marks) {
  const spot = (/** @type {number[]} */ [lon = 0, lat = 0]) => worldSpot(lon, lat);
  return {
    stretches: (marks?.stretches ?? []).map((each) => ({ ...each, lines: each.lines.map(worldLine), places: each.places.map(spot) })),
    faults: (marks?.faults ?? []).map(({ point, window, label }) => ({ spot: spot(point), window: worldLine(window), label })),
  };
}

/** Hatch of each state, px on and off along the line. @type {Readonly<Record<Kind, number[]>>} */
const HATCH = Object.freeze({ suspect: [2, 4], down: [6, 3], spare: [1, 7] });

/**
 * Stretches as hatched bands, below the structures so that their tags stay readable.
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {DrawnMarks} marks
 */
export function paintStretches(canvas, frame, inks, marks) {
  canvas.lineJoin = "round";
  for (const { kind, chosen, lines } of marks.stretches) {
    canvas.beginPath();
    for (const line of lines) frame.trace(canvas, line);
    canvas.strokeStyle = inks[kind];
    canvas.globalAlpha = chosen ? 0.3 : 0.14;
    canvas.lineWidth = chosen ? 16 : 10;
    canvas.stroke();
    canvas.globalAlpha = chosen ? 1 : 0.6;
    canvas.setLineDash(HATCH[kind]);
    canvas.lineWidth = chosen ? 14 : 8;
    canvas.stroke();
    canvas.setLineDash([]);
  }
  canvas.globalAlpha = 1;
  for (const { window } of marks.faults) band(canvas, frame, inks, window);
}

/**
 * The window of a fault place: the line on which it lies, in the colour of what is down.
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {Float64Array} window
 */
function band(canvas, frame, inks, window) {
  if (window.length < 4) return;
  canvas.beginPath();
  frame.trace(canvas, window);
  canvas.strokeStyle = inks.paper;
  canvas.lineWidth = 9;
  canvas.stroke();
  canvas.strokeStyle = inks.down;
  canvas.lineWidth = 6;
  canvas.stroke();
}

/**
 * Letters of the stretches, and the sign of each fault place with the two ends of its window.
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {DrawnMarks} marks
 */
export function paintMarkSigns(canvas, frame, inks, marks) {
  for (const stretch of marks.stretches) {
    for (const place of stretch.places) ring(canvas, frame, inks, stretch, place);
    const at = signPlace(stretch.lines, stretch.places);
    if (at) sign(canvas, frame, inks, stretch, at);
  }
  for (const fault of marks.faults) {
    windowEnds(canvas, frame, inks, fault.window);
    cross(canvas, frame, inks, fault.spot, fault.label);
  }
}

/**
 * Where a stretch's letter stands: at the middle of its longest line, else at its place.
 * @param {Float64Array[]} lines
 * @param {Spot[]} places
 * @returns {Spot | null}
 */
function signPlace(lines, places) {
  const line = lines[Math.floor(lines.length / 2)];
  if (!line || line.length < 2) return places[0] ?? null;
  const at = Math.floor((line.length / 2 - 1) / 2) * 2;
  const after = Math.min(at + 2, line.length - 2);
  return { x: ((line[at] ?? 0) + (line[after] ?? 0)) / 2, y: ((line[at + 1] ?? 0) + (line[after + 1] ?? 0)) / 2 };
}

/**
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {{ kind: Kind, sign: string, chosen: boolean }} stretch
 * @param {Spot} at
 */
function sign(canvas, frame, inks, { kind, sign: text, chosen }, at) {
  const [x, y] = [frame.x(at.x), frame.y(at.y) - 24];
  canvas.font = `700 ${chosen ? 13 : 11}px ${inks.font}`;
  const half = canvas.measureText(text).width / 2 + 5;
  canvas.beginPath();
  canvas.moveTo(x, y + 9);
  canvas.lineTo(x, y + 22);
  canvas.strokeStyle = inks[kind];
  canvas.lineWidth = 1;
  canvas.stroke();
  canvas.fillStyle = chosen ? inks[kind] : inks.paper;
  canvas.fillRect(x - half, y - 9, half * 2, 18);
  canvas.strokeRect(x - half, y - 9, half * 2, 18);
  canvas.fillStyle = chosen ? inks.paper : inks[kind];
  canvas.textAlign = "center";
  canvas.textBaseline = "middle";
  canvas.fillText(text, x, y + 0.5);
}

/**
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {{ kind: Kind, chosen: boolean }} stretch
 * @param {Spot} place
 */
function ring(canvas, frame, inks, { kind, chosen }, place) {
  canvas.beginPath();
  canvas.arc(frame.x(place.x), frame.y(place.y), 20, 0, Math.PI * 2);
  canvas.strokeStyle = inks[kind];
  canvas.setLineDash(HATCH[kind]);
  canvas.lineWidth = chosen ? 7 : 4;
  canvas.stroke();
  canvas.setLineDash([]);
}

/**
 * A stroke across each end of the window.
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {Float64Array} window
 */
function windowEnds(canvas, frame, inks, window) {
  if (window.length < 4) return;
  const last = window.length - 2;
  canvas.beginPath();
  for (const [at, inner] of /** @type {Array<[number, number]>} */ ([[0, 2], [last, last - 2]])) {
    const [x, y] = [frame.x(window[at] ?? 0), frame.y(window[at + 1] ?? 0)];
    const [dx, dy] = [frame.x(window[inner] ?? 0) - x, frame.y(window[inner + 1] ?? 0) - y];
    const long = Math.hypot(dx, dy) || 1;
    canvas.moveTo(x - (dy / long) * 12, y + (dx / long) * 12);
    canvas.lineTo(x + (dy / long) * 12, y - (dx / long) * 12);
  }
  canvas.strokeStyle = inks.down;
  canvas.lineWidth = 2;
  canvas.stroke();
}

/**
 * The fault place itself: a cross.
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {Spot} spot
 * @param {string} label
 */
function cross(canvas, frame, inks, spot, label) {
  const [x, y] = [frame.x(spot.x), frame.y(spot.y)];
  canvas.beginPath();
  canvas.moveTo(x - 9, y - 9);
  canvas.lineTo(x + 9, y + 9);
  canvas.moveTo(x + 9, y - 9);
  canvas.lineTo(x - 9, y + 9);
  canvas.lineCap = "round";
  for (const [ink, width] of /** @type {Array<[string, number]>} */ ([[inks.paper, 8], [inks.ink, 4]])) {
    canvas.strokeStyle = ink;
    canvas.lineWidth = width;
    canvas.stroke();
  }
  canvas.lineCap = "butt";
  said(canvas, inks, label, x, y - 28, "center");
}
