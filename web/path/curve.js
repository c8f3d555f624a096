/** @typedef {import("../server/contract.d.ts").Path} Path */
/** @typedef {import("../server/contract.d.ts").Element} Element */

/**
 * The power curve of a path: loss so far against glass, steps at joints and slopes along glass.
 * @param {Path} path
 * @returns {Array<[number, number]>} points [glass m, loss dB so far], in order; begins at 0, 0
 */
export function powerCurve(path) {
  /** @type {Array<[number, number]>} */
  const points = [[0, 0]];
  let lost = 0;
  for (const element of path.elements) {
    if (element.kind === "through") continue;
    const from = element.glass_from_m;
    if (points.at(-1)?.[0] !== from) points.push([from, lost]);
    lost += element.loss_db;
    points.push([from + glassOf(element), lost]);
  }
  return points;
}

/**
 * The loss from the path's start to a place.
 * @param {Array<[number, number]>} curve
 * @param {number} glass metres
 * @returns {number} dB; at a joint, the joint's loss is in
 */
export function lossAt(curve, glass) {
  let before = curve[0] ?? [0, 0];
  for (const point of curve) {
    if (point[0] > glass) {
      const share = (glass - before[0]) / (point[0] - before[0]);
      return before[1] + (point[1] - before[1]) * share;
    }
    before = point;
  }
  return before[1];
}

/**
 * @param {Element} element
 * @returns {number} metres of glass in it
 */
export function glassOf(element) {
  return element.kind === "fiber" || element.kind === "jumper" ? element.glass_m : 0;
}
