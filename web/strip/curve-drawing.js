import { nothing, svg } from "lit";
import { decimal, roundValues } from "../quantity/index.js";
import { lossAt } from "../path/index.js";
import { budgetOf, yOf } from "./curve-field.js";

/** @typedef {import("./window.js").Window} Window */
/** @typedef {import("./curve-field.js").Curve} Curve */
/** @typedef {import("./curve-field.js").Field} Field */

/**
 * The curves as computed steps and slopes, on a ground of dB lines.
 * @param {Curve[]} curves
 * @param {Field} field
 * @param {Window} window
 * @returns {unknown}
 */
export function drawnCurves(curves, field, window) {
  return svg`<g class="curves">${ground(field, window)}${budgetLine(curves, field, window)}
    ${curves.map((curve, index) => drawnCurve(curve, index, field, window))}${endLabels(curves, field, window)}</g>`;
}

/**
 * @param {Field} field
 * @param {Window} window
 * @returns {unknown}
 */
function ground(field, window) {
  const values = roundValues(field.least, field.most, Math.max(2, Math.floor((field.bottom - field.top) / 22)));
  const places = (values[1] ?? 1) - (values[0] ?? 0) < 0.1 ? 2 : (values[1] ?? 1) - (values[0] ?? 0) < 1 ? 1 : 0;
  return values.map((db) => svg`<line class="rule" x1=${window.left} y1=${yOf(field, db)} x2=${window.right} y2=${yOf(field, db)}></line>
    <text class="rule-label" x=${window.left - 6} y=${yOf(field, db) + 4}>${db === 0 ? "0 dB" : decimal(-db, places)}</text>`);
}

/**
 * @param {Curve[]} curves
 * @param {Field} field
 * @param {Window} window
 * @returns {unknown}
 */
function budgetLine(curves, field, window) {
  const path = curves[0]?.path;
  const allowed = path ? budgetOf(path) : null;
  if (allowed === null || allowed > field.most || allowed < field.least) return nothing;
  const y = yOf(field, allowed);
  return svg`<line class="budget-line" x1=${window.left} y1=${y} x2=${window.right} y2=${y}></line>
    <text class="budget-label" x=${window.left + 4} y=${y - 4}>budget ${decimal(allowed, 1)} dB${path?.budget?.class ? `, ${path.budget.class}` : ""}</text>`;
}

/**
 * @param {Curve} curve
 * @param {number} index
 * @param {Field} field
 * @param {Window} window
 * @returns {unknown}
 */
function drawnCurve({ curve }, index, field, window) {
  const inside = curve.filter(([glass]) => window.holds(glass));
  /** @type {Array<[number, number]>} */
  const points = [[window.from, lossAt(curve, window.from)], ...inside, [window.to, lossAt(curve, window.to)]];
  if (window.from === 0) points.shift();
  const d = points.map(([glass, db], at) => `${at === 0 ? "M" : "L"}${round(window.x(glass))} ${round(yOf(field, db))}`).join(" ");
  return svg`<path class=${`curve curve-${index % 4}`} d=${d}></path>`;
}

/**
 * @param {Curve[]} curves
 * @param {Field} field
 * @param {Window} window
 * @returns {unknown} wavelengths at the right side, pushed apart
 */
function endLabels(curves, field, window) {
  let last = -Infinity;
  const labels = curves.map(({ path, curve }, index) => ({ index, nm: path.wavelength_nm, y: yOf(field, lossAt(curve, window.to)) }));
  labels.sort((one, other) => one.y - other.y);
  return labels.map(({ index, nm, y }) => {
    const at = Math.max(y + 4, last + 13);
    last = at;
    return svg`<line class=${`curve curve-${index % 4}`} x1=${window.right + 4} y1=${at - 4} x2=${window.right + 20} y2=${at - 4}></line><text class="curve-label" x=${window.right + 24} y=${at}>${nm} nm</text>`;
  });
}

/** @param {number} px @returns {number} to a tenth */
function round(px) {
  return Math.round(px * 10) / 10;
}
