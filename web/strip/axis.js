import { svg } from "lit";
import { METRES_PER_FOOT, decimal, roundValues, units } from "../quantity/index.js";
import { glassAt, placeAt } from "../path/index.js";

/** @typedef {import("./window.js").Window} Window */
/** @typedef {import("../path/track.js").Measure} Measure */

/**
 * The distance axis: round values of the chosen measure, at the glass where they are reached.
 * @param {number[][]} track
 * @param {Measure} measure
 * @param {Window} window
 * @param {number} y px
 * @returns {unknown}
 */
export function drawnAxis(track, measure, window, y) {
  const each = units.unit === "m" ? 1 : METRES_PER_FOOT;
  const from = placeAt(track, window.from)[measure] / each;
  const to = placeAt(track, window.to)[measure] / each;
  const values = roundValues(from, to, Math.max(2, Math.floor((window.right - window.left) / 110)));
  return svg`<g class="axis"><line x1=${window.left} y1=${y} x2=${window.right} y2=${y}></line>
    ${values.map((value) => {
      const x = window.x(glassAt(track, measure, value * each));
      return svg`<line x1=${x} y1=${y} x2=${x} y2=${y + 5}></line><text x=${x} y=${y + 16}>${decimal(value, value % 1 === 0 ? 0 : 1)}</text>`;
    })}
    <text class="axis-unit" x=${window.right + 26} y=${y + 16}>${units.unit} ${measure}</text></g>`;
}
