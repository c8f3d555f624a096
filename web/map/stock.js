import { ask, askAnytime } from "../server/index.js";
import { projectBase, projectPlant } from "./projected.js";

/** @typedef {import("./projected.js").DrawnBase} DrawnBase */
/** @typedef {import("./projected.js").DrawnSpan} DrawnSpan */
/** @typedef {import("./projected.js").DrawnStructure} DrawnStructure */

/** @typedef {{ west: number, south: number, east: number, north: number }} Box degrees */

/** How much more than the screen is asked for on each side, as a share of it. */
const BEYOND = 0.6;

/** After this long a request shows that it is under way, ms. */
const SLOW_MS = 1000;

/** What the map has fetched: the plant and the base map round about the screen. */
export class Stock {
  /** @param {() => void} changed is called when something came, did not come, or is overdue */
  constructor(changed) {
    this.changed = changed;
    /** @type {string} what went wrong with the last request */
    this.problem = "";
    /** @type {boolean} whether what was asked for is overdue */
    this.slow = false;
    /** @type {DrawnStructure[]} */
    this.structures = [];
    /** @type {DrawnSpan[]} */
    this.spans = [];
    /** @type {DrawnBase[]} */
    this.base = [];
    /** @type {boolean} whether the server left structures out */
    this.thinned = false;
    /** @type {Box | null} the box that is here */
    this.box = null;
    /** @type {number} */
    this.zoom = -1;
    /** @type {AbortController | null} */
    this.abort = null;
  }

  /** Forgets what is here, so that the next request asks anew. */
  forget() {
    this.box = null;
  }

  /**
   * Sees to it that the screen's box is here.
   * @param {Box} box
   * @param {number} zoom
   * @returns {Promise<void>}
   */
  async provide(box, zoom) {
    const level = Math.floor(zoom);
    if (this.box && level === this.zoom && within(box, this.box)) return;
    this.abort?.abort();
    const abort = new AbortController();
    this.abort = abort;
    const wide = widened(box);
    const params = { ...wide, zoom: level };
    const timer = setTimeout(() => this.overdue(abort), SLOW_MS);
    try {
      const [plant, base] = await Promise.all([ask("/map/plant", params, abort.signal), askAnytime("/map/base", params, abort.signal)]);
      Object.assign(this, projectPlant(plant));
      this.base = projectBase(base);
      this.thinned = plant.truncated;
      this.box = wide;
      this.zoom = level;
      this.problem = "";
    } catch (cause) {
      if (!abort.signal.aborted) this.problem = `The map could not be read: ${cause instanceof Error ? cause.message : String(cause)}`;
    } finally {
      clearTimeout(timer);
      if (this.abort === abort) this.settle();
    }
  }

  /** Stops the request under way; the map stays as it is. */
  stop() {
    this.abort?.abort();
    this.settle();
  }

  settle() {
    this.abort = null;
    this.slow = false;
    this.changed();
  }

  /** @param {AbortController} abort */
  overdue(abort) {
    if (this.abort !== abort) return;
    this.slow = true;
    this.changed();
  }
}

/**
 * @param {Box} box
 * @returns {Box} in whole ten-thousandths of a degree
 */
function widened(box) {
  const [dx, dy] = [(box.east - box.west) * BEYOND, (box.north - box.south) * BEYOND];
  const round = (/** @type {number} */ degrees) => Number(degrees.toFixed(4));
  return {
    west: round(Math.max(-180, box.west - dx)),
    south: round(Math.max(-90, box.south - dy)),
    east: round(Math.min(180, box.east + dx)),
    north: round(Math.min(90, box.north + dy)),
  };
}

/**
 * @param {Box} inner
 * @param {Box} outer
 * @returns {boolean}
 */
function within(inner, outer) {
  return inner.west >= outer.west && inner.east <= outer.east && inner.south >= outer.south && inner.north <= outer.north;
}
