/** @typedef {import("./enclosure-layout.js").Point} Point */
/** @typedef {import("./enclosure-layout.js").Box} Box */

/**
 * @typedef {object} Wanted a label that seeks a place on a curve
 * @property {string} text
 * @property {string} more second part, lighter
 * @property {(t: number) => Point} along the curve, t from 0 to 1
 * @property {number} weight the heaviest is placed first
 */

/** @typedef {{ text: string, more: string, x: number, y: number }} Placed */

/** Places tried on each curve, in this order. */
const TRIES = [0.5, 0.4, 0.6, 0.3, 0.7, 0.22, 0.78];

/** Width of a letter and height of a line, px. */
const LETTER = 5.6;
const LINE = 13;

/**
 * Gives labels places where none covers another or a box; those without room are left out (the list below has them).
 * @param {Wanted[]} wanted
 * @param {Box[]} boxes
 * @returns {Placed[]}
 */
export function placeLabels(wanted, boxes) {
  /** @type {Array<{ x: number, y: number, width: number, height: number }>} */
  const taken = boxes.map(({ x, y, width, height }) => ({ x, y, width, height }));
  /** @type {Placed[]} */
  const placed = [];
  for (const label of [...wanted].sort((one, other) => other.weight - one.weight)) {
    const width = (label.text.length + label.more.length) * LETTER;
    const spot = TRIES.map(label.along).find(({ x, y }) => taken.every((each) => free(each, { x, y, width, height: LINE })));
    if (!spot) continue;
    taken.push({ ...spot, width, height: LINE });
    placed.push({ text: label.text, more: label.more, ...spot });
  }
  return placed;
}

/**
 * @param {{ x: number, y: number, width: number, height: number }} one by its middle
 * @param {{ x: number, y: number, width: number, height: number }} other
 * @returns {boolean} whether they do not touch
 */
function free(one, other) {
  return Math.abs(one.x - other.x) * 2 >= one.width + other.width || Math.abs(one.y - other.y) * 2 >= one.height + other.height;
}
