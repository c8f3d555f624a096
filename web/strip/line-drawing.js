import { nothing, svg } from "lit";
import { CHIP_WIDTH, drawnChip } from "../color/index.js";
import { decimal } from "../quantity/index.js";
import { openBasis } from "../basis/index.js";
import { sectionsOf, stopBasis, stopsOf } from "../path/index.js";
import { withoutOverlap } from "./window.js";

/** @typedef {import("./window.js").Window} Window */
/** @typedef {import("../server/contract.d.ts").Path} Path */
/** @typedef {import("../path/sections.js").Section} Section */
/** @typedef {import("../path/sections.js").Stop} Stop */

/** Where the line lies, px from the drawing's top. */
export const LINE = 44;

/** Width of a letter of the strip's text, px. */
const LETTER = 6.3;

/**
 * The path's line to scale of its glass: sections with cable and chips on it, structures and enclosures as ticks.
 * @param {Path} path
 * @param {Window} window
 * @returns {unknown}
 */
export function drawnLine(path, window) {
  const stops = stopsOf(path).filter((stop) => window.holds(stop.glass));
  return svg`<g class="strip-line">
    ${structureTicks(path, window)}
    <line class="glass" x1=${window.left} y1=${LINE} x2=${window.right} y2=${LINE}></line>
    ${coils(path, window)}
    ${stops.filter((stop) => stop.through).map((stop) => stopTick(stop, window))}
    ${sectionsOf(path).filter((section) => section.to >= window.from && section.from <= window.to).map((section) => drawnSection(section, window))}
    ${stops.filter((stop) => !stop.through).map((stop) => stopTick(stop, window))}
    ${stopLabels(stops, window)}</g>`;
}

/**
 * Structures that the glass only passes, where they are not too dense to tell apart.
 * @param {Path} path
 * @param {Window} window
 * @returns {unknown}
 */
function structureTicks(path, window) {
  const within = path.stations.filter((station) => window.holds(station.glass_m));
  if (within.length > (window.right - window.left) / 4) return nothing;
  return within.map((station) => svg`<line class="structure-tick" x1=${window.x(station.glass_m)} y1=${LINE} x2=${window.x(station.glass_m)} y2=${LINE + 7}></line>`);
}

/**
 * Coils, as wide as the glass in them.
 * @param {Path} path
 * @param {Window} window
 * @returns {unknown}
 */
function coils(path, window) {
  return path.stations.filter((station) => station.coil_m > 0 && window.holds(station.glass_m, station.coil_m)).map((station) => {
    const width = Math.max(2, station.coil_m * window.scale);
    return svg`<rect class="coil" x=${window.x(station.glass_m) - width / 2} y=${LINE - 3.5} width=${width} height="7"><title>coil at ${station.structure}</title></rect>`;
  });
}

/**
 * @param {Section} section
 * @param {Window} window
 * @returns {unknown}
 */
function drawnSection(section, window) {
  const from = Math.max(window.left, window.x(section.from));
  const to = Math.min(window.right, window.x(section.to));
  const { cable, fiber, tube, tube_color: tubeColor, fiber_color: fiberColor } = section.fiber;
  const name = cable.length * LETTER + 8;
  const full = name + 2 * CHIP_WIDTH + 4;
  const room = to - from - 14;
  if (room < name) return nothing;
  const chips = room >= full;
  const width = chips ? full : name;
  const x = (from + to) / 2 - width / 2;
  return svg`<g class="section-name"><rect x=${x - 3} y=${LINE - 9} width=${width + 4} height="18"></rect>
    <text x=${x} y=${LINE + 4}>${cable}</text>
    ${chips ? svg`${drawnChip(tubeColor, tube, x + name - 2, LINE - 7)}${drawnChip(fiberColor, fiber, x + name + CHIP_WIDTH, LINE - 7)}` : nothing}</g>`;
}

/**
 * @param {Stop} stop
 * @param {Window} window
 * @returns {unknown} a ring on the line where something is joined, a short tick where the glass goes through
 */
function stopTick(stop, window) {
  const x = window.x(stop.glass);
  if (stop.through) return svg`<line class="through-tick" x1=${x} y1=${LINE - 7} x2=${x} y2=${LINE + 7}></line>`;
  return svg`<line class="stop-tick" x1=${x} y1=${LINE - 12} x2=${x} y2=${LINE + 12}></line><circle class="stop-ring" cx=${x} cy=${LINE} r="4"></circle>`;
}

/**
 * Names of enclosures and what is lost there, as there is room.
 * @param {Stop[]} stops
 * @param {Window} window
 * @returns {unknown}
 */
function stopLabels(stops, window) {
  const wanted = stops.map((stop) => {
    const lost = stop.through ? "" : decimal(stop.loss, 2);
    const width = Math.max(stop.at.length * LETTER, (lost.length + 3) * 5.6);
    return { item: { stop, lost }, middle: window.x(stop.glass), width, weight: stop.through ? 0 : 1 + stop.loss };
  });
  return withoutOverlap(wanted, window.left - 24, window.right + 24).map(({ item, middle }) => svg`<g class=${`stop-label ${item.stop.through ? "through" : ""} ${sureness(item.stop)}`} @click=${(/** @type {Event} */ event) => opened(event, item.stop)}>
    <text x=${middle} y="13">${item.stop.at}</text>${item.lost === "" ? nothing : svg`<text class="stop-loss" x=${middle} y="26">${item.lost}<tspan> dB</tspan></text>`}</g>`);
}

/**
 * @param {Event} event
 * @param {Stop} stop
 */
function opened(event, stop) {
  if (!stop.through) openBasis(event, { what: `Loss at ${stop.at}`, kind: "loss", value: stop.loss, basis: stopBasis(stop) });
}

/**
 * @param {Stop} stop
 * @returns {string} `reckoned` where any of its losses is a planning value
 */
function sureness(stop) {
  return stop.elements.some((element) => element.basis === "planning") ? "reckoned" : "";
}
