import { LitElement, html, nothing } from "lit";
import { ask } from "../server/index.js";
import { hrefTo } from "../address/index.js";

/** @typedef {import("../server/contract.d.ts").FindAnswer} FindAnswer */
/** @typedef {import("../server/contract.d.ts").FindResult} FindResult */

/** Answers asked for. */
const LIMIT = 12;

/** One box that eats anything, and answers while it is typed. */
export class FindBox extends LitElement {
  /** @override */
  static properties = { answer: { state: true }, at: { state: true }, open: { state: true }, problem: { state: true } };

  constructor() {
    super();
    /** @type {FindAnswer | null} */
    this.answer = null;
    /** @type {number} the answer that Enter takes */
    this.at = 0;
    this.open = false;
    this.problem = "";
    /** @type {AbortController | null} */
    this.abort = null;
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  /** @override */
  focus() {
    const box = this.box();
    box?.focus();
    box?.select();
  }

  /** @returns {HTMLInputElement | null} */
  box() {
    return this.querySelector("input");
  }

  /** @returns {FindResult[]} what may be taken of the answer */
  get results() {
    return this.answer?.results ?? [];
  }

  /** @returns {Promise<void>} */
  async typed() {
    const q = this.box()?.value.trim() ?? "";
    this.abort?.abort();
    if (q === "") {
      this.answer = null;
      this.open = false;
      return;
    }
    const abort = new AbortController();
    this.abort = abort;
    try {
      this.answer = await ask("/find", { q, limit: this.limit }, abort.signal);
      this.problem = "";
      this.at = 0;
      this.open = true;
    } catch (cause) {
      if (abort.signal.aborted) return;
      this.answer = null;
      this.problem = cause instanceof Error ? cause.message : String(cause);
      this.open = true;
    }
  }

  /** @returns {number} answers asked for */
  get limit() {
    return LIMIT;
  }

  /** @param {KeyboardEvent} event */
  async pressed(event) {
    const { results } = this;
    if (event.key === "ArrowDown" || event.key === "ArrowUp") {
      event.preventDefault();
      this.open = results.length > 0;
      this.at = (this.at + (event.key === "ArrowDown" ? 1 : -1) + results.length) % Math.max(1, results.length);
    } else if (event.key === "Enter") {
      event.preventDefault();
      await this.typedOut();
      this.take(this.results[this.at]);
    } else if (event.key === "Escape") {
      event.stopPropagation();
      if (this.open) this.open = false;
      else this.box()?.blur();
    }
  }

  /** Takes the answers out of sight. */
  shut() {
    this.open = false;
  }

  /** Waits for the answer to what is typed, so that a fast Enter takes it and not the one before. */
  async typedOut() {
    if (this.answer?.query !== this.box()?.value.trim()) await this.typed();
  }

  /** @param {FindResult | undefined} result */
  take(result) {
    if (!result) return;
    this.open = false;
    this.box()?.blur();
    const { view, code } = result.target;
    if (view !== "map") location.hash = hrefTo(view, code ?? "");
    if (result.lon !== null && result.lat !== null && (view === "map" || result.kind === "mark")) {
      const points = [[result.lon, result.lat]];
      this.dispatchEvent(new CustomEvent("sw-shown", { bubbles: true, detail: { label: result.label, points } }));
    }
  }

  /** @override */
  render() {
    return html`<div class="find" role="search" @focusout=${this.left}>
      <label for="find">Find <kbd>/</kbd></label>${this.input("find", "found", "code, fiber, port, place, circuit, mark")}${this.list("found")}</div>`;
  }

  /** @param {string} id @param {string} list id of the answers @param {string} placeholder @returns {unknown} */
  input(id, list, placeholder) {
    const current = this.open && this.results.length > 0 ? `${list}-${this.at}` : nothing;
    return html`<input id=${id} type="search" role="combobox" autocomplete="off" spellcheck="false" placeholder=${placeholder}
      aria-expanded=${this.open} aria-controls=${list} aria-autocomplete="list" aria-activedescendant=${current}
      @input=${this.typed} @keydown=${this.pressed} @focus=${() => (this.open = this.results.length > 0)}>`;
  }

  /** @param {string} id @returns {unknown} */
  list(id) {
    const { results } = this;
    return html`<div class="found" ?hidden=${!this.open}>
      <ul id=${id} role="listbox" aria-label="Found">${results.map((result, index) => this.option(id, result, index))}</ul>
      ${this.note(results.length)}</div>`;
  }

  /** @param {string} list @param {FindResult} result @param {number} index @returns {unknown} */
  option(list, result, index) {
    return html`<li id=${`${list}-${index}`} role="option" aria-selected=${index === this.at}
      @mousedown=${(/** @type {Event} */ event) => event.preventDefault()} @mousemove=${() => (this.at = index)} @click=${() => this.take(result)}>
      <span class="found-label">${result.label}</span> <span class="found-what">${result.what}</span> <span class="found-where">${result.where}</span></li>`;
  }

  /** @param {number} found @returns {unknown} */
  note(found) {
    if (this.problem) return html`<p class="problem">${this.problem}</p>`;
    if (found === 0) return html`<p role="status">Nothing in the records is called that. A fiber is written <code>FDR-S-1:25</code>, a mark <code>FDR-S-1 19784 ft</code>.</p>`;
    return this.answer?.more ? html`<p class="lighter">More match: type on to narrow them.</p>` : nothing;
  }

  /** @param {FocusEvent} event */
  left(event) {
    if (!this.contains(/** @type {Node | null} */ (event.relatedTarget))) this.open = false;
  }
}

customElements.define("sw-find", FindBox);
