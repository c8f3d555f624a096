import { html, nothing } from "lit";
import { hrefTo, link } from "../address/index.js";
import { dayInWords, parseRange, rangeSize } from "../quantity/index.js";

/** @typedef {import("../server/contract.d.ts").Mark} Mark */

/**
 * The heading of a view: what it is, and its code big.
 * @param {string} what
 * @param {string} code
 * @param {string} [state] of plant; said where it is not in service
 * @returns {unknown}
 */
export function heading(what, code, state = "in service") {
  return html`<header class="heading"><p class="what">${what}${state === "in service" ? "" : html` <strong>${state}</strong>`}</p><h1>${code}</h1></header>`;
}

/**
 * A fact: a term and what is known of it; left out where nothing is.
 * @param {string} term
 * @param {unknown} value
 * @returns {unknown}
 */
export function fact(term, value) {
  if (value === null || value === undefined || value === "") return nothing;
  return html`<dt>${term}</dt><dd>${value}</dd>`;
}

/**
 * The way to the outage desk: who is down if a thing is cut.
 * @param {"span" | "structure" | "enclosure" | "cable" | "tube"} kind
 * @param {string} code a tube's as F-1/3
 * @param {string} [text]
 * @returns {unknown}
 */
export function cutLink(kind, code, text = "Who is down if it is cut") {
  return html`<a href=${hrefTo("outage", "down", [["cut", `${kind}:${code}`]])}>${text}</a>`;
}

/**
 * How sure the records are, in a word and a sign.
 * @param {string | null} trust
 * @param {string | null} [verifiedOn] date
 * @returns {unknown}
 */
export function trustWord(trust, verifiedOn = null) {
  if (trust === null) return html`<span class="lighter">trust not recorded</span>`;
  if (trust === "verified") return html`<span class="trust-verified" title=${verifiedOn ? `verified ${dayInWords(verifiedOn)}` : ""}>✓ verified</span>`;
  if (trust === "unknown") return html`<span class="trust-unknown">? trust unknown</span>`;
  return html`<span class="lighter">${trust}</span>`;
}

/**
 * The sheath marks read at a place.
 * @param {Mark[]} marks
 * @returns {unknown}
 */
export function marksRead(marks) {
  if (marks.length === 0) return html`<span class="lighter">none read</span>`;
  return marks.map((mark) => html`<span class="mark">${markText(mark)}</span> `);
}

/**
 * @param {Mark} mark
 * @returns {string}
 */
function markText(mark) {
  const { mark_in: arrives, mark_out: leaves, unit, ink } = mark;
  const read = arrives === leaves || leaves === null ? `${arrives}` : arrives === null ? `${leaves}` : `${arrives} in, ${leaves} out`;
  return `${read} ${unit} ${ink}${mark.governs ? "" : " (does not govern)"}`;
}

/**
 * Links to a port, or to each of a range of ports: `E1/P/1-2`.
 * @param {string} ports
 * @returns {unknown}
 */
export function portLinks(ports) {
  const at = ports.lastIndexOf("/") + 1;
  const { first, last } = parseRange(ports.slice(at));
  const step = last < first ? -1 : 1;
  const numbers = Array.from({ length: rangeSize({ first, last }) }, (_, index) => first + index * step);
  const name = (/** @type {number} */ number) => `${ports.slice(0, at)}${number}`;
  return listed(numbers.map((number, index) => link("port", name(number), index === 0 ? name(number) : String(number))));
}

/**
 * A comma-parted list with something between.
 * @param {unknown[]} items
 * @returns {unknown}
 */
export function listed(items) {
  return items.map((item, index) => html`${index > 0 ? ", " : ""}${item}`);
}
