/** @typedef {import("./frame.js").Frame} Frame */
/** @typedef {import("./frame.js").Room} Room */
/** @typedef {import("./inks.js").Inks} Inks */
/** @typedef {import("./projected.js").DrawnBase} DrawnBase */

/** Kinds drawn as ways, and how wide at a street's zoom, px. @type {Readonly<Record<string, number>>} */
const WAYS = Object.freeze({ road: 5, street: 3, rail: 1.4, track: 1, river: 4 });

/** Ways that are broken lines. @type {Readonly<Record<string, number[]>>} */
const DASHES = Object.freeze({ rail: [6, 4], track: [3, 3] });

/** Small streets are drawn from this zoom on, and buildings. */
const STREETS = 12.5;
const BUILDINGS = 14.5;

/**
 * The base map, in the faintest ink: what the plant is found by, never louder than it.
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {DrawnBase[]} base
 */
export function paintBase(canvas, frame, inks, base) {
  for (const each of base) {
    if ((each.rings[0]?.length ?? 0) < 4 || !frame.meets(each.box)) continue;
    if (each.area) paintArea(canvas, frame, inks, each);
    else paintWay(canvas, frame, inks, each);
  }
}

/**
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {DrawnBase} area
 */
function paintArea(canvas, frame, inks, area) {
  if (area.kind === "building" && frame.zoom < BUILDINGS) return;
  canvas.beginPath();
  for (const ring of area.rings) frame.trace(canvas, ring);
  canvas.closePath();
  const solid = area.kind === "water" || area.kind === "building";
  canvas.fillStyle = inks.faint;
  canvas.globalAlpha = solid ? 0.55 : 0.22;
  canvas.fill("evenodd");
  canvas.globalAlpha = 1;
  canvas.strokeStyle = inks.faint;
  canvas.lineWidth = 1;
  canvas.setLineDash(solid ? [] : [2, 3]);
  canvas.stroke();
  canvas.setLineDash([]);
}

/**
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {DrawnBase} way
 */
function paintWay(canvas, frame, inks, way) {
  if (way.rank > 3 && frame.zoom < STREETS) return;
  const grown = Math.max(0.35, Math.min(2.6, 2 ** (frame.zoom - 15.5)));
  const flows = way.kind === "river" || way.kind === "water";
  canvas.beginPath();
  for (const ring of way.rings) frame.trace(canvas, ring);
  canvas.strokeStyle = inks.faint;
  canvas.lineJoin = "round";
  canvas.setLineDash(DASHES[way.kind] ?? []);
  canvas.lineWidth = Math.max(0.8, widthOf(way) * grown);
  canvas.globalAlpha = flows ? 0.55 : 0.8;
  canvas.stroke();
  canvas.globalAlpha = 1;
  canvas.setLineDash([]);
}

/**
 * @param {DrawnBase} way
 * @returns {number} px at a street's zoom
 */
function widthOf({ kind, rank }) {
  return WAYS[kind === "street" && rank < 3 ? "road" : kind] ?? 1.2;
}

/**
 * Names of places, which get the room after the plant's sites and before its small tags.
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {DrawnBase[]} base
 * @param {Room} room
 */
export function paintPlaces(canvas, frame, inks, base, room) {
  const places = base.filter((each) => each.name && each.rings[0]?.length === 2);
  for (const place of places.sort((one, other) => one.rank - other.rank)) placeName(canvas, frame, inks, place, room);
}

/**
 * Names of ways and areas, where the plant leaves room.
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {DrawnBase[]} base
 * @param {Room} room
 */
export function paintNames(canvas, frame, inks, base, room) {
  const named = base.filter((each) => each.name && (each.rings[0]?.length ?? 0) > 2);
  for (const each of named.sort((one, other) => one.rank - other.rank)) {
    if (frame.zoom >= nameFrom(each)) wayName(canvas, frame, inks, each, room);
  }
}

/**
 * @param {DrawnBase} each
 * @returns {number} from which zoom on its name is written
 */
function nameFrom({ area, rank, kind }) {
  if (area) return kind === "building" ? 15 : 12;
  return rank > 3 ? 15.5 : 13.5;
}

/**
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {DrawnBase} place
 * @param {Room} room
 */
