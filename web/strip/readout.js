import { html, nothing } from "lit";
import { figure } from "../basis/index.js";
import { link } from "../address/index.js";
import { inWords, length, loss, units } from "../quantity/index.js";
import { elementAt, lossAt, placeAt, stopBasis, stopsOf } from "../path/index.js";

/** @typedef {import("../server/contract.d.ts").Path} Path */
/** @typedef {import("../path/track.js").Measure} Measure */
/** @typedef {import("./curve-field.js").Curve} Curve */

/** The pointer stands at a structure when less sheath parts them, metres. */
const AT = 0.05;

/** The pointer stands on a stop when no more glass than a tray holds parts them, metres. */
const NEAR_STOP = 5;

/**
 * Where a place lies between structures.
 * @param {Path} path
 * @param {number} glass metres from the path's start
 * @returns {{ before: string, after: string, beyond: number }} beyond: sheath metres past the one before; both alike at a structure
 */
export function between(path, glass) {
  const { stations } = path;
  let index = stations.findIndex((station) => station.glass_m > glass);
  if (index < 0) index = stations.length;
  const before = stations[Math.max(0, index - 1)];
  const after = stations[index] ?? before;
  const sheath = path.track.length > 0 ? placeAt(path.track, glass).sheath : 0;
  return { before: before?.structure ?? "", after: after?.structure ?? "", beyond: Math.max(0, sheath - (before?.sheath_m ?? 0)) };
}

/**
 * What the pointer stands on, in numbers that open their basis.
 * @param {Curve[]} curves
 * @param {number} glass metres from the path's start
 * @returns {unknown}
 */
export function readout(curves, glass) {
  const path = curves[0]?.path;
  if (!path || path.track.length === 0) return nothing;
  const place = placeAt(path.track, glass);
  const at = between(path, glass);
  const element = elementAt(path, glass);
  const source = element?.kind === "fiber" ? element.length_source : "Jumper as recorded";
  const how = element?.kind === "fiber" ? element.length_basis : "recorded";
  const from = `from ${path.ends[0] ?? "the start"}`;
  return html`<span class="readout">
    ${figure(`Glass ${from}`, "length", place.glass, { how, source })} <span class="lighter">glass</span>
    ${figure(`Sheath ${from}`, "length", place.sheath, { how, source })} <span class="lighter">sheath</span>
    ${figure(`Route ${from}`, "length", place.route, { how: "sum", source: "Spans walked" })} <span class="lighter">route</span>
    ${curves.map(({ path: each, curve }) => html`<span class="readout-loss">${figure(`Expected loss ${from} at ${each.wavelength_nm} nm`, "loss", lossAt(curve, glass), { how: "sum", source: "Expected values of all that lies between" })} <span class="lighter">${each.wavelength_nm}</span></span>`)}
    <span class="readout-place">${placeText(at, { how, source })}</span>${stopThere(path, glass)}</span>`;
}

/**
 * @param {{ before: string, after: string, beyond: number }} at
 * @param {import("../basis/basis.js").Basis} basis of the length
 * @returns {unknown}
 */
function placeText(at, basis) {
  if (at.beyond < AT) return html`<span class="lighter">at</span> ${link("structure", at.before)}`;
  const toward = at.after === at.before ? nothing : html` <span class="lighter">toward</span> ${link("structure", at.after)}`;
  return html`${figure(`Sheath past ${at.before}`, "length", at.beyond, basis)} <span class="lighter">past</span> ${link("structure", at.before)}${toward}`;
}

/**
 * What is lost at the stop that the pointer stands on.
 * @param {Path} path
 * @param {number} glass metres from the path's start
 * @returns {unknown}
 */
function stopThere(path, glass) {
  const stop = stopsOf(path).find((each) => !each.through && Math.abs(each.glass - glass) <= NEAR_STOP);
  if (!stop) return nothing;
  const view = stop.elements.every((element) => element.kind === "jumper") ? "structure" : "enclosure";
  return html`<span class="readout-place">${figure(`Loss at ${stop.at}`, "loss", stop.loss, stopBasis(stop))} <span class="lighter">at</span> ${link(view, stop.at)}</span>`;
}

/**
 * The same for those who hear the page.
 * @param {Curve[]} curves
 * @param {number} glass
 * @param {Measure} measure
 * @returns {string}
 */
export function spokenPlace(curves, glass, measure) {
  const path = curves[0]?.path;
  if (!path || path.track.length === 0) return "";
  const place = placeAt(path.track, glass);
  const at = between(path, glass);
  const lost = curves.map(({ path: each, curve }) => `${inWords(loss(lossAt(curve, glass)))} at ${each.wavelength_nm} nm`);
  const where = at.beyond < AT ? `at ${at.before}` : `${inWords(length(at.beyond, units.unit))} past ${at.before}`;
  return `${inWords(length(place[measure], units.unit))} ${measure}, ${where}, ${lost.join(", ")}`;
}
