import { LitElement, html } from "lit";
import { Asking, waiting } from "../server/index.js";
import { UnitController, timeInWords } from "../quantity/index.js";
import { link } from "../address/index.js";

/** @typedef {import("../server/contract.d.ts").PostingRef} PostingRef */

/**
 * What a view asks the map to show.
 * @typedef {object} Shown
 * @property {string} label
 * @property {Array<[number, number]>} points longitudes and latitudes: one for a place, several for a line
 */

/**
 * A view of one thing of the records: asks for it, and draws it or why not.
 * @template T
 */
export class RecordView extends LitElement {
  /** @override */
  static properties = { code: { attribute: false }, stamp: { attribute: false }, zone: { attribute: false } };

  constructor() {
    super();
    /** @type {string} the thing's code */
    this.code = "";
    /** @type {string} from which records; another one asks anew */
    this.stamp = "";
    /** @type {string} time zone of the records */
    this.zone = "UTC";
    /** @type {Asking<T>} */
    this.asking = new Asking(this);
    new UnitController(this);
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  /**
   * @param {import("lit").PropertyValues} changed
   * @override
   */
  willUpdate(changed) {
    if (changed.has("code") || changed.has("stamp")) void this.reload(changed.has("code"));
  }

  /** @param {boolean} fresh another thing: forget the one before */
  async reload(fresh) {
    if (fresh) this.asking.answer = null;
    await this.asking.run((signal) => this.question(signal));
    const answer = this.asking.answer;
    if (answer === null) return;
    const shown = this.shownOf(answer);
    if (shown) this.dispatchEvent(new CustomEvent("sw-shown", { bubbles: true, detail: shown }));
  }

  /**
   * The question that fetches the thing.
   * @param {AbortSignal} signal
   * @returns {Promise<T>}
   */
  question(signal) {
    signal.throwIfAborted();
    throw new Error("each view asks its own question");
  }

  /**
   * What the map shows of it; nothing, unless a view says what.
   * @param {T} answer
   * @returns {Shown | null}
   */
  shownOf(answer) {
    void answer;
    return null;
  }

  /**
   * Draws the thing.
   * @param {T} answer
   * @returns {unknown}
   */
  draw(answer) {
    throw new Error(`each view draws its own answer: ${String(answer)}`);
  }

  /** @override */
  render() {
    const answer = this.asking.answer;
    return html`${answer === null ? html`<h1>${this.code}</h1>` : this.draw(answer)}${waiting(this.asking)}`;
  }

  /**
   * The line that says when the thing was last changed, and from which posting this is read.
   * @param {PostingRef | null} changed
   * @param {number} posting
   * @returns {unknown}
   */
  changedLine(changed, posting) {
    const said = changed
      ? html`Last changed by ${link("posting", String(changed.posting), `posting ${changed.posting}`)}, ${changed.by},
          ${timeInWords(changed.time, this.zone)}: ${changed.reason}.`
      : "When it was last changed is not known.";
    return html`<p class="changed">${said} Read as of posting ${posting}.</p>`;
  }
}
