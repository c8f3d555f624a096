import { LitElement, html, nothing } from "lit";
import { UnitController, dayInWords, length, timeInWords, units } from "../quantity/index.js";
import { link } from "../address/index.js";
import { basisInWords } from "./basis.js";
import { readingOf } from "./figure.js";

/** @typedef {import("./figure.js").Figure} Figure */

/** The place at the sheet's foot where a number says how it is known. */
export class BasisNote extends LitElement {
  /** @override */
  static properties = { figure: { attribute: false }, zone: { attribute: false } };

  constructor() {
    super();
    /** @type {Figure | null} */
    this.figure = null;
    /** @type {string} time zone of the records */
    this.zone = "UTC";
    /** @type {Element | null} where the focus goes back to */
    this.from = null;
    new UnitController(this);
    this.addEventListener("keydown", (event) => {
      if (event.key === "Escape") this.close(event);
    });
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  /**
   * Says how a number is known.
   * @param {Figure} figure
   * @param {Element} from the number's own button
   */
  async open(figure, from) {
    this.figure = figure;
    this.from = from;
    await this.updateComplete;
    /** @type {HTMLElement | null} */ (this.querySelector(".basis"))?.focus();
  }

  /** @param {Event} event */
  close(event) {
    event.stopPropagation();
    this.figure = null;
    if (this.from instanceof HTMLElement) this.from.focus();
  }

  /** @override */
  render() {
    if (this.figure === null) return nothing;
    const reading = readingOf(this.figure);
    const { basis, what } = this.figure;
    return html`<section class="basis" tabindex="-1" aria-label="How do you know?">
      <header><h2>How do you know?</h2><button type="button" @click=${this.close}>Close <kbd>Esc</kbd></button></header>
      <p class="basis-what">${what}: <strong>${reading.number}</strong> <span class="unit">${reading.unit}</span></p>
      <dl>
        <dt>Known from</dt><dd>${basisInWords(basis.how)}</dd>
        ${basis.source ? html`<dt>Source</dt><dd>${basis.source}</dd>` : nothing}
        ${basis.trust ? html`<dt>Trust</dt><dd>${basis.trust}${basis.verifiedOn ? `, verified ${dayInWords(basis.verifiedOn)}` : ""}</dd>` : nothing}
        ${this.parts()}${this.posting()}
      </dl>
    </section>`;
  }

  /** @returns {unknown} what the number is made up of, the largest first */
  parts() {
    const parts = [...(this.figure?.basis.parts ?? [])].sort((one, other) => other.metres - one.metres);
    if (parts.length === 0) return nothing;
    return html`<dt>Made up of</dt><dd><table class="basis-parts"><tbody>${parts.map(({ what, metres }) => {
      const { number, unit } = length(metres, units.unit);
      return html`<tr><th scope="row">${what}</th><td class="right"><span class="number">${number}</span> <span class="unit">${unit}</span></td></tr>`;
    })}</tbody></table></dd>`;
  }

  /** @returns {unknown} */
  posting() {
    const changed = this.figure?.basis.changed;
    if (!changed) return nothing;
    const said = `${changed.by}, ${timeInWords(changed.time, this.zone)}: ${changed.reason}`;
    return html`<dt>Posted</dt><dd>${link("posting", String(changed.posting), `posting ${changed.posting}`)}, ${said}</dd>`;
  }
}

customElements.define("sw-basis-note", BasisNote);
