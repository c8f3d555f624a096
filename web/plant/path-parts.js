import { html, nothing } from "lit";
import { figure } from "../basis/index.js";
import { fact } from "./parts.js";
import { hopList } from "./hops.js";

/** @typedef {import("../server/contract.d.ts").Path} Path */

/** A basis for sums. */
const sum = (/** @type {string} */ source) => ({ how: "sum", source });

/**
 * The paths that a question has, one of them chosen.
 * @param {Path[]} paths
 * @param {number} chosen
 * @param {(index: number) => void} choose
 * @returns {unknown}
 */
export function pathChooser(paths, chosen, choose) {
  if (paths.length < 2) return nothing;
  return html`<p class="chooser"><label>Path <select @change=${(/** @type {Event} */ event) => choose(Number(/** @type {HTMLSelectElement} */ (event.target).value))}>
    ${paths.map((path, index) => html`<option value=${index} ?selected=${index === chosen}>${index + 1}: ${endsText(path)}${path.circuit ? ` (${path.circuit})` : ""}</option>`)}
  </select></label> <span class="lighter">of ${paths.length}</span></p>`;
}

/**
 * @param {Path} path
 * @returns {string}
 */
export function endsText(path) {
  return path.loop ? "a circle, without ends" : path.ends.join(" to ");
}

/**
 * A path's sums and its hops.
 * @param {Path} path
 * @returns {unknown}
 */
export function pathParts(path) {
  const { totals } = path;
  const reckoned = totals.unmeasured > 0 ? `${totals.unmeasured} of its joints at planning values` : "every joint measured";
  return html`${path.complete ? nothing : html`<p class="warning">${path.loop ? "The glass runs in a circle." : `The glass does not reach both ends: it stops at ${path.ends.join(" and ")}.`}</p>`}
    <dl class="facts">
      ${fact("Ends", endsText(path))}
      ${fact("Glass", figure("Glass of the path", "length", totals.glass_m, sum("Every fiber and jumper of the path, tray glass in")))}
      ${fact("Sheath", figure("Sheath along the path", "length", totals.sheath_m, sum("Cables alone")))}
      ${fact("Route", figure("Route along the path", "length", totals.route_m, sum("Spans walked")))}
      ${fact(`Loss at ${path.wavelength_nm} nm`, html`${figure(`Expected loss at ${path.wavelength_nm} nm`, "loss", totals.loss_db, sum(`Expected values, ${reckoned}`))}
        <span class="lighter">expected,</span> ${figure(`Limit loss at ${path.wavelength_nm} nm`, "loss", totals.loss_limit_db, sum("Limit values where not measured"))} <span class="lighter">at the limits,</span>
        ${figure(`Statistical loss at ${path.wavelength_nm} nm`, "loss", totals.loss_statistical_db, sum("Expected and three standard deviations"))} <span class="lighter">statistical</span>`)}
      ${fact("Budget", budgetLine(path))}
      ${fact("Joints", html`${several(totals.splices, "splice")}, ${several(totals.connectors, "connector pair")}${totals.splitters > 0 ? html`, ${several(totals.splitters, "splitter")}` : nothing};
        <span class="lighter">${totals.unverified === 0 ? "all verified" : `${totals.unverified} not verified`}</span>`)}
      ${fact("Dispersion", dispersionLine(path))}
    </dl>
    <h2>Hop by hop</h2>${hopList(path)}`;
}

/**
 * @param {number} number
 * @param {string} thing
 * @returns {unknown}
 */
function several(number, thing) {
  return html`${figure(`How many ${thing}s the path has`, "count", number, { how: "counted", source: "Elements of the path" })} ${thing}${number === 1 ? "" : "s"}`;
}

/**
 * @param {Path} path
 * @returns {unknown}
 */
function budgetLine(path) {
  const { budget } = path;
  if (budget === null) return null;
  const source = budget.source ?? (budget.class ? `Class ${budget.class}` : "The circuit's own budget");
  const left = figure("Left of the budget", "loss", budget.left_db, sum(`${source}: ${budget.max_db} dB less ${budget.margin_db} dB margin, less the expected loss`));
  const verdict = budget.overload ? "too little loss for the receiver" : budget.passes ? "left" : "over";
  return html`${left} ${verdict} <span class="lighter">of</span> ${figure("Budget of the path", "loss", budget.max_db, { how: "recorded", source })}${budget.class ? ` (${budget.class})` : ""}${budget.passes && !budget.passes_at_limit ? html`, <span class="lighter">over at the limits</span>` : nothing}`;
}

/**
 * @param {Path} path
 * @returns {unknown}
 */
function dispersionLine(path) {
  const { dispersion_ps_per_nm: chromatic, pmd_ps: pmd } = path.totals;
  if (chromatic === null) return html`<span class="not-known">not known</span>`;
  const basis = { how: "type", source: "The fiber types' zero-dispersion wavelength, slope and PMD coefficient" };
  return html`${figure(`Chromatic dispersion at ${path.wavelength_nm} nm`, "dispersion", chromatic, basis)}${pmd === null ? nothing : html`, <span class="lighter">PMD</span> ${figure("Polarization mode dispersion", "delay", pmd, basis)}`}`;
}
