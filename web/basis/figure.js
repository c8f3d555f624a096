import { html } from "lit";
import { length, loss, count, units } from "../quantity/index.js";
import { basisLook } from "./basis.js";

/** @typedef {import("./basis.js").Basis} Basis */

/**
 * @typedef {object} Figure a number on the screen, and how it is known
 * @property {string} what the number is, e.g. `Sheath of FDR-S-1`
 * @property {"length" | "loss" | "count"} kind
 * @property {number} value metres, dB, or how many
 * @property {Basis} basis
 */

/**
 * How a figure reads at present.
 * @param {Figure} figure
 * @returns {import("../quantity/format.js").Reading}
 */
export function readingOf(figure) {
  if (figure.kind === "length") return length(figure.value, units.unit);
  return figure.kind === "loss" ? loss(figure.value) : count(figure.value);
}

/**
 * A number that opens its basis by click or key.
 * @param {string} what
 * @param {"length" | "loss" | "count"} kind
 * @param {number | null | undefined} value null: not known
 * @param {Basis} basis
 * @returns {unknown}
 */
export function figure(what, kind, value, basis) {
  if (value === null || value === undefined) return html`<span class="not-known">not known</span>`;
  /** @type {Figure} */
  const shown = { what, kind, value, basis };
  const reading = readingOf(shown);
  return html`<button type="button" class=${`figure ${basisLook(basis.how)}`} title="How do you know?"
    @click=${(/** @type {Event} */ event) => openBasis(event, shown)}
    ><span class="number">${reading.number}</span>${reading.unit ? html`<span class="unit"> ${reading.unit}</span>` : ""}</button>`;
}

/**
 * @param {Event} event
 * @param {Figure} shown
 */
function openBasis(event, shown) {
  event.stopPropagation();
  const button = /** @type {HTMLElement} */ (event.currentTarget);
  button.dispatchEvent(new CustomEvent("sw-basis", { bubbles: true, composed: true, detail: { figure: shown, from: button } }));
}
