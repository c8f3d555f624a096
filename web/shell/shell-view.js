import { LitElement, html, nothing } from "lit";
import { Asking, answerFrom, ask, waiting } from "../server/index.js";
import { currentAddress, formatAddress, hrefTo, parseAddress } from "../address/index.js";
import { PARTS, hrefToPart } from "../outage/index.js";
import { UnitController, units } from "../quantity/index.js";
import { keep, kept } from "./keeping.js";
import { applyTheme, flipTheme, themeInWords } from "./theme.js";
import { MOST_WAVELENGTHS, offeredWavelengths, pathAtHand, traced } from "./tracing.js";
import { isTyped, keyList } from "./keys.js";
import { sheetView, titleOf } from "./sheet.js";

/** @typedef {import("../address/address.js").Address} Address */
/** @typedef {import("../server/contract.d.ts").Status} Status */
/** @typedef {import("../server/contract.d.ts").Path} Path */
/** @typedef {import("../plant/record-view.js").Shown} Shown */
/** @typedef {import("../path/track.js").Measure} Measure */
/** @typedef {import("./tracing.js").Traced} Traced */

/** @type {readonly Measure[]} */
const MEASURES = ["glass", "sheath", "route"];

/** The page: Find, the map, the sheet and the strip, and what they have in common. */
export class ShellView extends LitElement {
  /** @override */
  static properties = { address: { state: true }, pointer: { state: true }, shown: { state: true }, marks: { state: true }, measure: { state: true }, folded: { state: true }, keysOpen: { state: true } };

