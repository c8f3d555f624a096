import { LitElement, html, nothing } from "lit";
import { figure } from "../basis/index.js";
import { hrefTo, link } from "../address/index.js";
import { timeInWords } from "../quantity/index.js";

/** @typedef {import("../server/contract.d.ts").Status} Status */

/** What the records hold, and where to begin. */
export class StartView extends LitElement {
  /** @override */
  static properties = { status: { attribute: false } };

  constructor() {
    super();
    /** @type {Status | null} */
    this.status = null;
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  /** @override */
  render() {
    const { status } = this;
    if (status === null) return nothing;
    const { counts, posting } = status;
    const empty = counts.structures === 0;
    return html`<header class="heading"><p class="what">records of</p><h1>${status.owner ?? "an unnamed owner"}</h1></header>
      ${empty ? html`<p>These records are empty. Load a records folder with <code>load FOLDER --records FILE</code>.</p>` : this.begin()}
      <table class="counts"><caption>The records hold</caption><tbody>
        ${Object.entries(counts).filter(([name]) => name !== "postings").map(([name, value]) => html`<tr><th scope="row">${name.replaceAll("_", " ")}</th><td class="right">${figure(name.replaceAll("_", " "), "count", value, { how: "counted" })}</td></tr>`)}
      </tbody></table>
      ${posting === null ? nothing : html`<p class="changed">Last posting: ${link("posting", String(posting.posting), `posting ${posting.posting}`)}, ${posting.by},
        ${timeInWords(posting.time, status.time_zone)}: ${posting.reason}. <a href=${hrefTo("postings")}>All postings</a></p>`}`;
  }

  /** @returns {unknown} */
  begin() {
    return html`<p>Type in <strong>Find</strong> (<kbd>/</kbd>): a code, a fiber such as <code>FDR-S-1:25</code>, a port, a street, a circuit, a customer, a sheath mark with its cable, a coordinate.
      Or open a structure on the map, or <a href=${hrefTo("circuits")}>the circuits by code</a>. <kbd>?</kbd> lists the keys.</p>`;
  }
}

customElements.define("sw-start", StartView);
