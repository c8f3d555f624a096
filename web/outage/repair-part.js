import { LitElement, html, nothing } from "lit";
import { currentAddress } from "../address/index.js";
import { METRES_PER_FOOT, UnitController, inWords, length, units } from "../quantity/index.js";
import { Problem, send } from "../server/index.js";
import { isNumber } from "./reading.js";
import { FIELDS, LENGTH_FIELDS, faultsOfRepair, groupOf, refusedBy, requestOf, slackOf } from "./repair-order.js";
import { madeInWords, repairForm, repairTried } from "./repair-view.js";
import { localTime, withOffset } from "./times.js";

/** @typedef {import("../server/contract.d.ts").Repair} Repair */
/** @typedef {import("../server/contract.d.ts").RepairRequest} RepairRequest */
/** @typedef {import("./repair-order.js").Typed} Typed */
/** @typedef {import("./repair-order.js").Group} Group */

/** The repair of a cut cable on its way into the records: typed, tried, shown, and posted once a person says so. */
export class RepairForm extends LitElement {
  /** @override */
  static properties = {
    incident: { attribute: false }, called: { attribute: false }, span: { attribute: false }, zone: { attribute: false },
    wrong: { state: true }, tried: { state: true }, said: { state: true }, busy: { state: true },
  };

  constructor() {
    super();
    /** @type {string} the number of the incident in whose log it is written */
    this.incident = "";
    this.called = "";
    /** @type {string} the span that is taken as cut; empty where it is not known */
    this.span = "";
    this.zone = "UTC";
    /** @type {Partial<Record<Group, string>>} what is wrong */
    this.wrong = {};
    /** @type {{ request: RepairRequest, repair: Repair } | null} what was tried last and is not posted */
    this.tried = null;
    this.said = "";
    this.busy = false;
    this.unit = units.unit;
    new UnitController(this);
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  /** @returns {{ pending: boolean }} */
  get asking() {
    return { pending: this.busy };
  }

  /** What was typed in one unit stays the same length in the other. @override */
  updated() {
    if (this.unit === units.unit) return;
    const factor = units.unit === "ft" ? 1 / METRES_PER_FOOT : METRES_PER_FOOT;
    this.unit = units.unit;
    for (const field of LENGTH_FIELDS) {
      const box = this.box(field);
      if (box && isNumber(box.value)) box.value = String(Number((Number(box.value.replace(/[, \u202f]/g, "")) * factor).toFixed(3)));
    }
  }

  /** @param {string} field @returns {HTMLInputElement | null} */
  box(field) {
    return this.querySelector(`[data-field="${field}"] input`);
  }

  /** @returns {Typed} what stands in the form */
  typed() {
    return /** @type {Typed} */ (Object.fromEntries(FIELDS.map((field) => [field, this.box(field)?.value.trim() ?? ""])));
  }

  /** What was tried is no longer what stands in the form. */
  edited() {
    this.tried = null;
  }

  /** @param {SubmitEvent} event */
  async submitted(event) {
    event.preventDefault();
    const typed = this.typed();
    const faults = Object.entries(faultsOfRepair(typed));
    this.wrong = {};
    this.said = "";
    for (const [field, says] of faults) this.wrong[groupOf(field)] ??= says;
    if (faults.length > 0) {
      await this.updateComplete;
      this.box(faults[0]?.[0] ?? "")?.focus();
      return;
    }
    await this.attempt(() => this.try(typed));
    this.focusOn(this.tried ? ".tried" : ".problem");
  }

  /** @param {Typed} typed */
  async try(typed) {
    const request = requestOf(typed, units.unit);
    /** @type {Repair} */
    const whole = await send("/repairs", { ...request, preview: true });
    const { slack, short } = slackOf(typed, units.unit, whole.joined);
    for (const [field, holds] of Object.entries(short)) this.wrong[groupOf(field)] = `The coil there holds ${inWords(length(holds, units.unit))} by the records; say what was drawn from it, so much at most.`;
    if (Object.keys(short).length > 0) return;
    const drawn = slack.length === 0 ? request : { ...request, slack };
    this.tried = { request: drawn, repair: slack.length === 0 ? whole : await send("/repairs", { ...drawn, preview: true }) };
  }

  async post() {
    const tried = this.tried;
    if (!tried) return;
    await this.attempt(async () => {
      /** @type {Repair} */
      const repair = await send("/repairs", tried.request);
      this.tried = null;
      this.said = `Posted as posting ${repair.posting}.${await this.logged(tried.request, repair)}`;
      this.dispatchEvent(new CustomEvent("sw-posted", { bubbles: true, detail: repair.posting }));
    });
    this.focusOn(this.said ? ".posted" : ".problem");
  }

  /**
   * Writes the repair into the incident's log. It is posted by then, so a log that refuses is told, not thrown.
   * @param {RepairRequest} request
   * @param {Repair} repair
   * @returns {Promise<string>}
   */
  async logged(request, repair) {
    const at = withOffset(localTime(Date.now(), this.zone), this.zone);
    try {
      await send(`/incidents/${this.incident}/entries`, { kind: "note", at, by: request.by, text: madeInWords(repair, units.unit) });
      return " It is written in the log.";
    } catch (cause) {
      return ` It could not be written in the log: ${cause instanceof Error ? cause.message : cause} Write it there by hand.`;
    }
  }

  /** @param {() => Promise<void>} act */
  async attempt(act) {
    this.busy = true;
    try {
      await act();
    } catch (cause) {
      this.tried = null;
      this.wrong = cause instanceof Problem ? refusedBy(cause) : { rest: String(cause) };
    }
    this.busy = false;
  }

  /** @param {string} part */
  focusOn(part) {
    void this.updateComplete.then(() => /** @type {HTMLElement | null} */ (this.querySelector(part))?.focus());
  }

  /** @override */
  render() {
    const { asOf, asIf } = currentAddress();
    if (asOf || asIf) return html`<p class="lighter">A repair can be posted on the records as they are now only.</p>`;
    return html`<details class="asked"><summary>Repair <span class="lighter">a piece let into the cut cable: open to enter it</span></summary>${repairForm(this)}
      ${this.tried ? repairTried(this, this.tried.repair) : nothing}</details>
      ${this.said ? html`<p class="posted" role="status" tabindex="-1">${this.said}</p>` : nothing}`;
  }
}

customElements.define("sw-repair", RepairForm);