function placeName(canvas, frame, inks, place, room) {
  const x = frame.x(place.rings[0]?.[0] ?? 0);
  const y = frame.y(place.rings[0]?.[1] ?? 0);
  if (!frame.holds(x, y, 60)) return;
  const size = place.rank === 1 ? 15 : place.rank === 2 ? 13 : 12;
  canvas.font = `${place.rank < 3 ? 600 : 400} ${size}px ${inks.font}`;
  written(canvas, inks, place.name ?? "", x, y, room);
}

/**
 * The name of a way along its longest piece on the screen; of an area in its middle.
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {DrawnBase} way
 * @param {Room} room
 */
function wayName(canvas, frame, inks, way, room) {
  const line = way.rings[0];
  if (!line || !frame.meets(way.box)) return;
  canvas.font = `italic 11px ${inks.font}`;
  const name = way.name ?? "";
  const spot = way.area ? middleOf(frame, line) : longestPiece(frame, line);
  const width = canvas.measureText(name).width;
  if (!spot || (!way.area && spot.length < width + 16)) return;
  const reach = Math.abs(Math.cos(spot.angle)) * width * 0.5 + 4;
  const rise = Math.abs(Math.sin(spot.angle)) * width * 0.5 + 8;
  if (!room.take(spot.x - reach, spot.y - rise, spot.x + reach, spot.y + rise)) return;
  canvas.save();
  canvas.translate(spot.x, spot.y);
  canvas.rotate(spot.angle);
  haloed(canvas, inks, name, inks.lighter);
  canvas.restore();
}

/**
 * @param {Frame} frame
 * @param {Float64Array} line
 * @returns {{ x: number, y: number, angle: number, length: number }}
 */
function middleOf(frame, line) {
  let [x, y] = [0, 0];
  for (let index = 0; index < line.length; index += 2) {
    x += frame.x(line[index] ?? 0);
    y += frame.y(line[index + 1] ?? 0);
  }
  return { x: (x * 2) / line.length, y: (y * 2) / line.length, angle: 0, length: 0 };
}

/**
 * @param {Frame} frame
 * @param {Float64Array} line
 * @returns {{ x: number, y: number, angle: number, length: number } | null} middle of its longest piece that begins on the screen
 */
function longestPiece(frame, line) {
  let best = null;
  for (let index = 0; index + 3 < line.length; index += 2) {
    const [ax, ay] = [frame.x(line[index] ?? 0), frame.y(line[index + 1] ?? 0)];
    const [bx, by] = [frame.x(line[index + 2] ?? 0), frame.y(line[index + 3] ?? 0)];
    const [x, y, length] = [(ax + bx) / 2, (ay + by) / 2, Math.hypot(bx - ax, by - ay)];
    if (!frame.holds(x, y, -20) || (best && best.length >= length)) continue;
    const angle = Math.atan2(by - ay, bx - ax);
    best = { x, y, length, angle: Math.abs(angle) > Math.PI / 2 ? angle + Math.PI : angle };
  }
  return best;
}

/** Where a name is tried about its place, px down. */
const ABOUT = [0, -22, 22, -36, 36];

/**
 * @param {CanvasRenderingContext2D} canvas
 * @param {Inks} inks
 * @param {string} text
 * @param {number} x
 * @param {number} y
 * @param {Room} room
 */
function written(canvas, inks, text, x, y, room) {
  const half = canvas.measureText(text).width / 2 + 3;
  const down = ABOUT.find((each) => room.take(x - half, y + each - 9, x + half, y + each + 9));
  if (down === undefined) return;
  canvas.save();
  canvas.translate(x, y + down);
  haloed(canvas, inks, text, inks.lighter);
  canvas.restore();
}

/**
 * Text on a halo of paper, its middle at the origin.
 * @param {CanvasRenderingContext2D} canvas
 * @param {Inks} inks
 * @param {string} text
 * @param {string} ink
 */
function haloed(canvas, inks, text, ink) {
  canvas.textAlign = "center";
  canvas.textBaseline = "middle";
  canvas.lineJoin = "round";
  canvas.lineWidth = 3;
  canvas.strokeStyle = inks.paper;
  canvas.strokeText(text, 0, 0);
  canvas.fillStyle = ink;
  canvas.fillText(text, 0, 0);
}
