import { LitElement, html, nothing } from "lit";
import { inBoth, readList, replaced } from "./lists.js";

/** @typedef {import("./keeping.js").Lists} Lists */
/** @typedef {import("./known-codes.js").Stranger} Stranger */

/** The form into which the lists of what is down and what is up are pasted, and what is wrong with them. */
export class AlarmLists extends LitElement {
  /** @override */
  static properties = { lists: { attribute: false }, strangers: { attribute: false }, counts: { state: true } };

  constructor() {
    super();
    /** @type {Lists | null} as they were asked last */
    this.lists = null;
    /** @type {Stranger[]} codes that the records do not hold */
    this.strangers = [];
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  /** @param {"down" | "up"} name @returns {HTMLTextAreaElement | null} */
  area(name) {
    return this.querySelector(`#list-${name}`);
  }

  /** @returns {HTMLInputElement | null} */
  opened() {
    return this.querySelector("#list-opened");
  }

  /** @returns {Lists} what stands in the form */
  typed() {
    const byPath = /** @type {HTMLInputElement | null} */ (this.querySelector("#list-by-path"))?.checked ?? false;
    return { down: this.area("down")?.value ?? "", up: this.area("up")?.value ?? "", opened: this.opened()?.value ?? "", byPath, chosen: 0 };
  }

  /** @param {SubmitEvent} event */
  submitted(event) {
    event.preventDefault();
    this.send(this.typed());
  }

  /** @param {Lists} lists */
  send(lists) {
    this.dispatchEvent(new CustomEvent("sw-lists", { bubbles: true, detail: lists }));
  }

  /** @param {string} code @param {string} better empty: it is taken out */
  mend(code, better) {
    const { down, up, ...rest } = this.typed();
    this.send({ ...rest, down: replaced(down, code, better), up: replaced(up, code, better) });
  }

  /** @override */
  render() {
    const { lists } = this;
    if (lists === null) return nothing;
    const [down, up] = [readList(lists.down), readList(lists.up)];
    const both = inBoth(down, up);
    return html`<form class="desk-form" @submit=${this.submitted}>
      <div class="lists">${this.list("down", "Down", lists.down, down)}${this.list("up", "Up", lists.up, up)}</div>
      <div class="list-field"><label for="list-opened">Opened lately</label> <span class="lighter">enclosures that a crew opened, tonight or in the last days</span>
        <input id="list-opened" autocomplete="off" spellcheck="false" placeholder="C-N02" .value=${lists.opened}></div>
      <p><label><input id="list-by-path" type="checkbox" .checked=${lists.byPath}> The alarms are of paths, not of services</label>
        <span class="lighter">Off: a protected circuit that is up proves nothing for its own path.</span></p>
      <p class="act"><button type="submit" class="main">Rank the suspects</button> <button type="button" @click=${() => this.send({ down: "", up: "", opened: "", byPath: false, chosen: 0 })}>Clear</button></p></form>
      ${both.length === 0 ? nothing : html`<p class="problem" role="alert">In both lists, so that one of the two is wrong: ${both.join(", ")}.</p>`}
      ${this.unknown()}`;
  }

  /** @param {"down" | "up"} name @param {string} label @param {string} text @param {import("./lists.js").Listed} read @returns {unknown} */
  list(name, label, text, read) {
    const twice = read.twice.length === 0 ? "" : `, ${read.twice.length} of them listed more than once`;
    return html`<div class="list-field"><label for=${`list-${name}`}>${label}</label>
      <textarea id=${`list-${name}`} rows="4" spellcheck="false" autocomplete="off" placeholder="GOV-01, BIZ-01 ... as pasted" .value=${text} aria-describedby=${`list-${name}-count`}></textarea>
      <p class="lighter" id=${`list-${name}-count`}>${read.codes.length === 0 ? "Codes of circuits, parted by commas, spaces or lines" : `${read.codes.length} circuits read${twice}`}</p></div>`;
  }

  /** @returns {unknown} the codes that the records do not hold, each with the nearest that they do */
  unknown() {
    if (this.strangers.length === 0) return nothing;
    return html`<section class="problem" role="alert"><p>Not in the records, and left out of the ranking until mended:</p>
      <ul class="plain strangers">${this.strangers.map(({ code, nearest }) => html`<li><strong class="code">${code}</strong>
        ${nearest === null ? html`<span class="lighter">nothing is called alike</span>` : html`nearest: <button type="button" @click=${() => this.mend(code, nearest)}>Take ${nearest}<span class="unseen"> for ${code}</span></button>`}
        <button type="button" @click=${() => this.mend(code, "")}>Leave out<span class="unseen"> ${code}</span></button></li>`)}</ul></section>`;
  }
}

customElements.define("sw-alarms", AlarmLists);
