import { Layer } from "leaflet";
import { Frame, Room } from "./frame.js";
import { inksOf } from "./inks.js";
import { paintBase, paintNames, paintPlaces } from "./paint-base.js";
import { paintSpans, paintStructures } from "./paint-plant.js";
import { SITE } from "./tags.js";
import { paintHandLines, paintHandSigns } from "./paint-hand.js";
import { paintMarkSigns, paintStretches } from "./paint-marks.js";

/** @typedef {import("./stock.js").Stock} Stock */
/** @typedef {import("./paint-hand.js").AtHand} AtHand */
/** @typedef {import("./paint-marks.js").DrawnMarks} DrawnMarks */

/**
 * The drawing on the map: two sheets of canvas over the screen, the plant and the lines at hand on the lower, the signs at
 * hand on the upper, so that a pointer that moves redraws the upper one alone. They stay with the screen and are drawn again as the map moves.
 */
export class Drawing extends Layer {
  /** @param {Stock} stock what is drawn */
  constructor(stock) {
    super();
    this.stock = stock;
    this.plant = sheetOfCanvas("map-plant");
    this.hand = sheetOfCanvas("map-hand");
    /** @type {AtHand} */
    this.atHand = { path: null, line: null, place: null, label: "", pointer: null, pointed: "" };
    /** @type {DrawnMarks} */
    this.marks = { stretches: [], faults: [] };
  }

  /**
   * @param {import("leaflet").Map} map
   * @returns {this}
   * @override
   */
  onAdd(map) {
    map.getContainer().append(this.plant, this.hand);
    map.on("move zoom viewreset resize", this.redraw, this);
    this.redraw();
    return this;
  }

  /**
   * @param {import("leaflet").Map} map
   * @returns {this}
   * @override
   */
  onRemove(map) {
    map.off("move zoom viewreset resize", this.redraw, this);
    this.plant.remove();
    this.hand.remove();
    return this;
  }

  /**
   * How the world lies on the screen at present.
   * @returns {Frame | null} null while the map has no size
   */
  frame() {
    const map = this._map;
    if (!map) return null;
    const { x: width, y: height } = map.getSize();
    const { min } = map.getPixelBounds();
    return min && width > 0 ? new Frame(map.getZoom(), min.x, min.y, width, height) : null;
  }

  /** Draws both sheets. */
  redraw() {
    const frame = this.frame();
    if (!frame) return;
    const inks = inksOf(this.plant);
    const canvas = cleared(this.plant, frame);
    if (!canvas) return;
    const room = new Room();
    paintBase(canvas, frame, inks, this.stock.base);
    paintSpans(canvas, frame, inks, this.stock.spans);
    paintHandLines(canvas, frame, inks, this.atHand);
    paintStretches(canvas, frame, inks, this.marks);
    const sites = this.stock.structures.filter((each) => each.importance >= SITE);
    const others = this.stock.structures.filter((each) => each.importance < SITE);
    paintStructures(canvas, frame, inks, sites, room);
    paintPlaces(canvas, frame, inks, this.stock.base, room);
    paintStructures(canvas, frame, inks, others, room);
    paintNames(canvas, frame, inks, this.stock.base, room);
    this.redrawHand();
  }

  /** Draws the upper sheet. */
  redrawHand() {
    const frame = this.frame();
    if (!frame) return;
    const canvas = cleared(this.hand, frame);
    if (!canvas) return;
    const inks = inksOf(this.hand);
    paintMarkSigns(canvas, frame, inks, this.marks);
    paintHandSigns(canvas, frame, inks, this.atHand);
  }
}

/**
 * @param {string} name its class
 * @returns {HTMLCanvasElement}
 */
function sheetOfCanvas(name) {
  const canvas = document.createElement("canvas");
  canvas.className = name;
  canvas.setAttribute("aria-hidden", "true");
  return canvas;
}

/**
 * Fits a sheet to the screen and wipes it.
 * @param {HTMLCanvasElement} sheet
 * @param {Frame} frame
 * @returns {CanvasRenderingContext2D | null} in CSS pixels
 */
function cleared(sheet, frame) {
  const ratio = globalThis.devicePixelRatio || 1;
  const [width, height] = [Math.round(frame.width * ratio), Math.round(frame.height * ratio)];
  if (sheet.width !== width || sheet.height !== height) {
    sheet.width = width;
    sheet.height = height;
  }
  const canvas = sheet.getContext("2d");
  canvas?.setTransform(ratio, 0, 0, ratio, 0, 0);
  canvas?.clearRect(0, 0, frame.width, frame.height);
  return canvas;
}
