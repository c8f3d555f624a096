import { LitElement, html, nothing } from "lit";
import { ask } from "../server/index.js";
import { UnitController } from "../quantity/index.js";
import { link } from "../address/index.js";
import { figure } from "../basis/index.js";
import { cutInWords, readCut, thingOf, writeCut } from "./cuts.js";
import { cutList } from "./cut-list.js";
import { printLinks } from "./print-links.js";
import { unlike } from "./unlike.js";

/** @typedef {import("../server/contract.d.ts").ImpactAnswer} ImpactAnswer */
/** @typedef {import("../server/contract.d.ts").FindAnswer} FindAnswer */
/** @typedef {import("../server/contract.d.ts").FindResult} FindResult */
/** @typedef {import("./cuts.js").Cut} Cut */
/** @typedef {import("./cuts.js").CutKind} CutKind */

/** Rows shown before more are asked for. */
const FIRST = 60;

/** Kinds that can be cut, as Find names them. */
const KINDS = ["span", "structure", "cable", "enclosure"];

/** If this is cut, who is down: what is taken as cut, the circuits in the order to restore, every fiber of the sheath. */
export class WhoIsDown extends LitElement {
  /** @override */
  static properties = { cuts: { attribute: false, hasChanged: unlike }, answer: { attribute: false }, rows: { state: true }, wrong: { state: true } };

