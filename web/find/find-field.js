import { html, nothing } from "lit";
import { FindBox } from "./find-box.js";

/** @typedef {import("../server/contract.d.ts").FindResult} FindResult */

/** Answers asked for: those of other kinds are left out afterwards. */
const LIMIT = 50;

/** Answers offered. */
const OFFERED = 8;

/**
 * A field of a form that takes the code of a thing of some kinds only, completed by Find's answers. What is typed stays
 * as it was typed, known or not: whoever asks the server says what is wrong with it.
 */
export class FindField extends FindBox {
  /** @override */
  static properties = {
    ...FindBox.properties, name: { attribute: false }, label: { attribute: false }, kinds: { attribute: false },
    hint: { attribute: false }, value: { attribute: false }, wrong: { attribute: false },
  };

  constructor() {
    super();
    /** @type {string} the name of the field in its form */
    this.name = "field";
    this.label = "";
    /** @type {string[]} kinds of Find's answers */
    this.kinds = [];
    /** @type {string} an example */
    this.hint = "";
    /** @type {string} what stands in it at first; another one is put in anew */
    this.value = "";
    /** @type {string} what is wrong with it; empty for nothing */
    this.wrong = "";
  }

  /** @param {import("lit").PropertyValues} changed @override */
  updated(changed) {
    const box = this.box();
    if (changed.has("value") && box && box.value !== this.value) box.value = this.value;
  }

  /** @override */
  get limit() {
    return LIMIT;
  }

  /** @override */
  get results() {
    return super.results.filter((each) => this.kinds.includes(each.kind) || this.isHolder(each)).slice(0, OFFERED);
  }

  /** @param {FindResult} result @returns {boolean} whether it is a panel, where one of its ports is wanted */
  isHolder(result) {
    return result.kind === "panel" && this.kinds.includes("port");
  }

  /** @param {KeyboardEvent} event @override */
  async pressed(event) {
    if (event.key === "Enter" && (!this.open || this.results[this.at]?.label === this.box()?.value.trim())) {
      this.shut();
      return;
    }
    if (event.key === "Tab") {
      this.shut();
      return;
    }
    await super.pressed(event);
  }

  /** @param {FindResult | undefined} result @override */
  take(result) {
    const box = this.box();
    if (!result || !box) return;
    const holder = this.isHolder(result);
    box.value = holder ? `${result.label}/` : result.label;
    this.shut();
    box.dispatchEvent(new Event("change", { bubbles: true }));
    if (!holder) this.dispatchEvent(new CustomEvent("sw-taken", { bubbles: true, detail: result }));
  }

  /** @override */
  render() {
    const id = `field-${this.name}`;
    return html`<div class="find field" @focusout=${this.left}><label for=${id}>${this.label}</label>${this.input(id, `${id}-found`, this.hint)}${this.list(`${id}-found`)}
      ${this.wrong ? html`<p class="problem">${this.wrong}</p>` : nothing}</div>`;
  }

  /** @param {number} found @returns {unknown} @override */
  note(found) {
    if (this.problem || found > 0) return super.note(found);
    return html`<p role="status">The records have none that is called that.</p>`;
  }
}

customElements.define("sw-find-field", FindField);
