import { formatRange, parseRange, rangeSize } from "../quantity/index.js";
import { bandsOf, restsOf } from "./enclosure-bands.js";

/** @typedef {import("../server/contract.d.ts").Enclosure} Enclosure */
/** @typedef {import("../server/contract.d.ts").Leg} Leg */
/** @typedef {import("./enclosure-bands.js").Band} Band */
/** @typedef {import("./enclosure-bands.js").Rest} Rest */

/** The drawing's size and the outline in it, px. */
export const DRAWING = Object.freeze({ width: 520, height: 368, cx: 260, cy: 188, rx: 118, ry: 100 });

/** Widths of bands, px: the widest leg's bands together, the least of one, the most a fiber, and the gap between two. */
const BAND = Object.freeze({ leg: 60, least: 2, fiber: 0.9, gap: 3 });

/** Least angle between two legs' middles, radians. */
const APART = 0.36;

/**
 * @typedef {object} Point
 * @property {number} x
 * @property {number} y
 */

/**
 * @typedef {object} Gate where a leg comes through the outline
 * @property {string} id cable and side
 * @property {Leg} leg
 * @property {number} bearing true bearing in which it leaves, radians from north
 * @property {number} at where on the outline its middle is, radians from north
 * @property {Slot[]} slots side by side, clockwise
 */

/**
 * @typedef {object} Slot the place of one band or rest on its gate
 * @property {Band | Rest} of
 * @property {number} width px
 * @property {number} at radians from north
 */

/**
 * @typedef {object} Box a panel, or splitters alike, inside the outline
 * @property {string} id
 * @property {string} label
 * @property {number} x middle
 * @property {number} y middle
 * @property {number} width
 * @property {number} height
 */

/**
 * @typedef {object} Layout
 * @property {Gate[]} gates clockwise from north
 * @property {Box[]} boxes
 * @property {Band[]} bands
 * @property {number} scale px a fiber
 */

/**
 * The enclosure's diagram laid out: each leg at its true bearing, one band a range.
 * @param {Enclosure} enclosure
 * @returns {Layout}
 */
export function layOut(enclosure) {
  const bands = bandsOf(enclosure);
  const scale = Math.min(BAND.fiber, BAND.leg / Math.max(1, ...enclosure.legs.map((leg) => cutFibers(leg))));
  const gates = enclosure.legs.map((leg, index) => gateOf(leg, index, bands, scale));
  gates.sort((one, other) => one.at - other.at);
  spread(gates);
  for (const gate of gates) orderSlots(gate, gates);
  return { gates, boxes: boxesOf(enclosure, bands, gates), bands, scale };
}

/**
 * A point of the outline, or beyond it.
 * @param {number} angle radians from north, clockwise
 * @param {number} [beyond] px outside the outline
 * @returns {Point}
 */
export function onOutline(angle, beyond = 0) {
  const { cx, cy, rx, ry } = DRAWING;
  return { x: cx + (rx + beyond) * Math.sin(angle), y: cy - (ry + beyond) * Math.cos(angle) };
}

/**
 * A range of numbers, several joined by commas, short enough to be read; else how many there are.
 * @param {string[]} ranges
 * @param {number} [longest] characters
 * @returns {string}
 */
export function rangesText(ranges, longest = 14) {
  const text = ranges.join(", ");
  if (text.length <= longest) return text;
  const total = ranges.reduce((sum, each) => sum + rangeSize(parseRange(each)), 0);
  return `${total} fibers`;
}

/**
 * @param {Leg} leg
 * @param {number} index
 * @param {Band[]} bands
 * @param {number} scale px a fiber
 * @returns {Gate}
 */
function gateOf(leg, index, bands, scale) {
  const id = `${leg.cable} ${leg.side}`;
  const bearing = ((leg.bearing_deg ?? 150 + index * 20) * Math.PI) / 180;
  const joined = bands.filter((band) => band.a.gate === id || band.b.gate === id);
  /** @type {Array<Band | Rest>} */
  const parts = [...joined, ...restsOf(leg)];
  const slots = parts.map((of) => ({ of, width: widthOf(of.count, scale), at: 0 }));
  return { id, leg, bearing, at: bearing, slots };
}

/**
 * @param {number} fibers
 * @param {number} scale px a fiber
 * @returns {number} px
 */
export function widthOf(fibers, scale) {
  return Math.max(BAND.least, fibers * scale);
}

/**
 * @param {Leg} leg
 * @returns {number} fibers of it that do not go through
 */
function cutFibers(leg) {
  const cut = leg.ends.filter((end) => end.state !== "through" && end.state !== "unrecorded");
  return cut.reduce((sum, end) => sum + rangeSize(parseRange(end.fibers)), 0);
}

/**
 * Pushes gates apart along the outline until none overlaps its neighbour.
 * @param {Gate[]} gates by angle
 */
function spread(gates) {
  const halves = gates.map((gate) => Math.max(APART / 2, arc(gateWidth(gate)) / 2 + 0.06));
  for (let round = 0; round < 60; round++) {
    let moved = false;
    for (let index = 0; index < gates.length && gates.length > 1; index++) {
      moved = pushApart(gates, halves, index) || moved;
    }
    if (!moved) return;
  }
}

/**
 * @param {Gate[]} gates
 * @param {number[]} halves half of each gate's share of the outline, radians
 * @param {number} index of the gate that comes first, clockwise
 * @returns {boolean} whether it and the next one had to move
 */
