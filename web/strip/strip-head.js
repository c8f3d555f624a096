import { html, nothing } from "lit";
import { figure } from "../basis/index.js";
import { link } from "../address/index.js";

/** @typedef {import("../server/contract.d.ts").Path} Path */
/** @typedef {import("./strip-view.js").StripView} StripView */
/** @typedef {import("../path/track.js").Measure} Measure */

/** @type {readonly Measure[]} */
const MEASURES = ["glass", "sheath", "route"];

/**
 * The strip's first line: whose path, its sums, and how it is drawn.
 * @param {StripView} strip
 * @param {Path} path
 * @returns {unknown}
 */
export function stripHead(strip, path) {
  const { totals } = path;
  return html`<header class="strip-head">
    <h2>${path.circuit ? link("circuit", path.circuit) : "Path"} <span class="strip-ends">${path.ends.length > 0 ? path.ends.join(" to ") : "a circle"}${path.complete ? "" : ", not complete"}</span></h2>
    <span class="strip-sums">${figure("Glass of the path", "length", totals.glass_m, { how: "sum", source: "Every fiber and jumper of the path, tray glass in" })} <span class="lighter">glass</span>
      ${strip.paths.map((each) => html`${figure(`Expected loss at ${each.wavelength_nm} nm`, "loss", each.totals.loss_db, { how: "sum", source: "Expected values over the path" })} <span class="lighter">at ${each.wavelength_nm}</span> `)}</span>
    ${strip.folded ? nothing : controls(strip)}
    <button type="button" aria-expanded=${!strip.folded} @click=${() => strip.dispatchEvent(new CustomEvent("sw-fold", { bubbles: true }))}>${strip.folded ? "Unfold" : "Fold"}</button>
  </header>`;
}

/**
 * @param {StripView} strip
 * @returns {unknown}
 */
function controls(strip) {
  const send = (/** @type {string} */ name, /** @type {unknown} */ detail) => strip.dispatchEvent(new CustomEvent(name, { bubbles: true, detail }));
  return html`<fieldset class="choice"><legend><span class="unseen">Wavelengths, </span>nm</legend>${strip.offered.map((nm) => html`<label><input type="checkbox" .checked=${strip.chosen.includes(nm)}
      @change=${() => send("sw-wavelength", nm)}><span>${nm}</span></label>`)}</fieldset>
    <fieldset class="choice"><legend><span class="unseen">Distance </span>in</legend>${MEASURES.map((measure) => html`<label><input type="radio" name="measure" .checked=${strip.measure === measure}
      @change=${() => send("sw-measure", measure)}><span>${measure}</span></label>`)}</fieldset>
    <span class="strip-zoom"><button type="button" @click=${() => strip.zoom(0.5)}>Closer</button><button type="button" @click=${() => strip.zoom(2)}>Farther</button><button
      type="button" ?disabled=${strip.stretch === null} @click=${() => (strip.stretch = null)}>Whole</button></span>`;
}
