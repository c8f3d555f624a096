import { LitElement, html, nothing } from "lit";
import { currentAddress } from "../address/index.js";
import { Problem, send } from "../server/index.js";
import { daysOn } from "./times.js";

/** @typedef {import("../server/contract.d.ts").LightOffer} LightOffer */
/** @typedef {import("../server/contract.d.ts").RowChange} RowChange */

/** A temporary path is meant for so many days unless another day is said. */
const USUAL_DAYS = 7;

/** One temporary path on its way into the records: what will be joined is shown, who and why and until when is asked. */
export class PostLight extends LitElement {
  /** @override */
  static properties = { offer: { attribute: false }, circuits: { attribute: false }, since: { attribute: false }, opened: { state: true }, problem: { state: true }, posted: { state: true } };

  constructor() {
    super();
    /** @type {LightOffer | null} */
    this.offer = null;
    /** @type {string[]} whose light it is */
    this.circuits = [];
    /** @type {number} the posting that the offer rests on */
    this.since = 0;
    this.opened = false;
    this.problem = "";
    /** @type {number} its posting, 0 until it is posted */
    this.posted = 0;
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  async open() {
    this.opened = true;
    await this.updateComplete;
    /** @type {HTMLElement | null} */ (this.querySelector("input"))?.focus();
  }

  async close() {
    this.opened = false;
    this.problem = "";
    await this.updateComplete;
    /** @type {HTMLElement | null} */ (this.querySelector("button"))?.focus();
  }

  /** @param {SubmitEvent} event */
  async submitted(event) {
    event.preventDefault();
    const data = new FormData(/** @type {HTMLFormElement} */ (event.target));
    const of = (/** @type {string} */ name) => String(data.get(name) ?? "").trim();
    const changes = (this.offer?.changes ?? []).map((each) => until(each, of("until")));
    try {
      const { posting } = await send("/postings", { by: of("by"), reason: of("reason"), unchanged_since: this.since, changes });
      this.posted = posting;
      this.dispatchEvent(new CustomEvent("sw-posted", { bubbles: true, detail: posting }));
    } catch (cause) {
      this.problem = cause instanceof Problem ? cause.message : String(cause);
    }
    await this.updateComplete;
    /** @type {HTMLElement | null} */ (this.querySelector(".posted, .problem"))?.focus();
  }

  /** @override */
  render() {
    if (this.offer === null) return nothing;
    const { asOf, asIf } = currentAddress();
    if (asOf || asIf) return html`<p class="lighter">It can be posted from the records as they are now only.</p>`;
    if (this.posted > 0) return html`<p class="posted" role="status" tabindex="-1">Posted as posting ${this.posted}. Its joints are listed under <em>Incident</em> until they are undone.</p>`;
    if (!this.opened) return html`<p class="act"><button type="button" @click=${this.open}>Post this path</button></p>`;
    return this.form(this.offer);
  }

  /** @param {LightOffer} offer @returns {unknown} */
  form(offer) {
    const apart = offer.changes.filter((each) => each.action === "remove");
    const named = this.circuits.length > 3 ? `${this.circuits.slice(0, 2).join(", ")} and ${this.circuits.length - 2} more` : this.circuits.join(", ");
    return html`<form class="desk-form post-light" @submit=${this.submitted} @keydown=${(/** @type {KeyboardEvent} */ event) => event.key === "Escape" && void this.close()}>
      <p><strong>Into the records:</strong> ${offer.joints.length} temporary ${offer.joints.length === 1 ? "joint" : "joints"}${offer.moves.length > 0 ? html`, ${offer.moves.length} ${offer.moves.length === 1 ? "circuit" : "circuits"} on other ports` : nothing}${apart.length > 0 ? html`, ${apart.length} ${apart.length === 1 ? "joint" : "joints"} taken apart first` : nothing}.</p>
      <ul class="plain">${apart.map((each) => html`<li><strong>apart</strong> ${Object.values(each.key ?? {}).join(" ")}</li>`)}
        ${offer.joints.map((each) => html`<li><strong>join</strong> ${each.a} = ${each.b} <span class="lighter">${each.kind} in ${each.enclosure}</span></li>`)}
        ${offer.moves.slice(0, 4).map((each) => html`<li><strong>move</strong> ${each.circuit} <span class="lighter">to</span> ${each.a}, ${each.z}</li>`)}${offer.moves.length > 4 ? html`<li class="lighter">and ${offer.moves.length - 4} more on the same path</li>` : nothing}</ul>
      <div class="field-row"><label class="plain-field">Your name <input name="by" required maxlength="200" autocomplete="name"></label>
        <label class="plain-field">Last day <input name="until" type="date" required .value=${daysOn(Date.now(), USUAL_DAYS)}></label></div>
      <label class="plain-field wide">Why <input name="reason" required maxlength="2000" autocomplete="off" .value=${`Light another way for ${named}`}></label>
      ${this.problem ? html`<p class="problem" role="alert" tabindex="-1">${this.problem}</p>` : nothing}
      <p class="act"><button type="submit" class="main">Post</button> <button type="button" @click=${this.close}>Not now</button></p></form>`;
  }
}

/**
 * A change of an offer with the last day on what it joins.
 * @param {RowChange} change
 * @param {string} day
 * @returns {RowChange}
 */
export function until(change, day) {
  return change.action === "add" ? { ...change, row: { ...change.row, temporary_until: day } } : change;
}

customElements.define("sw-post-light", PostLight);