function pushApart(gates, halves, index) {
  const next = (index + 1) % gates.length;
  const one = gates[index];
  const other = gates[next];
  if (!one || !other) return false;
  const turn = next === 0 ? 2 * Math.PI : 0;
  const short = (halves[index] ?? 0) + (halves[next] ?? 0) - (other.at + turn - one.at);
  if (short <= 1e-3) return false;
  one.at -= short / 2;
  other.at += short / 2;
  return true;
}

/**
 * @param {Gate} gate
 * @returns {number} px
 */
function gateWidth(gate) {
  return gate.slots.reduce((sum, slot) => sum + slot.width + BAND.gap, 0);
}

/**
 * @param {number} px along the outline
 * @returns {number} radians
 */
function arc(px) {
  return px / ((DRAWING.rx + DRAWING.ry) / 2);
}

/**
 * Orders a gate's slots so that bands leave toward the gate they go to, and gives each its place.
 * @param {Gate} gate
 * @param {Gate[]} gates
 */
function orderSlots(gate, gates) {
  const turnTo = (/** @type {Slot} */ slot) => {
    if (slot.of.what === "rest") return 10;
    const id = slot.of.a.gate === gate.id ? slot.of.b.gate : slot.of.a.gate;
    const other = gates.find((each) => each.id === id);
    const turn = (((other?.at ?? gate.at + Math.PI) - gate.at) % (2 * Math.PI) + 2 * Math.PI) % (2 * Math.PI);
    return 2 * Math.PI - turn;
  };
  const order = (/** @type {Slot} */ slot) => (slot.of.what === "rest" ? 0 : slot.of.order * (slot.of.a.gate === gate.id ? 1 : -1));
  gate.slots.sort((one, other) => turnTo(one) - turnTo(other) || order(one) - order(other));
  let at = gate.at - arc(gateWidth(gate)) / 2;
  for (const slot of gate.slots) {
    slot.at = at + arc(slot.width + BAND.gap) / 2;
    at += arc(slot.width + BAND.gap);
  }
}

/**
 * Panels and splitters, stacked in the middle, each near the legs that it is joined to; splitters alike share a box.
 * @param {Enclosure} enclosure
 * @param {Band[]} bands
 * @param {Gate[]} gates
 * @returns {Box[]}
 */
function boxesOf(enclosure, bands, gates) {
  const panels = enclosure.panels.map((each) => ({ id: `panel ${each.panel}`, label: `${each.panel}: ${each.ports.length} ports` }));
  const sizes = [...new Set(enclosure.splitters.map((each) => `${each.inputs}:${each.outputs}`))];
  const splitters = sizes.map((size) => {
    const alike = enclosure.splitters.filter((each) => `${each.inputs}:${each.outputs}` === size).map((each) => each.splitter);
    const name = alike.length > 2 ? `${alike[0]} to ${alike.at(-1)}` : alike.join(", ");
    return { id: `splitter ${size}`, label: `${name}: ${size}` };
  });
  const all = [...panels, ...splitters].sort((one, other) => pull(one.id, bands, gates) - pull(other.id, bands, gates));
  const height = Math.min(28, 140 / Math.max(1, all.length) - 6);
  const top = DRAWING.cy - (all.length * (height + 6) - 6) / 2;
  const x = DRAWING.cx - (DRAWING.rx - 62) * lean(gates);
  return all.map((each, index) => ({ ...each, x, y: top + index * (height + 6) + height / 2, width: Math.max(96, each.label.length * 6.4 + 12), height }));
}

/**
 * @param {Gate[]} gates
 * @returns {number} -1 where all legs leave westward, 1 where all leave eastward: boxes give way to the other side
 */
function lean(gates) {
  return gates.length === 0 ? 0 : gates.reduce((sum, gate) => sum + Math.sin(gate.at), 0) / gates.length;
}

/**
 * @param {string} box
 * @param {Band[]} bands
 * @param {Gate[]} gates
 * @returns {number} mean height of the gates that a box is joined to, px from the top
 */
function pull(box, bands, gates) {
  const ids = bands.flatMap(({ a, b }) => (a.box === box ? [b.gate] : b.box === box ? [a.gate] : []));
  const heights = gates.filter((gate) => ids.includes(gate.id)).map((gate) => onOutline(gate.at).y);
  return heights.length === 0 ? DRAWING.cy : heights.reduce((sum, each) => sum + each, 0) / heights.length;
}

/**
 * Which way round a bar goes from one gate to another: past as few legs as may be, then the shorter way.
 * @param {Gate} from
 * @param {Gate} to
 * @param {Gate[]} gates
 * @returns {number} the turn, radians, clockwise above 0
 */
export function wayRound(from, to, gates) {
  const full = 2 * Math.PI;
  const turnTo = (/** @type {Gate} */ gate) => (((gate.at - from.at) % full) + full) % full;
  const clockwise = turnTo(to);
  const others = gates.filter((gate) => gate !== from && gate !== to);
  const met = others.filter((gate) => turnTo(gate) < clockwise).length;
  const metBack = others.length - met;
  const forward = met === metBack ? clockwise <= Math.PI : met < metBack;
  return forward ? clockwise : clockwise - full;
}

/**
 * The fibers of a leg that go through, by ranges.
 * @param {Leg} leg
 * @returns {string[]}
 */
export function throughRanges(leg) {
  /** @type {string[]} */
  const ranges = [];
  for (const end of leg.ends) {
    if (end.state !== "through" && end.state !== "unrecorded") continue;
    const last = ranges.length > 0 ? parseRange(ranges.at(-1) ?? "") : null;
    const { first, last: to } = parseRange(end.fibers);
    if (last && last.last + 1 === first) ranges[ranges.length - 1] = formatRange({ first: last.first, last: to });
    else ranges.push(end.fibers);
  }
  return ranges;
}