  constructor() {
    super();
    /** @type {Cut[]} */
    this.cuts = [];
    /** @type {ImpactAnswer | null} */
    this.answer = null;
    this.rows = FIRST;
    this.wrong = "";
    new UnitController(this);
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  /** @param {import("lit").PropertyValues} changed @override */
  willUpdate(changed) {
    if (changed.has("cuts")) this.rows = FIRST;
  }

  /** @param {Cut[]} cuts */
  cut(cuts) {
    this.dispatchEvent(new CustomEvent("sw-cuts", { bubbles: true, detail: cuts }));
  }

  /** @param {SubmitEvent} event */
  async submitted(event) {
    event.preventDefault();
    const field = /** @type {import("../find/index.js").FindField} */ (this.querySelector("sw-find-field"));
    const typed = field.box()?.value.trim() ?? "";
    const cut = await this.meant(typed);
    this.wrong = cut ? "" : typed === "" ? "A span, structure, cable or enclosure, or a tube such as FDR-S-1/3." : `The records have no span, structure, cable or enclosure ${typed}.`;
    if (!cut) return;
    const box = field.box();
    if (box) box.value = "";
    this.cut([...this.cuts.filter((each) => each.code !== cut.code || each.kind !== cut.kind), cut]);
  }

  /**
   * What is meant by what was typed: a tube, a cut written out, or a thing that Find knows by that code.
   * @param {string} typed
   * @returns {Promise<Cut | null>}
   */
  async meant(typed) {
    const written = readCut(typed);
    if (written) return written;
    if (/^[^/]+\/\d+$/.test(typed)) return { kind: "tube", code: typed };
    if (typed === "") return null;
    /** @type {FindAnswer} */
    const found = await ask("/find", { q: typed, limit: 50 });
    const exact = found.results.find((each) => KINDS.includes(each.kind) && each.label === typed);
    return exact ? { kind: /** @type {CutKind} */ (exact.kind), code: exact.label } : null;
  }

  /** @override */
  render() {
    return html`<form class="desk-form" @submit=${this.submitted} novalidate><div class="field-row">
        <sw-find-field .name=${"cut"} .label=${"Take as cut"} .kinds=${KINDS} .hint=${"span, structure, cable, enclosure, FDR-S-1/3"} .wrong=${this.wrong}></sw-find-field>
        <button type="submit">Add</button></div></form>
      ${this.cuts.length === 0 ? html`<p class="lighter">Nothing is taken as cut yet. Name it here, or come from a suspect, a fault place, or a thing that is open in the records.</p>` : this.taken()}
      ${this.answer === null || this.cuts.length === 0 ? nothing : this.result(this.answer)}`;
  }

  /** @returns {unknown} */
  taken() {
    return html`<ul class="plain cuts" aria-label="Taken as cut">${this.cuts.map((cut) => {
      const { view, code } = thingOf(cut);
      return html`<li><strong class="state-down">CUT</strong> ${cutInWords(cut)} ${link(view, code, "open")} <button type="button" @click=${() => this.cut(this.cuts.filter((each) => each !== cut))}>Take out<span class="unseen"> ${cutInWords(cut)}</span></button></li>`;
    })}</ul>`;
  }

  /** @param {ImpactAnswer} it @returns {unknown} */
  result(it) {
    const down = it.circuits.filter((each) => each.state === "down").length;
    const source = `Working circuits whose path the cut hits, as of posting ${it.posting}`;
    const basis = { how: "counted", source };
    return html`<p class="sum">${figure("Customers down", "count", it.customers_down, { ...basis, source: `${source}; of a protection group the largest counts once` })} <span class="sum-word">customers down</span></p>
      <p>${figure("Circuits down", "count", down, basis)} circuits <strong class="state-down">down</strong>,
        ${figure("Circuits left single", "count", it.circuits.length - down, basis)} left <strong class="state-single">single</strong>: they work, unprotected.
        ${figure("Fibers cut", "count", it.fibers_cut, { how: "counted", source: "Fibers of the cut cables, lit or dark, each once" })} fibers cut.</p>
      ${printLinks("The cut list", "cut-list", this.cuts.map((cut) => ["cut", writeCut(cut)]))}
      ${this.byPriority(it)}${this.circuits(it)}${cutList(it)}`;
  }

  /** @param {ImpactAnswer} it @returns {unknown} */
  byPriority(it) {
    const priorities = [...new Set(it.circuits.map((each) => each.priority))].sort((one, other) => one - other);
    if (priorities.length === 0) return nothing;
    const count = (/** @type {number} */ priority, /** @type {string} */ state) => it.circuits.filter((each) => each.priority === priority && each.state === state);
    return html`<table class="by-priority"><caption>By restoration priority</caption><thead><tr><th>Priority</th><th class="right">Down</th><th class="right">Single</th><th class="right">Customers down</th></tr></thead>
      <tbody>${priorities.map((priority) => html`<tr><th scope="row">${priority}</th><td class="right">${count(priority, "down").length}</td><td class="right">${count(priority, "single").length}</td>
        <td class="right">${count(priority, "down").reduce((sum, each) => sum + each.customers_served, 0)}</td></tr>`)}</tbody></table>`;
  }

  /** @param {ImpactAnswer} it @returns {unknown} */
  circuits(it) {
    const rest = it.circuits.length - this.rows;
    return html`<h2>In the order to restore</h2>
      <table class="restore"><thead><tr><th class="right">Pr.</th><th>State</th><th>Circuit</th><th class="right">Customers</th><th>Cut at</th></tr></thead>
        <tbody>${it.circuits.slice(0, this.rows).map((each) => html`<tr><td class="right">${each.priority}</td><td><strong class=${`state-${each.state}`}>${each.state}</strong></td>
          <td>${link("circuit", each.circuit)}${said(each)}</td><td class="right">${each.customers_served}</td><td class="ends">${each.at.join(", ")}</td></tr>`)}</tbody></table>
      ${rest > 0 ? html`<p><button type="button" @click=${() => (this.rows = Infinity)}>Show the other ${rest}</button></p>` : nothing}`;
  }
}

/**
 * @param {ImpactAnswer["circuits"][number]} circuit
 * @returns {unknown} its service and customer, where the answer has them
 */
function said(circuit) {
  const words = [circuit.service, circuit.customer].filter(Boolean).join(", ");
  return words ? html`<br><span class="lighter">${words}</span>` : nothing;
}

customElements.define("sw-who-is-down", WhoIsDown);
