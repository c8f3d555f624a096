import { LitElement, html, nothing } from "lit";
import { Map as LeafletMap, TileLayer } from "leaflet";
import { UnitController, inWords, length, units } from "../quantity/index.js";
import { hrefTo } from "../address/index.js";
import { nearestOn, placeAt } from "../path/index.js";
import { Drawing } from "./drawing.js";
import { Stock } from "./stock.js";
import { hitAt } from "./nearest.js";
import { legend } from "./legend.js";
import { scaleBar } from "./scale-bar.js";
import { bringToView, fit, fitExtent, standpointOf } from "./camera.js";
import { projectMarks } from "./paint-marks.js";
import { worldLine, worldSpot } from "./projected.js";

/** @typedef {import("../server/contract.d.ts").Status} Status */
/** @typedef {import("../server/contract.d.ts").Path} Path */
/** @typedef {import("../plant/record-view.js").Shown} Shown */

/** How near the path the pointer must be to be on it, px. */
const ON_PATH = 18;

/** The map: base map, plant, and what is at hand. */
export class MapView extends LitElement {
  /** @override */
  static properties = {
    status: { attribute: false }, path: { attribute: false }, shown: { attribute: false }, marks: { attribute: false }, pointer: { attribute: false }, measure: { attribute: false },
    standpoint: { attribute: false }, stamp: { attribute: false }, tilesOn: { state: true }, over: { state: true },
  };

