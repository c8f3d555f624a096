import { LitElement, html, nothing } from "lit";
import { Asking, Problem, ask, askAnytime, send, waiting } from "../server/index.js";
import { timeInWords } from "../quantity/index.js";
import { beginForm, entryForm } from "./incident-forms.js";
import { incidentSheet } from "./incident-view.js";
import "./repair-part.js";
import "./temporary-part.js";

/** @typedef {import("../server/contract.d.ts").Incident} Incident */
/** @typedef {import("../server/contract.d.ts").IncidentList} IncidentList */
/** @typedef {import("../server/contract.d.ts").TemporaryList} TemporaryList */

/** What is at hand when an incident begins. */
/** @typedef {{ cuts: string[], down: string[], up: string[], reading: string }} Hand */

/** @typedef {{ incident: Incident | null, list: IncidentList | null, temporary: TemporaryList | null }} Known */

/** An incident is counted anew so often while it is open on the screen, ms. */
const AGAIN_MS = 60_000;

/** The incidents: the one that is open with its clock, log and counts, or the list and a form to begin one. */
export class IncidentPart extends LitElement {
  /** @override */
  static properties = { number: { attribute: false }, hand: { attribute: false }, zone: { attribute: false }, stamp: { attribute: false }, problem: { state: true } };

  constructor() {
    super();
    /** @type {string} its number; empty for the list */
    this.number = "";
    /** @type {Hand} */
    this.hand = { cuts: [], down: [], up: [], reading: "" };
    this.zone = "UTC";
    this.stamp = "";
    /** @type {Problem | null} what was wrong with what was sent last */
    this.problem = null;
    /** @type {Asking<Known>} */
    this.asking = new Asking(this);
    this.timer = 0;
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  /** @override */
  connectedCallback() {
    super.connectedCallback();
    this.timer = window.setInterval(() => this.number && !this.asking.pending && this.read(), AGAIN_MS);
  }

  /** @override */
  disconnectedCallback() {
    super.disconnectedCallback();
    window.clearInterval(this.timer);
  }

  /** @param {import("lit").PropertyValues} changed @override */
  willUpdate(changed) {
    if (changed.has("number") || changed.has("stamp")) {
      if (changed.has("number")) this.problem = null;
      void this.read();
    }
  }

  /** @returns {Promise<void>} */
  read() {
    const { number } = this;
    return this.asking.run(async (signal) => {
      if (number) {
        const [incident, temporary] = await Promise.all([askAnytime(`/incidents/${number}`, {}, signal), ask("/temporary", {}, signal)]);
        return { incident, list: null, temporary };
      }
      const [list, temporary] = await Promise.all([askAnytime("/incidents", {}, signal), ask("/temporary", {}, signal)]);
      return { incident: null, list, temporary };
    });
  }

  /**
   * Has something noted, then reads anew.
   * @param {string} path
   * @param {object} body
   * @returns {Promise<Incident | null>} null where it was refused
   */
  async note(path, body) {
    try {
      const incident = await send(path, body);
      this.problem = null;
      await this.read();
      return incident;
    } catch (cause) {
      this.problem = cause instanceof Problem ? cause : new Problem("internal", String(cause));
      return null;
    }
  }

  /** @param {SubmitEvent} event @param {object} body */
  async begin(event, body) {
    event.preventDefault();
    const incident = await this.note("/incidents", body);
    if (incident) this.dispatchEvent(new CustomEvent("sw-incident", { bubbles: true, detail: String(incident.incident) }));
  }

  /** @param {SubmitEvent} event @param {object} body */
  async write(event, body) {
    event.preventDefault();
    const form = /** @type {HTMLFormElement} */ (event.target);
    if (await this.note(`/incidents/${this.number}/entries`, body)) /** @type {HTMLTextAreaElement | null} */ (form.querySelector("[name=text]"))?.form?.reset();
  }

  /** @override */
  render() {
    const known = this.asking.answer;
    const said = this.problem ? html`<p class="problem" role="alert">${this.problem.message}</p>` : nothing;
    if (known?.incident && this.number) return html`${said}${waiting(this.asking)}${incidentSheet(known.incident, this.zone)}${entryForm(this, known.incident)}${this.repair(known.incident)}${this.temporary(known.temporary)}`;
    if (known?.list && !this.number) return html`${said}${this.incidents(known.list)}${beginForm(this)}${this.temporary(known.temporary)}`;
    return html`${said}${waiting(this.asking)}`;
  }

  /** @param {Incident} incident @returns {unknown} */
  repair({ incident, title }) {
    const span = this.hand.cuts.find((cut) => cut.startsWith("span:"))?.slice("span:".length) ?? "";
    return html`<sw-repair .incident=${String(incident)} .called=${title} .span=${span} .zone=${this.zone} @sw-posted=${() => this.read()}></sw-repair>`;
  }

  /** @param {TemporaryList | null} list @returns {unknown} */
  temporary(list) {
    return html`<sw-temporary .list=${list} @sw-posted=${() => this.read()}></sw-temporary>`;
  }

  /** @param {IncidentList} list @returns {unknown} */
  incidents({ incidents }) {
    if (incidents.length === 0) return html`<p class="lighter">No incident has been begun in these records.</p>`;
    return html`<table><thead><tr><th class="right">No.</th><th>Incident</th><th>Began</th><th class="right">Down now</th></tr></thead><tbody>${incidents.map((each) => html`<tr>
      <td class="right">${each.incident}</td><td><button type="button" @click=${() => this.dispatchEvent(new CustomEvent("sw-incident", { bubbles: true, detail: String(each.incident) }))}>${each.title}</button>
        ${each.open ? html`<strong class="state-down">open</strong>` : html`<span class="lighter">closed</span>`}</td>
      <td>${timeInWords(each.began_at, this.zone)}</td><td class="right">${each.circuits_down} circuits, ${each.customers_down} customers</td></tr>`)}</tbody></table>`;
  }
}

customElements.define("sw-incident", IncidentPart);
