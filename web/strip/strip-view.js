import { LitElement, html, nothing, svg } from "lit";
import { hrefTo } from "../address/index.js";
import { UnitController } from "../quantity/index.js";
import { lossAt, trackLength } from "../path/index.js";
import { LINE, drawnLine } from "./line-drawing.js";
import { drawnCurves } from "./curve-drawing.js";
import { curvesOf, fieldOf, yOf } from "./curve-field.js";
import { drawnAxis } from "./axis.js";
import { readout, spokenPlace } from "./readout.js";
import { stripHead } from "./strip-head.js";
import { drawnFaults } from "./fault-mark.js";
import { Window, moved, showing, zoomed } from "./window.js";

/** @typedef {import("../server/contract.d.ts").Path} Path */
/** @typedef {import("../path/track.js").Measure} Measure */

/** Room beside the drawing for its scales, px. */
const LEFT = 52;
const RIGHT = 84;

/** The distance strip: the path at hand to scale of its glass, and its power curve. */
export class StripView extends LitElement {
  /** @override */
  static properties = {
    paths: { attribute: false }, offered: { attribute: false }, chosen: { attribute: false }, faults: { attribute: false }, pointer: { attribute: false },
    measure: { attribute: false }, folded: { attribute: false }, stretch: { state: true }, size: { state: true }, pinned: { state: true },
  };