  constructor() {
    super();
    /** @type {Status | null} */
    this.status = null;
    /** @type {Path | null} the path at hand */
    this.path = null;
    /** @type {Shown | null} the thing that is open */
    this.shown = null;
    /** @type {import("./paint-marks.js").Marks | null} what a desk draws upon the plant */
    this.marks = null;
    /** @type {number | null} glass from the path's start */
    this.pointer = null;
    /** @type {import("../path/track.js").Measure} how far along the path is said */
    this.measure = "glass";
    /** @type {import("./camera.js").Standpoint | null} where the map was left, until something else is opened */
    this.standpoint = null;
    /** @type {string} from which records; another one fetches anew */
    this.stamp = "";
    this.tilesOn = false;
    /** @type {string} what a click would open */
    this.over = "";
    /** @type {LeafletMap | null} */
    this.map = null;
    this.stock = new Stock(() => this.stocked());
    this.drawing = new Drawing(this.stock);
    /** @type {TileLayer | null} */
    this.tiles = null;
    /** @type {(() => void) | null} the move that waits for the map to be placed */
    this.wanted = null;
    new UnitController(this);
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  /** @override */
  firstUpdated() {
    const ground = /** @type {HTMLElement} */ (this.querySelector(".map-ground"));
    const map = new LeafletMap(ground, { zoomControl: false, attributionControl: false, zoomAnimation: false, fadeAnimation: false, markerZoomAnimation: false, inertia: false, zoomSnap: 0.25, wheelPxPerZoomLevel: 90, minZoom: 3, maxZoom: 20 });
    this.map = map;
    map.on("moveend", () => this.moved());
    map.on("click", (event) => this.clicked(event.containerPoint));
    map.on("mousemove", (event) => this.hovered(event));
    map.on("mouseout", () => this.hoverOver(""));
    ground.addEventListener("keydown", (event) => this.pressed(event));
    new ResizeObserver(() => map.invalidateSize({ animate: false, pan: false })).observe(ground);
  }

  /** @param {import("lit").PropertyValues} changed @override */
  updated(changed) {
    const { map } = this;
    if (!map) return;
    if (changed.has("status") && this.status) this.begin(map, this.status);
    if (changed.has("stamp")) {
      this.stock.forget();
      if (this.drawing.frame()) this.moved();
    }
    if (changed.has("path")) this.takePath(map);
    if (changed.has("shown")) this.takeShown(map);
    if (changed.has("marks")) this.takeMarks(map, changed.get("marks"));
    if (changed.has("pointer") || changed.has("path") || this.pointer !== null) this.takePointer();
  }

  /** @param {LeafletMap} map @param {Status} status */
  begin(map, status) {
    if (this.drawing.frame()) return;
    if (this.standpoint) map.setView([this.standpoint.lat, this.standpoint.lon], this.standpoint.zoom);
    else if (status.extent) fitExtent(map, status.extent);
    else map.setView([0, 0], 3);
    this.drawing.addTo(map);
    if (this.standpoint === null) this.wanted?.();
    this.moved();
  }

  /** Shows all the plant. */
  whole() {
    if (this.map && this.status?.extent) fitExtent(this.map, this.status.extent);
  }

  /** Shows all the path at hand. */
  wholePath() {
    if (this.map && this.path && this.path.track.length > 0) fit(this.map, pointsOf(this.path));
  }

  /** @override */
  focus() {
    /** @type {HTMLElement | null} */ (this.querySelector(".map-ground"))?.focus();
  }

  /** Draws again with the style sheet's present colours. */
  recolor() {
    this.drawing.redraw();
  }

  /** @param {LeafletMap} map */
  takePath(map) {
    const { path } = this;
    const known = path !== null && path.track.length > 0;
    this.drawing.atHand.path = known ? worldLine(pointsOf(path)) : null;
    if (known) this.afterLayout(() => fit(map, pointsOf(path)));
    this.drawing.redraw();
  }

  /** @param {LeafletMap} map */
  takeShown(map) {
    const hand = this.drawing.atHand;
    const points = this.shown?.points ?? [];
    const [lon = 0, lat = 0] = points[0] ?? [];
    hand.line = points.length > 1 ? worldLine(points) : null;
    hand.place = points.length === 1 ? worldSpot(lon, lat) : null;
    hand.label = this.shown?.label ?? "";
    if (points.length > 0) this.afterLayout(() => bringToView(map, points));
    this.drawing.redraw();
  }

  /** @param {LeafletMap} map @param {import("./paint-marks.js").Marks | null | undefined} before */
  takeMarks(map, before) {
    this.drawing.marks = projectMarks(this.marks);
    const focus = this.marks?.focus ?? [];
    if (focus.length > 0 && String(focus) !== String(before?.focus)) this.afterLayout(() => bringToView(map, focus));
    this.drawing.redraw();
  }

  /**
   * Moves the map once its place on the page is settled: a strip that comes up takes room from it. Where the page opens
   * as it was left, the map stays where it was left.
   * @param {() => void} move
   */
  afterLayout(move) {
    const stays = this.standpoint !== null;
    requestAnimationFrame(() => {
      this.map?.invalidateSize({ animate: false, pan: false });
      if (this.drawing.frame()) {
        if (!stays) move();
      } else this.wanted = move;
    });
  }

  takePointer() {
    const hand = this.drawing.atHand;
    const track = this.path?.track ?? [];
    if (this.pointer === null || track.length === 0) hand.pointer = null;
    else {
      const place = placeAt(track, this.pointer);
      hand.pointer = worldSpot(place.lon, place.lat);
      hand.pointed = `${inWords(length(place[this.measure], units.unit))} ${this.measure}`;
    }
    this.drawing.redrawHand();
  }

  moved() {
    const { map } = this;
    if (!map || !this.drawing.frame()) return;
    const bounds = map.getBounds();
    const box = { west: bounds.getWest(), south: bounds.getSouth(), east: bounds.getEast(), north: bounds.getNorth() };
    void this.stock.provide(box, map.getZoom());
    this.dispatchEvent(new CustomEvent("sw-stand", { bubbles: true, detail: standpointOf(map) }));
    this.requestUpdate();
  }

  stocked() {
    this.drawing.redraw();
    this.requestUpdate();
  }

  /** @param {{ x: number, y: number }} at @param {number} [further] */
  hit({ x, y }, further = 0) {
    const frame = this.drawing.frame();
    return frame ? hitAt(frame, this.stock.structures, this.stock.spans, x, y, further) : null;
  }

  /** @param {{ x: number, y: number }} at @param {number} [further] */
  clicked(at, further = 0) {
    const hit = this.hit(at, further);
    if (hit) location.hash = hrefTo(hit.view, hit.code);
  }

  /** @param {import("leaflet").LeafletMouseEvent} event */
  hovered(event) {
    const hit = this.hit(event.containerPoint);
    this.hoverOver(hit ? `${hit.code}, ${hit.kind}` : "");
    const { map, path } = this;
    if (!map || !path) return;
    const near = nearestOn(path.track, event.latlng.lng, event.latlng.lat);
    const degreesPerPixel = (360 / (256 * 2 ** map.getZoom())) * Math.cos((event.latlng.lat * Math.PI) / 180);
    if (near && near.degrees < ON_PATH * degreesPerPixel) this.dispatchEvent(new CustomEvent("sw-point", { bubbles: true, detail: near.glass }));
  }

  /** @param {string} over */
  hoverOver(over) {
    this.over = over;
    this.map?.getContainer().classList.toggle("over-plant", over !== "");
  }

  /** @param {KeyboardEvent} event */
  pressed(event) {
    const size = this.map?.getSize();
    if (event.key !== "Enter" || !size) return;
    event.preventDefault();
    this.clicked({ x: size.x / 2, y: size.y / 2 }, 60);
  }

  /** @param {boolean} on */
  setTiles(on) {
    const tile = this.status?.tile;
    this.tilesOn = on;
    this.tiles?.remove();
    this.tiles = on && tile && this.map ? new TileLayer(tile.url, { maxZoom: 20 }).addTo(this.map) : null;
  }

  /** @override */
  render() {
    const tile = this.status?.tile ?? null;
    return html`<div class="map-ground" role="application" aria-label="Map. Arrow keys move it, plus and minus come closer and go farther, Enter opens what is nearest the middle."></div>
      <div class="map-middle" aria-hidden="true"></div>
      <div class="map-buttons"><button type="button" @click=${() => this.map?.zoomIn(1)}>Closer</button><button type="button" @click=${() => this.map?.zoomOut(1)}>Farther</button>
        <button type="button" @click=${() => this.whole()}>Whole</button>${this.path ? html`<button type="button" @click=${() => this.wholePath()}>Path</button>` : nothing}</div>
      <p class="map-over" aria-hidden="true">${this.over}</p>
      ${legend(this.stock.thinned, tile, this.tilesOn, (on) => this.setTiles(on))}
      ${this.stock.problem ? html`<p class="problem map-problem" role="alert">${this.stock.problem}</p>` : nothing}
      ${this.stock.slow ? html`<p class="waiting map-problem" role="status">Reading the map <progress></progress> <button type="button" @click=${() => this.stock.stop()}>Stop</button></p>` : nothing}
      ${scaleBar(this.map, this.drawing.frame() !== null)}
      <p class="safety">Positions are records, not a locate. Call before you dig. Treat every fiber as live until proven dark. Follow local codes and licensed practice.${this.tilesOn && tile ? ` Tiles: ${tile.attribution}.` : ""}</p>`;
  }
}

/**
 * @param {Path} path
 * @returns {number[][]}
 */
function pointsOf(path) {
  return path.track.map(([, , , lon = 0, lat = 0]) => [lon, lat]);
}

customElements.define("sw-map", MapView);
