import { PATTERNS, tagOf } from "./tags.js";

/** @typedef {import("./frame.js").Frame} Frame */
/** @typedef {import("./frame.js").Room} Room */
/** @typedef {import("./inks.js").Inks} Inks */
/** @typedef {import("./projected.js").DrawnSpan} DrawnSpan */
/** @typedef {import("./projected.js").DrawnStructure} DrawnStructure */

/** From which zoom each importance is drawn as a tag, and with its code. */
const TAG_FROM = [16, 14.5, 13.5, 10, 8];
const CODE_FROM = [17.25, 16.5, 15.25, 12.5, 9];

/** From this zoom on, what has no room for a tag is a dot. */
const DOTS = 14;

/**
 * The spans: pattern by placement, weight by fibers.
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {DrawnSpan[]} spans
 */
export function paintSpans(canvas, frame, inks, spans) {
  /** @type {Map<string, DrawnSpan[]>} */
  const alike = new Map();
  for (const span of spans) {
    if (!frame.meets(span.box)) continue;
    const key = `${span.placement} ${span.width} ${span.state === "in service"}`;
    const list = alike.get(key);
    if (list) list.push(span);
    else alike.set(key, [span]);
  }
  const grown = Math.max(0.55, Math.min(1.25, 0.55 + (frame.zoom - 11) * 0.12));
  canvas.lineJoin = "round";
  for (const list of alike.values()) {
    const first = list[0];
    if (!first) continue;
    canvas.beginPath();
    for (const span of list) frame.trace(canvas, span.line);
    canvas.setLineDash(frame.zoom < 12.5 ? [] : (PATTERNS[first.placement] ?? []));
    canvas.lineWidth = first.width * grown;
    canvas.strokeStyle = first.state === "in service" ? inks.ink : inks.hair;
    canvas.stroke();
  }
  canvas.setLineDash([]);
}

/**
 * The structures: letter tags in a plain box where there is room, an enclosure as a ring round the tag.
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {DrawnStructure[]} structures the most important first
 * @param {Room} room
 */
export function paintStructures(canvas, frame, inks, structures, room) {
  for (const structure of structures) {
    const x = frame.x(structure.x);
    const y = frame.y(structure.y);
    if (!frame.holds(x, y, 20)) continue;
    const { importance } = structure;
    if (frame.zoom < (TAG_FROM[importance] ?? 0) || !tag(canvas, inks, structure, x, y, room)) {
      if ((frame.zoom >= DOTS || importance >= 2) && !room.taken(x, y)) dot(canvas, inks, structure, x, y);
      continue;
    }
    if (frame.zoom >= (CODE_FROM[importance] ?? 0)) code(canvas, inks, structure, x, y, room);
  }
}

/**
 * @param {CanvasRenderingContext2D} canvas
 * @param {Inks} inks
 * @param {DrawnStructure} structure
 * @param {number} x
 * @param {number} y
 * @param {Room} room
 * @returns {boolean} whether there was room
 */
function tag(canvas, inks, structure, x, y, room) {
  const letters = tagOf(structure.kind);
  canvas.font = `600 9px ${inks.font}`;
  const half = canvas.measureText(letters).width / 2 + 3;
  const ring = structure.enclosures > 0 ? 4 : 0;
  if (!room.take(x - half - ring, y - 7 - ring, x + half + ring, y + 7 + ring)) return false;
  if (ring > 0) {
    canvas.beginPath();
    canvas.ellipse(x, y, half + 5, 11, 0, 0, Math.PI * 2);
    canvas.fillStyle = inks.paper;
    canvas.fill();
    canvas.strokeStyle = inks.ink;
    canvas.lineWidth = 1.3;
    canvas.stroke();
  }
  canvas.fillStyle = inks.paper;
  canvas.strokeStyle = structure.state === "in service" ? inks.ink : inks.hair;
  canvas.lineWidth = 1;
  canvas.fillRect(Math.round(x - half), Math.round(y - 6), Math.round(half * 2), 12);
  canvas.strokeRect(Math.round(x - half) + 0.5, Math.round(y - 6) + 0.5, Math.round(half * 2) - 1, 11);
  canvas.textAlign = "center";
  canvas.textBaseline = "middle";
  canvas.fillStyle = structure.state === "in service" ? inks.ink : inks.lighter;
  canvas.fillText(letters, x, y + 0.5);
  return true;
}

/**
 * @param {CanvasRenderingContext2D} canvas
 * @param {Inks} inks
 * @param {DrawnStructure} structure
 * @param {number} x
 * @param {number} y
 */
function dot(canvas, inks, structure, x, y) {
  canvas.beginPath();
  if (structure.enclosures > 0) {
    canvas.arc(x, y, 3.4, 0, Math.PI * 2);
    canvas.fillStyle = inks.paper;
    canvas.fill();
    canvas.strokeStyle = inks.ink;
    canvas.lineWidth = 1.2;
    canvas.stroke();
    return;
  }
  canvas.rect(x - 1.5, y - 1.5, 3, 3);
  canvas.fillStyle = inks.ink;
  canvas.fill();
}

/**
 * @param {CanvasRenderingContext2D} canvas
 * @param {Inks} inks
 * @param {DrawnStructure} structure
 * @param {number} x
 * @param {number} y
 * @param {Room} room
 */
function code(canvas, inks, structure, x, y, room) {
  canvas.font = `11px ${inks.font}`;
  const width = canvas.measureText(structure.code).width;
  const beside = 10 + tagOf(structure.kind).length * 3 + (structure.enclosures > 0 ? 5 : 0);
  const spots = [
    { left: x + beside, middle: y },
    { left: x - beside - width, middle: y },
    { left: x - width / 2, middle: y + 18 },
    { left: x - width / 2, middle: y - 18 },
  ];
  const spot = spots.find(({ left, middle }) => room.take(left - 1, middle - 7, left + width + 1, middle + 7));
  if (!spot) return;
  canvas.textAlign = "left";
  canvas.textBaseline = "middle";
  canvas.lineJoin = "round";
  canvas.lineWidth = 3;
  canvas.strokeStyle = inks.paper;
  canvas.strokeText(structure.code, spot.left, spot.middle);
  canvas.fillStyle = inks.ink;
  canvas.fillText(structure.code, spot.left, spot.middle);
}
