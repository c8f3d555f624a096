import { html } from "lit";
import { hrefTo } from "./address.js";

/** @typedef {import('./address.js').View} View */

/**
 * A link that opens a thing of the records.
 * @param {View} view
 * @param {string | null | undefined} code null: nothing is drawn
 * @param {string} [text] what to read; default the code
 * @returns {unknown}
 */
export function link(view, code, text) {
  return code === null || code === undefined ? "" : html`<a class="code" href=${hrefTo(view, code)}>${text ?? code}</a>`;
}
