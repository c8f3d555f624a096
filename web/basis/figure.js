import { html } from "lit";
import { count, decimal, length, loss, units } from "../quantity/index.js";
import { basisLook } from "./basis.js";

/** @typedef {import("./basis.js").Basis} Basis */
/** @typedef {import("../quantity/format.js").Reading} Reading */

/** @typedef {"length" | "loss" | "count" | "percent" | "dispersion" | "delay"} Kind metres, dB, how many, per cent, ps/nm, ps */

/** How each kind reads. @type {Readonly<Record<Kind, (value: number) => Reading>>} */
const READINGS = Object.freeze({
  length: (value) => length(value, units.unit),
  loss,
  count: (value) => count(value),
  percent: (value) => ({ number: decimal(value, 2), unit: "%" }),
  dispersion: (value) => ({ number: decimal(value, 1), unit: "ps/nm" }),
  delay: (value) => ({ number: decimal(value, 2), unit: "ps" }),
});

/**
 * @typedef {object} Figure a number on the screen, and how it is known
 * @property {string} what the number is, e.g. `Sheath of FDR-S-1`
 * @property {Kind} kind
 * @property {number} value in the kind's unit
 * @property {Basis} basis
 */

/**
 * How a figure reads at present.
 * @param {Figure} figure
 * @returns {Reading}
 */
export function readingOf(figure) {
  return READINGS[figure.kind](figure.value);
}

/**
 * A number that opens its basis by click or key.
 * @param {string} what
 * @param {Kind} kind
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
 * Opens the basis of a number that was clicked or pressed.
 * @param {Event} event on the number
 * @param {Figure} shown
 */
export function openBasis(event, shown) {
  event.stopPropagation();
  const from = /** @type {Element} */ (event.currentTarget);
  from.dispatchEvent(new CustomEvent("sw-basis", { bubbles: true, composed: true, detail: { figure: shown, from } }));
}
