import { glassOf } from "./curve.js";

/** @typedef {import("../server/contract.d.ts").Path} Path */
/** @typedef {import("../server/contract.d.ts").Element} Element */
/** @typedef {import("../server/contract.d.ts").FiberElement} FiberElement */
/** @typedef {import("../server/contract.d.ts").Element & { loss_db: number }} Joined */

/**
 * @typedef {object} Section a stretch of one fiber without a joint, through whatever it passes uncut
 * @property {FiberElement} fiber the first of its elements
 * @property {number} from metres of glass from the path's start
 * @property {number} to
 */

/**
 * The sections of a path: neighbouring elements of one fiber as one.
 * @param {Path} path
 * @returns {Section[]}
 */
export function sectionsOf(path) {
  /** @type {Section[]} */
  const sections = [];
  let open = false;
  for (const element of path.elements) {
    if (element.kind === "fiber") {
      const last = sections.at(-1);
      if (open && last) last.to = element.glass_from_m + element.glass_m;
      else sections.push({ fiber: element, from: element.glass_from_m, to: element.glass_from_m + element.glass_m });
      open = true;
    } else if (element.kind !== "through") open = false;
  }
  return sections;
}

/**
 * @typedef {object} Stop what is met at one place of a path: joints, a splitter, connectors
 * @property {number} glass metres from the path's start
 * @property {string} at the enclosure or structure
 * @property {Element[]} elements
 * @property {number} loss dB of them all
 * @property {boolean} through nothing is cut here
 */

/**
 * The stops of a path, each enclosure once each time that the path meets it.
 * @param {Path} path
 * @returns {Stop[]} in order
 */
export function stopsOf(path) {
  /** @type {Stop[]} */
  const stops = [];
  for (const element of path.elements) {
    if (element.kind === "fiber") continue;
    const at = element.kind === "jumper" ? element.structure : element.enclosure;
    const last = stops.at(-1);
    const stop = last && last.at === at && element.glass_from_m - last.glass < 10 ? last : newStop(element, at, stops);
    stop.elements.push(element);
    stop.loss += element.loss_db;
    stop.through &&= element.kind === "through";
  }
  return stops;
}

/**
 * @param {Element} element
 * @param {string} at
 * @param {Stop[]} stops
 * @returns {Stop}
 */
function newStop(element, at, stops) {
  /** @type {Stop} */
  const stop = { glass: element.glass_from_m, at, elements: [], loss: 0, through: true };
  stops.push(stop);
  return stop;
}

/**
 * How the loss at a stop is known: measured where all of it is, a planning value where all of it is, else a sum of both.
 * @param {Stop} stop
 * @returns {{ how: string, source: string }}
 */
export function stopBasis(stop) {
  const lossy = stop.elements.filter((element) => element.kind !== "through");
  const ways = new Set(lossy.map((element) => element.basis));
  const how = ways.size === 1 ? ([...ways][0] ?? "sum") : "sum";
  return { how, source: lossy.map((element) => `${element.kind}: ${element.source}`).join("; ") };
}

/**
 * The element that holds a place.
 * @param {Path} path
 * @param {number} glass metres from the path's start
 * @returns {Element | null} a fiber or jumper; null where the path has no glass there
 */
export function elementAt(path, glass) {
  return path.elements.find((each) => glassOf(each) > 0 && glass >= each.glass_from_m && glass <= each.glass_from_m + glassOf(each)) ?? null;
}
