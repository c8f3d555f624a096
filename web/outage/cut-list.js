import { html, nothing } from "lit";
import { chip } from "../color/index.js";
import { link } from "../address/index.js";
import { useSign } from "../plant/index.js";
import { tubesOf } from "./sheath.js";

/** @typedef {import("../server/contract.d.ts").ImpactAnswer} ImpactAnswer */
/** @typedef {import("../server/contract.d.ts").FiberUse} FiberUse */
/** @typedef {import("./sheath.js").Sheath} Sheath */
/** @typedef {import("./sheath.js").Tube} Tube */

/**
 * The cut list: every fiber of each cut sheath by tube, tubes with what is to be restored first on top, to be ticked off
 * on both sides of the cut.
 * @param {ImpactAnswer} answer
 * @returns {unknown}
 */
export function cutList({ sheath }) {
  if (!sheath || sheath.length === 0) return nothing;
  return html`<h2>Cut list</h2>
    <p class="cautions">Meter for light before you look: it is unseen and harms. Treat every fiber as live until proven dark. Tell live from dark by a way that does not harm what is live.</p>
    ${sheath.map((each) => sheathTables(each))}`;
}

/**
 * @param {Sheath} sheath
 * @returns {unknown}
 */
function sheathTables(sheath) {
  return html`<h3 class="sheath-head">${link("cable", sheath.cable)}, cut between ${sideOf(sheath.from, sheath.from_structure)} and ${sideOf(sheath.to, sheath.to_structure)}</h3>
    ${tubesOf(sheath).map((tube) => tubeTable(tube, sheath))}`;
}

/**
 * @param {string | null} enclosure
 * @param {string} structure
 * @returns {unknown} where one side of the section ends
 */
function sideOf(enclosure, structure) {
  return enclosure ? link("enclosure", enclosure) : html`${link("structure", structure)} (bare end)`;
}

/**
 * @param {Tube} tube
 * @param {Sheath} sheath
 * @returns {unknown}
 */
function tubeTable(tube, sheath) {
  const [from, to] = [sheath.from ?? sheath.from_structure, sheath.to ?? sheath.to_structure];
  const state = tube.down > 0 ? html`<strong class="state-down">down</strong>` : tube.single > 0 ? html`<strong class="state-single">single</strong>` : html`<span class="lighter">dark</span>`;
  return html`<details class="cut-tube" ?open=${tube.first}><summary>${chip(tube.color, tube.tube, "tube")} ${state}
      <span class="lighter">${tube.priority === null ? `${tube.fibers.length} fibers, none carries a working circuit` : `first priority ${tube.priority}; ${tube.down} down, ${tube.single} single of ${tube.fibers.length} fibers`}</span></summary>
    <table><thead><tr><th>Fiber</th><th class="right">Pr.</th><th>State</th><th>Carries</th><th class="tick">to ${from}</th><th class="tick">to ${to}</th></tr></thead>
      <tbody>${tube.fibers.map((fiber) => html`<tr><td>${chip(fiber.fiber_color, fiber.fiber, "fiber")}</td><td class="right">${fiber.priority ?? nothing}</td>
        <td>${stateOf(fiber.state)}</td>
        <td>${carried(fiber.carries)}</td><td class="tick"><span class="box"></span></td><td class="tick"><span class="box"></span></td></tr>`)}</tbody></table></details>`;
}

/**
 * @param {string} state
 * @returns {unknown} down or single, else what else the fiber is used for
 */
function stateOf(state) {
  if (state === "down" || state === "single") return html`<strong class=${`state-${state}`}>${state}</strong>`;
  return html`<span class="lighter">${useSign(/** @type {FiberUse} */ (state)).words}</span>`;
}

/** Circuits of a fiber that are named; of a splitter's feed there are dozens. */
const NAMED = 3;

/**
 * @param {string[]} circuits
 * @returns {unknown}
 */
function carried(circuits) {
  if (circuits.length === 0) return html`<span class="lighter">nothing</span>`;
  const named = circuits.length > NAMED + 1 ? circuits.slice(0, NAMED) : circuits;
  return html`${named.map((each, index) => html`${index > 0 ? ", " : ""}${link("circuit", each)}`)}${circuits.length > named.length ? ` and ${circuits.length - named.length} more` : ""}`;
}
