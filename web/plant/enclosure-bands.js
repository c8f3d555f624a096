import { formatRange, parseRange, rangeSize } from "../quantity/index.js";

/** @typedef {import("../server/contract.d.ts").Enclosure} Enclosure */
/** @typedef {import("../server/contract.d.ts").Joint} Joint */
/** @typedef {import("../server/contract.d.ts").EndRange} EndRange */
/** @typedef {import("../server/contract.d.ts").Leg} Leg */

/**
 * @typedef {object} Side one side of a band
 * @property {string} gate cable and side of a leg; empty for a box
 * @property {string} box of a panel or splitters; empty for a leg
 * @property {string} of code of the cable, panel or splitter
 * @property {string} numbers
 */

/**
 * @typedef {object} Band joints that run on from one another, drawn as one
 * @property {"band"} what
 * @property {number} order as first recorded
 * @property {Side} a
 * @property {Side} b
 * @property {number} count pairs joined
 * @property {string[]} trays
 * @property {"known" | "planned" | "unknown"} trust of all its joints
 */

/**
 * @typedef {object} Rest ends of a leg that no joint uses and that do not go through
 * @property {"rest"} what
 * @property {"capped" | "stored" | "unknown"} state
 * @property {string[]} ranges
 * @property {number} count
 */

/**
 * The bands of an enclosure: neighbouring ranges that run on side by side are one, so that what is crossed stands out; what
 * is only planned or of unknown trust stays apart from what is known.
 * Jumpers, which lie outside, are left out.
 * @param {Enclosure} enclosure
 * @returns {Band[]}
 */
export function bandsOf(enclosure) {
  /** @type {Band[]} */
  const bands = [];
  const joints = enclosure.joints.filter((joint) => joint.kind !== "jumper" && joint.a.enclosure === joint.b.enclosure);
  joints.forEach((joint, order) => {
    const band = bandOf(enclosure, joint, order);
    const before = bands.find((each) => runsOn(each, band));
    if (before) extend(before, band);
    else bands.push(band);
  });
  return bands;
}

/**
 * @param {Enclosure} enclosure
 * @param {Joint} joint
 * @param {number} order
 * @returns {Band}
 */
function bandOf(enclosure, joint, order) {
  const a = sideOf(enclosure, joint.a);
  const b = sideOf(enclosure, joint.b);
  return { what: "band", order, a, b, count: joint.count, trays: joint.tray === null ? [] : [joint.tray], trust: sureness(joint.trust) };
}

/**
 * @param {string} trust of a joint
 * @returns {Band["trust"]}
 */
function sureness(trust) {
  return trust === "planned" || trust === "unknown" ? trust : "known";
}

/**
 * @param {Enclosure} enclosure
 * @param {EndRange} end
 * @returns {Side}
 */
function sideOf(enclosure, end) {
  if (end.kind === "leg") return { gate: `${end.of} ${end.side}`, box: "", of: end.of, numbers: end.numbers };
  if (end.kind === "port_rear" || end.kind === "port_front") return { gate: "", box: `panel ${end.of}`, of: end.of, numbers: end.numbers };
  const splitter = enclosure.splitters.find((each) => each.splitter === end.of);
  return { gate: "", box: `splitter ${splitter?.inputs ?? 1}:${splitter?.outputs ?? 2}`, of: end.of, numbers: end.kind === "splitter_in" ? "in" : end.numbers };
}

/**
 * @param {Band} one
 * @param {Band} next
 * @returns {boolean} whether the next one's numbers go on where this one's end, on both sides
 */
function runsOn(one, next) {
  return one.trust === next.trust && goesOn(one.a, next.a) && goesOn(one.b, next.b);
}

/**
 * @param {Side} one
 * @param {Side} next
 * @returns {boolean}
 */
function goesOn(one, next) {
  if (one.gate !== next.gate || one.box !== next.box) return false;
  if (one.box.startsWith("splitter")) return one.numbers === "in" && next.numbers === "in";
  if (one.of !== next.of) return false;
  const here = parseRange(one.numbers);
  const there = parseRange(next.numbers);
  const rises = here.last >= here.first;
  const aligned = rangeSize(there) === 1 || there.last >= there.first === rises || rangeSize(here) === 1;
  return aligned && there.first - here.last === (rises ? 1 : -1);
}

/**
 * @param {Band} band
 * @param {Band} next
 */
function extend(band, next) {
  for (const [side, more] of /** @type {Array<[Side, Side]>} */ ([[band.a, next.a], [band.b, next.b]])) {
    if (side.numbers === "in") side.of = side.of.includes(more.of) ? side.of : `${side.of.split(" ")[0]} to ${more.of}`;
    else side.numbers = formatRange({ first: parseRange(side.numbers).first, last: parseRange(more.numbers).last });
  }
  band.count += next.count;
  band.trays = [...new Set([...band.trays, ...next.trays])];
}

/**
 * The ends of a leg that are capped, stored or not known.
 * @param {Leg} leg
 * @returns {Rest[]} at most one a state
 */
export function restsOf(leg) {
  /** @type {Rest[]} */
  const rests = [];
  for (const state of /** @type {const} */ (["capped", "stored", "unknown"])) {
    const ranges = leg.ends.filter((end) => end.state === state).map((end) => end.fibers);
    const count = ranges.reduce((sum, each) => sum + rangeSize(parseRange(each)), 0);
    if (count > 0) rests.push({ what: "rest", state, ranges, count });
  }
  return rests;
}
