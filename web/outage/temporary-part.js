import { LitElement, html, nothing } from "lit";
import { currentAddress, link } from "../address/index.js";
import { dayInWords } from "../quantity/index.js";
import { Problem, send } from "../server/index.js";

/** @typedef {import("../server/contract.d.ts").TemporaryList} TemporaryList */
/** @typedef {TemporaryList["temporary"][number]} TemporaryJoint */

/**
 * The joints that one posting made or changed last.
 * @typedef {object} Made
 * @property {number} posting 0 where it is not known
 * @property {string} words who posted it and why
 * @property {TemporaryJoint[]} joints
 */

/**
 * Temporary joints by the posting that they came with, in the order of the list.
 * @param {TemporaryJoint[]} joints
 * @returns {Made[]}
 */
export function byPosting(joints) {
  /** @type {Map<number, Made>} */
  const made = new Map();
  for (const joint of joints) {
    const posting = joint.changed?.posting ?? 0;
    const words = joint.changed ? `${joint.changed.reason}, ${joint.changed.by}` : "Not known by which posting";
    const of = made.get(posting) ?? { posting, words, joints: [] };
    of.joints.push(joint);
    made.set(posting, of);
  }
  return [...made.values()];
}

/** Temporary joints that wait to be undone, posting by posting; each posting can be taken back as a whole. */
export class TemporaryJoints extends LitElement {
  /** @override */
  static properties = { list: { attribute: false }, opened: { state: true }, problem: { state: true }, said: { state: true } };

  constructor() {
    super();
    /** @type {TemporaryList | null} */
    this.list = null;
    /** @type {number} the posting whose undoing is asked about; 0: none */
    this.opened = 0;
    this.problem = "";
    this.said = "";
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  /** @param {number} posting */
  async open(posting) {
    this.opened = posting;
    this.problem = this.said = "";
    await this.updateComplete;
    /** @type {HTMLElement | null} */ (this.querySelector("form input"))?.focus();
  }

  /** @param {SubmitEvent} event */
  async submitted(event) {
    event.preventDefault();
    const data = new FormData(/** @type {HTMLFormElement} */ (event.target));
    const of = (/** @type {string} */ name) => String(data.get(name) ?? "").trim();
    try {
      const { posting } = await send(`/postings/${this.opened}/undo`, { by: of("by"), reason: of("reason") });
      this.said = `Posting ${this.opened} is undone, by posting ${posting}.`;
      this.opened = 0;
      this.dispatchEvent(new CustomEvent("sw-posted", { bubbles: true, detail: posting }));
    } catch (cause) {
      this.problem = cause instanceof Problem ? cause.message : String(cause);
    }
    await this.updateComplete;
    /** @type {HTMLElement | null} */ (this.querySelector(".undone, .problem"))?.focus();
  }

  /** @override */
  render() {
    const all = byPosting(this.list?.temporary ?? []);
    const said = this.said ? html`<p class="undone" role="status" tabindex="-1">${this.said}</p>` : nothing;
    if (all.length === 0) return said;
    return html`<h2>Temporary joints</h2>${said}${all.map((made) => this.posting(made))}`;
  }

  /** @param {Made} made @returns {unknown} */
  posting(made) {
    const { asOf, asIf } = currentAddress();
    const offered = made.posting > 0 && !asOf && !asIf;
    return html`<section class="temporary"><table><caption>${made.words}</caption><thead><tr><th>At</th><th>Joint</th><th>Until</th></tr></thead><tbody>${made.joints.map((each) => html`<tr><td>${link("enclosure", each.enclosure)}</td>
      <td class="ends">${each.a} = ${each.b}${each.spliced_by ? html`<br><span class="lighter">${each.spliced_by}</span>` : nothing}</td>
      <td>${dayInWords(each.until)} ${each.lapsed ? html`<strong class="state-down">past</strong>` : html`<span class="lighter">${each.days_left} days</span>`}</td></tr>`)}</tbody></table>
      ${!offered ? nothing : this.opened === made.posting ? this.form(made) : html`<p class="act"><button type="button" class="undo" @click=${() => this.open(made.posting)}>Undo posting ${made.posting}</button></p>`}</section>`;
  }

  /** @param {Made} made @returns {unknown} */
  form({ posting, words }) {
    return html`<form class="desk-form" @submit=${this.submitted} @keydown=${(/** @type {KeyboardEvent} */ event) => event.key === "Escape" && (this.opened = 0)}>
      <p>All that posting ${posting} changed goes back to what it was before: <em>${words}</em>. What was posted stays in the journal.</p>
      <div class="field-row"><label class="plain-field">Your name <input name="by" required maxlength="200" autocomplete="name"></label></div>
      <label class="plain-field wide">Why <input name="reason" required maxlength="2000" autocomplete="off" .value=${"The cable is whole again"}></label>
      ${this.problem ? html`<p class="problem" role="alert" tabindex="-1">${this.problem}</p>` : nothing}
      <p class="act"><button type="submit" class="main">Undo</button> <button type="button" @click=${() => (this.opened = 0)}>Not now</button></p></form>`;
  }
}

customElements.define("sw-temporary", TemporaryJoints);
