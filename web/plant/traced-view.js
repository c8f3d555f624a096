import { LitElement, html, nothing } from "lit";
import { UnitController } from "../quantity/index.js";
import { heading } from "./parts.js";
import { pathChooser, pathParts } from "./path-parts.js";

/** @typedef {import("../server/contract.d.ts").Path} Path */

/** A fiber or a port: the paths that the shell traced for it. */
export class TracedView extends LitElement {
  /** @override */
  static properties = { code: { attribute: false }, what: { attribute: false }, paths: { attribute: false }, chosen: { attribute: false } };

  constructor() {
    super();
    /** @type {string} */
    this.code = "";
    /** @type {string} `fiber` or `port` */
    this.what = "";
    /** @type {Path[] | null} null while they are traced */
    this.paths = null;
    /** @type {number} */
    this.chosen = 0;
    new UnitController(this);
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  /** @override */
  render() {
    return html`${heading(this.what, this.code)}${pathsParts(this, this.paths, this.chosen)}`;
  }
}

/**
 * The chooser and the chosen path.
 * @param {HTMLElement} host sends the choice on
 * @param {Path[] | null} paths
 * @param {number} chosen
 * @returns {unknown}
 */
export function pathsParts(host, paths, chosen) {
  if (paths === null) return nothing;
  if (paths.length === 0) return html`<p class="warning">No glass is joined here.</p>`;
  const choose = (/** @type {number} */ index) => host.dispatchEvent(new CustomEvent("sw-path", { bubbles: true, detail: index }));
  const path = paths[chosen] ?? paths[0];
  return html`${pathChooser(paths, chosen, choose)}${path ? pathParts(path) : nothing}`;
}

customElements.define("sw-traced", TracedView);
