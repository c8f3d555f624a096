import { LitElement, html, nothing } from "lit";
import { currentAddress, formatAddress } from "../address/index.js";
import { timeInWords } from "../quantity/index.js";

/** @typedef {import("../server/contract.d.ts").Status} Status */

/** Which records answer: as posted, as of a posting or time, as if a job were built. Always in sight. */
export class AsOf extends LitElement {
  /** @override */
  static properties = { status: { attribute: false }, asOf: { attribute: false }, asIf: { attribute: false }, open: { state: true } };

  constructor() {
    super();
    /** @type {Status | null} */
    this.status = null;
    this.asOf = "";
    this.asIf = "";
    this.open = false;
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  /** @returns {string} */
  said() {
    if (this.asOf || this.asIf) return [this.asOf && `as of ${this.asOf}`, this.asIf && `as if ${this.asIf} were built`].filter(Boolean).join(", ");
    const posting = this.status?.posting;
    return posting ? `as posted, posting ${posting.posting}, ${timeInWords(posting.time, this.status?.time_zone ?? "UTC")}` : "as posted";
  }

  /** @param {SubmitEvent} event */
  submitted(event) {
    event.preventDefault();
    const data = new FormData(/** @type {HTMLFormElement} */ (event.target));
    this.choose(String(data.get("as_of") ?? "").trim(), String(data.get("as_if") ?? ""));
  }

  /** @param {string} asOf @param {string} asIf */
  choose(asOf, asIf) {
    this.open = false;
    location.hash = formatAddress({ ...currentAddress(), asOf, asIf });
    /** @type {HTMLElement | null} */ (this.querySelector("button"))?.focus();
  }

  /** @param {KeyboardEvent} event */
  pressed(event) {
    if (event.key !== "Escape" || !this.open) return;
    event.stopPropagation();
    this.open = false;
    /** @type {HTMLElement | null} */ (this.querySelector("button"))?.focus();
  }

  /** @override */
  render() {
    const elsewhen = this.asOf !== "" || this.asIf !== "";
    return html`<div class=${elsewhen ? "as-of elsewhen" : "as-of"} @keydown=${this.pressed}>
      <button type="button" aria-expanded=${this.open} aria-controls="as-of-choice" @click=${() => (this.open = !this.open)}>Records <strong>${this.said()}</strong></button>
      ${elsewhen ? html`<button type="button" @click=${() => this.choose("", "")}>Back to as posted</button>` : nothing}
      <div id="as-of-choice" class="as-of-choice" ?hidden=${!this.open}>${this.form()}</div></div>`;
  }

  /** @returns {unknown} */
  form() {
    const jobs = this.status?.jobs ?? [];
    return html`<form @submit=${this.submitted}>
      <p><label>As of <input name="as_of" .value=${this.asOf} placeholder="posting number or time" autocomplete="off"></label><br>
        <span class="lighter">A posting's number, or a time: 2026-03-31T14:05. Blank: now.</span></p>
      <p><label>As if built <select name="as_if"><option value="">no planned job</option>${jobs.map((job) => html`<option value=${job} ?selected=${job === this.asIf}>${job}</option>`)}</select></label></p>
      <p><button type="submit">Read these records</button></p></form>`;
  }
}

customElements.define("sw-as-of", AsOf);
