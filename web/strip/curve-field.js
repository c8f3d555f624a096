import { lossAt, powerCurve } from "../path/index.js";

/** @typedef {import("./window.js").Window} Window */
/** @typedef {import("../server/contract.d.ts").Path} Path */

/** @typedef {{ path: Path, curve: Array<[number, number]> }} Curve */

/**
 * @typedef {object} Field the place of the curves on the paper
 * @property {number} top px
 * @property {number} bottom px
 * @property {number} least dB at the top
 * @property {number} most dB at the bottom
 */

/**
 * The power curves of a path at several wavelengths.
 * @param {Path[]} paths one a wavelength
 * @returns {Curve[]}
 */
export function curvesOf(paths) {
  return paths.map((path) => ({ path, curve: powerCurve(path) }));
}

/**
 * Fits what of the curves is in the window; from the path's start on, and with the budget where it is not far below, as
 * long as the whole path is shown.
 * @param {Curve[]} curves
 * @param {Window} window
 * @param {boolean} whole whether the whole path is shown
 * @param {number} top px
 * @param {number} bottom px
 * @returns {Field}
 */
export function fieldOf(curves, window, whole, top, bottom) {
  const lost = Math.max(0.1, ...curves.map(({ curve }) => lossAt(curve, window.to)));
  if (!whole) {
    const before = Math.min(...curves.map(({ curve }) => lossAt(curve, Math.max(0, window.from - 0.001))));
    const margin = Math.max(0.05, (lost - before) * 0.08);
    return { top, bottom, least: Math.max(0, before - margin), most: lost + margin };
  }
  const allowed = curves.map(({ path }) => budgetOf(path)).filter((each) => each !== null);
  return { top, bottom, least: 0, most: Math.max(lost, ...allowed.filter((each) => each < lost * 2.2)) * 1.06 };
}

/**
 * What a path may lose.
 * @param {Path} path
 * @returns {number | null} dB that the path may lose
 */
export function budgetOf({ budget }) {
  return budget === null ? null : budget.max_db - budget.margin_db;
}

/**
 * Where a loss lies on the paper.
 * @param {Field} field
 * @param {number} db
 * @returns {number} px
 */
export function yOf(field, db) {
  return field.top + ((db - field.least) / (field.most - field.least)) * (field.bottom - field.top);
}
