/**
 * @typedef {object} Range numbers as the records write them: `7`, `1-12`, `12-1`
 * @property {number} first
 * @property {number} last below first where the range falls
 */

/**
 * @param {string} text
 * @returns {Range}
 */
export function parseRange(text) {
  const [first = NaN, last = first] = text.split("-").map(Number);
  return { first, last };
}

/**
 * @param {Range} range
 * @returns {number} how many numbers it holds
 */
export function rangeSize({ first, last }) {
  return Math.abs(last - first) + 1;
}

/**
 * @param {Range} range
 * @returns {string}
 */
export function formatRange({ first, last }) {
  return first === last ? String(first) : `${first}-${last}`;
}

/**
 * @param {Range} range
 * @param {number} number
 * @returns {boolean}
 */
export function rangeHolds({ first, last }, number) {
  return number >= Math.min(first, last) && number <= Math.max(first, last);
}
