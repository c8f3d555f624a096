/**
 * Round steps for an axis: 1, 2 or 5 times a power of ten.
 * @param {number} span length of the axis in its unit, above 0
 * @param {number} most at most this many steps, 1 or more
 * @returns {number} the step, in the axis's unit
 */
export function roundStep(span, most) {
  const raw = span / most;
  const power = 10 ** Math.floor(Math.log10(raw));
  const factor = [1, 2, 5, 10].find((each) => each * power >= raw * (1 - 1e-9)) ?? 10;
  return factor * power;
}

/**
 * The round values of an axis between two ends.
 * @param {number} from
 * @param {number} to at or above from
 * @param {number} most at most this many steps
 * @returns {number[]} rising
 */
export function roundValues(from, to, most) {
  if (!(to > from)) return [];
  const step = roundStep(to - from, most);
  const first = Math.ceil(from / step - 1e-9);
  const last = Math.floor(to / step + 1e-9);
  return Array.from({ length: last - first + 1 }, (_, index) => (first + index) * step);
}
