import { nothing, svg } from "lit";
import { LINE } from "./line-drawing.js";

/** @typedef {import("./window.js").Window} Window */

/**
 * A fault place on the path at hand.
 * @typedef {object} FaultMark
 * @property {number} glass metres of glass from the path's start
 * @property {number} within metres either side
 */

/**
 * Fault places on the path: a cross on the line, and a stroke at each end of the window down to the axis.
 * @param {FaultMark[]} faults
 * @param {Window} window
 * @param {number} axis px, where the axis lies
 * @returns {unknown}
 */
export function drawnFaults(faults, window, axis) {
  return faults.filter(({ glass, within }) => window.holds(glass, within)).map(({ glass, within }) => {
    const x = window.x(glass);
    const [from, to] = [Math.min(x - 2, window.x(glass - within)), Math.max(x + 2, window.x(glass + within))];
    return svg`<g class="fault-mark"><rect x=${from} y=${LINE - 14} width=${to - from} height=${axis - LINE + 14}></rect>
      <line x1=${from} y1=${LINE - 14} x2=${from} y2=${axis}></line><line x1=${to} y1=${LINE - 14} x2=${to} y2=${axis}></line>
      ${window.holds(glass) ? svg`<path class="cross" d=${`M${x - 6} ${LINE - 6} L${x + 6} ${LINE + 6} M${x + 6} ${LINE - 6} L${x - 6} ${LINE + 6}`}></path>` : nothing}</g>`;
  });
}