  constructor() {
    super();
    /** @type {Path[]} the path at hand, at each wavelength drawn; empty for none */
    this.paths = [];
    /** @type {number[]} wavelengths offered, nm */
    this.offered = [];
    /** @type {number[]} wavelengths drawn, nm */
    this.chosen = [];
    /** @type {import("./fault-mark.js").FaultMark[]} fault places on the path at hand */
    this.faults = [];
    /** @type {number | null} glass from the path's start */
    this.pointer = null;
    /** @type {Measure} */
    this.measure = "glass";
    this.folded = false;
    /** @type {import("./window.js").Stretch | null} null: the whole path */
    this.stretch = null;
    this.size = { width: 800, height: 170 };
    /** @type {boolean} whether the pointer stays where it was put */
    this.pinned = false;
    /** @type {string} which path the stretch belongs to */
    this.known = "";
    new UnitController(this);
    this.watch = new ResizeObserver(() => this.measured());
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  /** @param {import("lit").PropertyValues} changed @override */
  willUpdate(changed) {
    if (!changed.has("paths")) return;
    const now = this.paths[0]?.ends.join(" ") ?? "";
    if (now !== this.known) {
      this.stretch = null;
      this.pinned = false;
    }
    this.known = now;
  }

  /** @override */
  updated() {
    const paper = this.querySelector(".strip-paper");
    this.watch.disconnect();
    if (paper) this.watch.observe(paper);
    const wheel = /** @type {HTMLElement | null} */ (paper);
    if (wheel && !wheel.onwheel) wheel.onwheel = (event) => this.wheeled(event);
  }

  measured() {
    const box = this.querySelector(".strip-paper")?.getBoundingClientRect();
    if (!box || box.width === 0) return;
    const size = { width: Math.floor(box.width), height: Math.floor(box.height) };
    if (size.width !== this.size.width || size.height !== this.size.height) this.size = size;
  }

  /** @returns {number} metres of glass of the path */
  get whole() {
    return trackLength(this.paths[0]?.track ?? [], "glass");
  }

  /** @returns {import("./window.js").Stretch} */
  get now() {
    return this.stretch ?? { from: 0, to: Math.max(this.whole, 0.001) };
  }

  /** @returns {Window} */
  get window() {
    const { from, to } = this.now;
    return new Window(from, to, LEFT, Math.max(LEFT + 50, this.size.width - RIGHT));
  }

  /** @override */
  focus() {
    /** @type {HTMLElement | null} */ (this.querySelector(".strip-paper"))?.focus();
  }

  /** @param {number | null} glass */
  point(glass) {
    this.dispatchEvent(new CustomEvent("sw-point", { bubbles: true, detail: glass }));
  }

  /** @param {number} factor below 1 comes closer */
  zoom(factor) {
    const at = this.pointer ?? (this.now.from + this.now.to) / 2;
    this.stretch = zoomed(this.now, at, factor, this.whole);
  }

  /** @param {PointerEvent} event */
  hovered(event) {
    if (this.pinned) return;
    const left = /** @type {Element} */ (event.currentTarget).getBoundingClientRect().left;
    this.point(this.window.glass(event.clientX - left));
  }

  /** @param {MouseEvent} event */
  clicked(event) {
    const left = /** @type {Element} */ (event.currentTarget).getBoundingClientRect().left;
    this.pinned = true;
    this.point(this.window.glass(event.clientX - left));
  }

  /** @param {WheelEvent} event */
  wheeled(event) {
    event.preventDefault();
    const left = /** @type {Element} */ (event.currentTarget).getBoundingClientRect().left;
    const sideways = Math.abs(event.deltaX) > Math.abs(event.deltaY) || event.shiftKey;
    const delta = sideways ? event.deltaX || event.deltaY : event.deltaY;
    if (sideways) this.stretch = moved(this.now, delta / this.window.scale, this.whole);
    else this.stretch = zoomed(this.now, this.window.glass(event.clientX - left), 1.0015 ** delta, this.whole);
  }

  /** @param {KeyboardEvent} event */
  pressed(event) {
    const step = (this.now.to - this.now.from) / (event.shiftKey ? 20 : 200);
    const at = this.pointer ?? this.now.from;
    /** @type {Record<string, () => void>} */
    const moves = {
      ArrowRight: () => this.stand(at + step),
      ArrowLeft: () => this.stand(at - step),
      ArrowUp: () => this.stand(this.station(at, 1)),
      ArrowDown: () => this.stand(this.station(at, -1)),
      PageUp: () => this.stand(at + step * 50),
      PageDown: () => this.stand(at - step * 50),
      Home: () => this.stand(0),
      End: () => this.stand(this.whole),
      Enter: () => this.openNearest(at),
      Escape: () => this.release(),
      "+": () => this.zoom(0.5),
      "=": () => this.zoom(0.5),
      "-": () => this.zoom(2),
    };
    const move = moves[event.key];
    if (!move || event.ctrlKey || event.metaKey || event.altKey) return;
    event.preventDefault();
    event.stopPropagation();
    move();
  }

  /** @param {number} glass */
  stand(glass) {
    const at = Math.min(this.whole, Math.max(0, glass));
    this.pinned = true;
    this.stretch = this.stretch === null ? null : showing(this.stretch, at, this.whole);
    this.point(at);
  }

  /** Lets the pointer go where the mouse goes again. */
  release() {
    this.pinned = false;
    this.point(null);
  }

  /**
   * @param {number} glass
   * @param {1 | -1} way
   * @returns {number} glass at the next enclosure or structure that way
   */
  station(glass, way) {
    const places = (this.paths[0]?.stations ?? []).map((station) => station.glass_m);
    const next = way > 0 ? places.find((place) => place > glass + 0.01) : places.filter((place) => place < glass - 0.01).at(-1);
    return next ?? (way > 0 ? this.whole : 0);
  }

  /** @param {number} glass */
  openNearest(glass) {
    const stations = [...(this.paths[0]?.stations ?? [])];
    stations.sort((one, other) => Math.abs(one.glass_m - glass) - Math.abs(other.glass_m - glass));
    const nearest = stations[0];
    if (!nearest) return;
    location.hash = nearest.enclosure ? hrefTo("enclosure", nearest.enclosure) : hrefTo("structure", nearest.structure);
  }

  /** @override */
  render() {
    const path = this.paths[0];
    if (!path) return html`<section class="strip empty" aria-label="Distance strip"><p class="lighter">No path at hand. Open a circuit, a fiber or a port, and its glass is drawn here to scale.</p></section>`;
    const curves = curvesOf(this.paths);
    return html`<section class=${this.folded ? "strip folded" : "strip"} aria-label="Distance strip">
      ${stripHead(this, path)}
      ${this.folded ? nothing : this.paper(path, curves)}
      ${this.folded ? nothing : html`<p class="strip-foot">${this.pointer === null ? html`<span class="lighter">Point at the strip or the map, or press the arrow keys here: distances and losses to that place.</span>` : readout(curves, this.pointer)}</p>`}
    </section>`;
  }

  /** @param {Path} path @param {import("./curve-field.js").Curve[]} curves @returns {unknown} */
  paper(path, curves) {
    const { window, size } = this;
    const axis = size.height - 20;
    const field = fieldOf(curves, window, this.stretch === null, LINE + 26, axis - 4);
    return html`<div class="strip-paper" role="slider" tabindex="0" aria-label="Place on the path" aria-orientation="horizontal"
      aria-valuemin="0" aria-valuemax=${Math.round(this.whole)} aria-valuenow=${Math.round(this.pointer ?? 0)} aria-valuetext=${spokenPlace(curves, this.pointer ?? 0, this.measure)}
      @pointermove=${this.hovered} @pointerleave=${() => (this.pinned ? undefined : this.point(null))} @click=${this.clicked} @keydown=${this.pressed}>
      <svg width=${size.width} height=${size.height} aria-hidden="true">
        ${path.track.length > 0 ? svg`${drawnCurves(curves, field, window)}${drawnLine(path, window)}${drawnAxis(path.track, this.measure, window, axis)}${drawnFaults(this.faults, window, axis)}${this.pointerMark(curves, field, window, axis)}` : nothing}
      </svg></div>`;
  }

  /**
   * @param {import("./curve-field.js").Curve[]} curves
   * @param {import("./curve-field.js").Field} field
   * @param {Window} window
   * @param {number} axis px
   * @returns {unknown}
   */
  pointerMark(curves, field, window, axis) {
    if (this.pointer === null || !window.holds(this.pointer)) return nothing;
    const glass = this.pointer;
    const x = window.x(glass);
    return svg`<g class=${this.pinned ? "pointer pinned" : "pointer"}><line x1=${x} y1=${LINE - 14} x2=${x} y2=${axis}></line><circle cx=${x} cy=${LINE} r="6"></circle>
      ${curves.map(({ curve }) => svg`<circle class="on-curve" cx=${x} cy=${yOf(field, lossAt(curve, glass))} r="2.5"></circle>`)}</g>`;
  }
}

customElements.define("sw-strip", StripView);
