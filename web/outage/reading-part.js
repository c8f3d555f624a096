import { LitElement, html, nothing } from "lit";
import { UnitController } from "../quantity/index.js";
import { faultsOf } from "./reading.js";
import { unlike } from "./unlike.js";

/** @typedef {import("./reading.js").Shot} Shot */
/** @typedef {import("./reading.js").Field} Field */
/** @typedef {import("../server/client.js").Problem} Problem */
/** @typedef {import("../find/index.js").FindField} FindField */

/** Rows for known joints that are always there. */
const ROWS = 2;

/** The form in which a reading of an OTDR is typed. */
export class ReadingForm extends LitElement {
  /** @override */
  static properties = { shot: { attribute: false, hasChanged: unlike }, problem: { attribute: false }, wrong: { state: true }, rows: { state: true }, far: { state: true } };

  constructor() {
    super();
    /** @type {Shot | null} as the address has it */
    this.shot = null;
    /** @type {Problem | null} what the server found wrong with it */
    this.problem = null;
    /** @type {Partial<Record<Field, string>>} what is wrong before it is sent */
    this.wrong = {};
    this.rows = ROWS;
    this.far = false;
    new UnitController(this);
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  /** @param {import("lit").PropertyValues} changed @override */
  willUpdate(changed) {
    if (!changed.has("shot") || this.shot === null) return;
    this.rows = Math.max(ROWS, this.shot.events.length);
    this.far = this.far || this.shot.farPort !== "";
    this.wrong = {};
  }

  /** @param {SubmitEvent} event */
  submitted(event) {
    event.preventDefault();
    const shot = this.typed();
    this.wrong = faultsOf(shot);
    const first = Object.keys(this.wrong)[0];
    if (first === undefined) this.dispatchEvent(new CustomEvent("sw-shot", { bubbles: true, detail: shot }));
    else void this.updateComplete.then(() => /** @type {HTMLElement | null} */ (this.querySelector(`[data-field="${first}"] input`))?.focus());
  }

  /** @returns {Shot} what stands in the form */
  typed() {
    const of = (/** @type {string} */ name) => /** @type {HTMLInputElement | HTMLSelectElement | null} */ (this.querySelector(`[data-field="${name}"] input, select[data-field="${name}"]`))?.value.trim() ?? "";
    const events = Array.from({ length: this.rows }, (_, row) => ({ enclosure: of(`event-${row}`), reading: of(`event-at-${row}`) }));
    return {
      port: of("port"), to: of("to"), unit: of("in") === "ft" ? "ft" : "m", distance: of("distance"), index: of("index"), launch: of("launch"), wavelength: of("wavelength"),
      events: events.filter(({ enclosure, reading }) => enclosure !== "" || reading !== ""),
      farPort: of("far_port"), farDistance: of("far_distance"), farLaunch: of("far_launch"),
    };
  }

  /** @param {Field} field @returns {string} */
  wrongWith(field) {
    return this.wrong[field] ?? (this.problem?.parameter === field ? this.problem.message : "");
  }

  /** @override */
  render() {
    const { shot } = this;
    if (shot === null) return nothing;
    return html`<form class="desk-form" @submit=${this.submitted} novalidate>
      <div class="field-row">${this.code("port", "Port shot", ["port"], "HE-1/FDR-S/72", shot.port, this.wrongWith("port"))}
        ${this.number("distance", "Distance read", shot.distance, "7412")}
        <label class="plain-field">in <select data-field="in"><option value="m" ?selected=${shot.unit === "m"}>metres</option><option value="ft" ?selected=${shot.unit === "ft"}>feet</option></select></label></div>
      <div class="field-row">${this.number("wavelength", "Wavelength, nm", shot.wavelength, "1550")}${this.number("index", "Index set", shot.index, "none")}${this.number("launch", "Launch fiber", shot.launch, "none")}</div>
      ${this.events(shot)}${this.farEnd(shot)}
      <details class="more" ?open=${shot.to !== ""}><summary>Behind a splitter</summary>${this.code("to", "Toward the port", ["port"], "DT-09-01/D/1", shot.to, this.wrongWith("to"))}</details>
      <p class="act"><button type="submit" class="main">Place it</button></p></form>`;
  }

  /** @param {Shot} shot @returns {unknown} */
  events(shot) {
    const wrong = this.wrongWith("event");
    return html`<fieldset><legend>Known joints on the same shot <span class="lighter">the glass between two is fitted to them</span></legend>
      ${Array.from({ length: this.rows }, (_, row) => html`<div class="field-row">
        ${this.code(`event-${row}`, "At", ["enclosure"], row === 0 ? "C-S03" : "C-S04", shot.events[row]?.enclosure ?? "", "")}
        ${this.number(`event-at-${row}`, "reads", shot.events[row]?.reading ?? "", row === 0 ? "6038" : "8155")}</div>`)}
      ${wrong ? html`<p class="problem" role="alert">${wrong}</p>` : nothing}
      <p class="act"><button type="button" @click=${() => (this.rows += 1)}>One more joint</button></p></fieldset>`;
  }

  /** @param {Shot} shot @returns {unknown} */
  farEnd(shot) {
    return html`<details class="more" ?open=${this.far} @toggle=${(/** @type {Event} */ event) => (this.far = /** @type {HTMLDetailsElement} */ (event.target).open)}><summary>A shot from the far end</summary>
      <div class="field-row">${this.code("far_port", "Port shot there", ["port"], "HUT-S/FDR-S/12", shot.farPort, this.wrongWith("far_port"))}
      ${this.number("far_distance", "Distance read", shot.farDistance, "5334")}${this.number("far_launch", "Launch fiber", shot.farLaunch, "none")}</div></details>`;
  }

  /**
   * @param {string} name @param {string} label @param {string[]} kinds @param {string} hint @param {string} value @param {string} wrong
   * @returns {unknown}
   */
  code(name, label, kinds, hint, value, wrong) {
    return html`<sw-find-field data-field=${name} .name=${name} .label=${label} .kinds=${kinds} .hint=${hint} .value=${value} .wrong=${wrong}></sw-find-field>`;
  }

  /** @param {string} name @param {string} label @param {string} value @param {string} hint @returns {unknown} */
  number(name, label, value, hint) {
    const wrong = this.wrongWith(/** @type {Field} */ (name));
    const id = `field-${name}`;
    return html`<div class="plain-field" data-field=${name}><label for=${id}>${label}</label> <input id=${id} inputmode="decimal" autocomplete="off" placeholder=${hint} .value=${value}
      aria-invalid=${wrong ? "true" : "false"} aria-describedby=${wrong ? `${id}-wrong` : nothing}>${wrong ? html`<p class="problem" id=${`${id}-wrong`}>${wrong}</p>` : nothing}</div>`;
  }
}

customElements.define("sw-reading", ReadingForm);
