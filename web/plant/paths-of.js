import { html, nothing } from "lit";
import { pathChooser, pathParts } from "./path-parts.js";

/** @typedef {import("../server/contract.d.ts").Path} Path */

/**
 * The paths that the shell traced for a view, one of them chosen.
 * @param {HTMLElement} host sends the choice on
 * @param {Path[] | null} paths null while they are traced
 * @param {number} chosen
 * @returns {unknown}
 */
export function pathsOf(host, paths, chosen) {
  if (paths === null) return nothing;
  if (paths.length === 0) return html`<p class="warning">No glass is joined here.</p>`;
  const choose = (/** @type {number} */ index) => host.dispatchEvent(new CustomEvent("sw-path", { bubbles: true, detail: index }));
  const path = paths[chosen] ?? paths[0];
  return html`${pathChooser(paths, chosen, choose)}${path ? pathParts(path) : nothing}`;
}
