import { LitElement, html, nothing } from "lit";
import { Asking, send, waiting } from "../server/index.js";
import { hrefToPart } from "./parts.js";
import { lightView } from "./light-view.js";
import "./post-light.js";
import { readList } from "./lists.js";
import { unlike } from "./unlike.js";

/** @typedef {import("../server/contract.d.ts").LightAnswer} LightAnswer */

/** Temporary paths round what is cut: what may be used is asked here, what is offered and refused is listed. */
export class TemporaryPaths extends LitElement {
  /** @override */
  static properties = { cuts: { attribute: false, hasChanged: unlike }, stamp: { attribute: false }, since: { state: true } };

  constructor() {
    super();
    /** @type {string[]} what is cut, as an address writes it */
    this.cuts = [];
    /** @type {string} from which records */
    this.stamp = "";
    /** @type {Asking<LightAnswer>} */
    this.asking = new Asking(this);
    /** @type {number} the posting that the shares rest on, 0 where none is asked for */
    this.since = 0;
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  /** @param {import("lit").PropertyValues} changed @override */
  willUpdate(changed) {
    if (changed.has("cuts") || changed.has("stamp")) this.asking.forget();
  }

  /** @param {SubmitEvent} event */
  submitted(event) {
    event.preventDefault();
    const data = new FormData(/** @type {HTMLFormElement} */ (event.target));
    const margin = Number(String(data.get("margin") ?? "").trim() || 0);
    const asked = { cuts: this.cuts, from_panels: readList(String(data.get("panels") ?? "")).codes, verified_only: data.get("verified") === "on", margin_db: margin, offers: 2 };
    this.dispatchEvent(new CustomEvent("sw-way", { bubbles: true, detail: null }));
    void this.asking.run((signal) => send("/light", asked, signal)).then(() => (this.since = this.asking.answer?.posting ?? 0));
  }

  /**
   * Shares take no glass from each other, so one that was posted straight after the answer does not spoil the rest.
   * @param {CustomEvent<number>} event
   */
  posted({ detail }) {
    if (detail === this.since + 1) this.since = detail;
  }

  /** @override */
  render() {
    if (this.cuts.length === 0) return html`<p class="lighter">Nothing is taken as cut yet. Name it under <a href=${hrefToPart("down")}>Who is down</a>, then ask for light another way.</p>`;
    return html`<form class="desk-form" @submit=${this.submitted}>
      <div class="field-row"><label class="plain-field">Panels that may feed splitters <input name="panels" autocomplete="off" spellcheck="false" placeholder="HUT-S/OLT"></label>
        <label class="plain-field">Margin kept, dB <input name="margin" inputmode="decimal" autocomplete="off" placeholder="0"></label></div>
      <p><label><input type="checkbox" name="verified" checked> Only glass that was seen and verified</label></p>
      <p class="act"><button type="submit" class="main">Find temporary paths</button></p></form>
      <p class="cautions">Glass that is dark by the records may carry light: meter it at both ends before it is touched. A live tube is left alone.</p>
      ${waiting(this.asking)}${this.asking.answer ? html`<div @sw-posted=${this.posted}>${lightView(this.asking.answer, this.since)}</div>` : nothing}`;
  }
}

customElements.define("sw-light", TemporaryPaths);