  constructor() {
    super();
    const before = kept();
    if (location.hash === "" && before.hash) history.replaceState(null, "", before.hash);
    /** @type {import("../map/camera.js").Standpoint | null} where the map was left with what is open; null once something else is */
    this.standpoint = location.hash === before.hash ? before.stand : null;
    /** @type {Address} */
    this.address = currentAddress();
    /** @type {number | null} glass from the path's start */
    this.pointer = null;
    /** @type {Shown | null} */
    this.shown = null;
    /** @type {{ map: import("../map/paint-marks.js").Marks, strip: import("../strip/fault-mark.js").FaultMark[] } | null} what the outage desk draws */
    this.marks = null;
    /** @type {Measure} */
    this.measure = before.measure;
    this.folded = before.folded;
    this.keysOpen = false;
    /** @type {Asking<Status>} */
    this.status = new Asking(this);
    /** @type {Asking<Traced>} */
    this.tracing = new Asking(this);
    this.hashed = () => this.arrive(currentAddress());
    this.pressed = (/** @type {KeyboardEvent} */ event) => this.key(event);
    // What is drawn on a canvas does not change by itself once its typeface has come.
    this.lettered = () => this.themed();
    new UnitController(this);
    answerFrom(this.address.asOf, this.address.asIf);
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  /** @override */
  connectedCallback() {
    super.connectedCallback();
    applyTheme();
    addEventListener("hashchange", this.hashed);
    addEventListener("keydown", this.pressed);
    document.fonts.addEventListener("loadingdone", this.lettered);
    matchMedia("(prefers-color-scheme: dark)").addEventListener("change", () => this.themed());
    matchMedia("print").addEventListener("change", () => this.themed());
    void this.readStatus();
    void this.trace();
  }

  /** @override */
  disconnectedCallback() {
    super.disconnectedCallback();
    removeEventListener("hashchange", this.hashed);
    removeEventListener("keydown", this.pressed);
    document.fonts.removeEventListener("loadingdone", this.lettered);
  }

  /** @returns {string} from which records everything is read */
  get stamp() {
    return `${this.address.asOf} ${this.address.asIf}`;
  }

  async readStatus() {
    await this.status.run((signal) => ask("/status", {}, signal));
    const unit = kept().unit ?? this.status.answer?.unit;
    if (unit) units.choose(unit);
    document.title = titleOf(this.address, this.status.answer);
  }

  async trace() {
    const { trace, nm } = this.address;
    if (trace === "") {
      this.tracing.forget();
      return;
    }
    if (this.tracing.answer?.trace !== trace) this.tracing.answer = null;
    await this.tracing.run((signal) => traced(trace, nm, signal));
  }

  /** @param {Address} address */
  arrive(address) {
    const before = this.address;
    this.address = address;
    this.standpoint = null;
    keep({ hash: location.hash });
    if (address.view === "outage") keep({ outage: location.hash });
    else if (before.view === "outage") this.marks = null;
    answerFrom(address.asOf, address.asIf);
    const elsewhen = before.asOf !== address.asOf || before.asIf !== address.asIf;
    if (elsewhen) void this.readStatus();
    if (elsewhen || before.trace !== address.trace || before.nm.join() !== address.nm.join()) void this.trace();
    if (before.trace !== address.trace || before.path !== address.path) this.pointer = null;
    if (before.view !== address.view || before.code !== address.code) this.opened(address);
    document.title = titleOf(address, this.status.answer);
  }

  /** @param {Address} address */
  opened({ view }) {
    if (!["structure", "span", "enclosure", "cable"].includes(view)) this.shown = null;
    const sheet = this.querySelector(".sheet");
    sheet?.scrollTo(0, 0);
  }

  /** @param {Partial<Address>} change */
  go(change) {
    location.hash = formatAddress({ ...this.address, ...change });
  }

  /** @param {number} nm */
  flipWavelength(nm) {
    const drawn = [...(this.tracing.answer?.byWavelength.keys() ?? [])];
    const next = drawn.includes(nm) ? drawn.filter((each) => each !== nm) : [...drawn, nm].slice(-MOST_WAVELENGTHS);
    if (next.length > 0) this.go({ nm: next });
    else this.requestUpdate();
  }

  /** @param {KeyboardEvent} event */
  key(event) {
    if (event.key === "Escape" && this.keysOpen) {
      this.keysOpen = false;
      return;
    }
    if (isTyped(event) || !kept().keys) return;
    const act = this.actions()[event.key];
    if (!act) return;
    event.preventDefault();
    act();
  }

  /** @returns {Record<string, () => void>} by key */
  actions() {
    const to = (/** @type {string} */ selector) => () => /** @type {HTMLElement | null} */ (this.querySelector(selector))?.focus();
    return {
      "/": to("sw-find"),
      m: to("sw-map"),
      s: to(".sheet"),
      p: to("sw-strip"),
      f: () => this.fold(),
      u: () => this.flipUnit(),
      d: () => this.setMeasure(MEASURES[(MEASURES.indexOf(this.measure) + 1) % MEASURES.length] ?? "glass"),
      t: () => this.flipTheme(),
      0: () => /** @type {import("../map/index.js").MapView | null} */ (this.querySelector("sw-map"))?.whole(),
      "?": () => this.showKeys(),
      o: () => (location.hash = this.outage),
      ...this.partKeys(),
    };
  }

  /** @returns {Record<string, () => void>} the parts of the outage desk, by number, while it is open */
  partKeys() {
    if (this.address.view !== "outage") return {};
    return Object.fromEntries(PARTS.map(({ part }, index) => [String(index + 1), () => (location.hash = hrefToPart(part))]));
  }

  /** @returns {string} where the outage desk is found as it was left, from the records that are read now */
  get outage() {
    const { asOf, asIf } = this.address;
    return formatAddress({ ...parseAddress(kept().outage || "#/outage"), asOf, asIf });
  }

  async showKeys() {
    this.keysOpen = !this.keysOpen;
    await this.updateComplete;
    if (this.keysOpen) /** @type {HTMLElement | null} */ (this.querySelector(".keys-panel"))?.focus();
  }

  fold() {
    this.folded = !this.folded;
    keep({ folded: this.folded });
  }

  /** @param {Measure} measure */
  setMeasure(measure) {
    this.measure = measure;
    keep({ measure });
  }

  flipTheme() {
    flipTheme();
    this.themed();
  }

  themed() {
    applyTheme();
    /** @type {import("../map/index.js").MapView | null} */ (this.querySelector("sw-map"))?.recolor();
    this.requestUpdate();
  }

  /**
   * A place on the path is pointed at; one that was put on the strip by hand stays when the map is only passed over.
   * @param {CustomEvent} event
   */
  pointed(event) {
    const strip = /** @type {import("../strip/index.js").StripView | null} */ (this.querySelector("sw-strip"));
    const passing = /** @type {Element} */ (event.target).localName === "sw-map";
    if (!passing || !strip?.pinned) this.pointer = event.detail;
  }

  /** @param {CustomEvent} event */
  openBasis({ detail }) {
    void /** @type {import("../basis/index.js").BasisNote | null} */ (this.querySelector("sw-basis-note"))?.open(detail.figure, detail.from);
  }

  /** @override */
  render() {
    const status = this.status.answer;
    const paths = pathAtHand(this.tracing.answer, this.address.path);
    return html`<div class="shell" @sw-basis=${this.openBasis} @sw-shown=${(/** @type {CustomEvent} */ event) => (this.shown = event.detail)}
      @sw-point=${this.pointed} @sw-path=${(/** @type {CustomEvent} */ event) => this.go({ path: event.detail })}
      @sw-wavelength=${(/** @type {CustomEvent} */ event) => this.flipWavelength(event.detail)} @sw-measure=${(/** @type {CustomEvent} */ event) => this.setMeasure(event.detail)}
      @sw-marks=${(/** @type {CustomEvent} */ event) => (this.marks = event.detail)} @sw-fold=${() => this.fold()} @sw-posted=${() => this.readStatus()} @sw-stand=${(/** @type {CustomEvent} */ event) => keep({ stand: event.detail })}>
      ${this.bar(status)}
      <main class="desk">
        <sw-map .status=${status} .path=${paths[0] ?? null} .shown=${this.shown} .marks=${this.marks?.map ?? null} .pointer=${this.pointer} .measure=${this.measure} .standpoint=${this.standpoint} .stamp=${this.stamp}></sw-map>
        <article class="sheet" tabindex="-1" aria-label="Sheet">
          <div class="sheet-body">${waiting(this.status)}${this.sheet(status)}</div>
          <sw-basis-note .zone=${status?.time_zone ?? "UTC"}></sw-basis-note>
        </article>
      </main>
      ${this.strip(status, paths)}
      ${this.keysOpen ? html`<aside class="keys-panel" tabindex="-1" aria-label="Keys">${keyList(kept().keys, (on) => keep({ keys: on }))}
        <button type="button" @click=${() => (this.keysOpen = false)}>Close <kbd>Esc</kbd></button></aside>` : nothing}
    </div>`;
  }

  /** @param {Status | null} status @param {Path[]} paths @returns {unknown} */
  strip(status, paths) {
    const { answer } = this.tracing;
    return html`<sw-strip .paths=${paths} .offered=${offeredWavelengths(answer, status?.wavelengths_nm ?? [])} .chosen=${[...(answer?.byWavelength.keys() ?? [])]}
      .faults=${this.marks?.strip ?? []} .pointer=${this.pointer} .measure=${this.measure} .folded=${this.folded}></sw-strip>`;
  }

  /** @param {Status | null} status @returns {unknown} */
  bar(status) {
    return html`<header><div class="bar"><a class="mark" href=${hrefTo("start")}>Spanwright</a><nav class="desks" aria-label="Desks"><a href=${this.outage} aria-current=${this.address.view === "outage" ? "page" : nothing}>Outage <kbd>o</kbd></a></nav><span class="owner">${status?.owner ?? ""}</span><sw-find></sw-find>
      <sw-as-of .status=${status} .asOf=${this.address.asOf} .asIf=${this.address.asIf}></sw-as-of>
      <span class="bar-buttons"><button type="button" @click=${() => this.flipUnit()}>${units.unit === "ft" ? "feet" : "metres"} <kbd>u</kbd></button><button type="button"
        @click=${() => this.flipTheme()}>${themeInWords()} <kbd>t</kbd></button><button type="button" aria-expanded=${this.keysOpen} @click=${() => this.showKeys()}>Keys <kbd>?</kbd></button></span>
      </div>${status?.invented ? html`<p class="invented">${status.invented}</p>` : nothing}</header>`;
  }

  flipUnit() {
    units.flip();
    keep({ unit: units.unit });
  }

  /** @param {Status | null} status @returns {unknown} */
  sheet(status) {
    const { address, tracing } = this;
    const own = ["circuit", "fiber", "port"].includes(address.view);
    const paths = own && tracing.answer ? [...tracing.answer.byWavelength.values()][0] ?? [] : null;
    const said = own && tracing.problem?.code === "not_found";
    return html`${sheetView({ address, status, paths, stamp: this.stamp, traced: tracing.answer ? [...tracing.answer.byWavelength.values()][0] ?? [] : null })}${said ? nothing : waiting(tracing)}`;
  }
}

customElements.define("sw-shell", ShellView);
