/**
 * The part of a path that the strip shows, and how its glass lies on the paper.
 */
export class Window {
  /**
   * @param {number} from metres of glass at the left side
   * @param {number} to metres of glass at the right side, above from
   * @param {number} left px
   * @param {number} right px
   */
  constructor(from, to, left, right) {
    this.from = from;
    this.to = to;
    this.left = left;
    this.right = right;
  }

  /** @returns {number} px a metre */
  get scale() {
    return (this.right - this.left) / (this.to - this.from);
  }

  /** @param {number} glass metres @returns {number} px */
  x(glass) {
    return this.left + (glass - this.from) * this.scale;
  }

  /** @param {number} x px @returns {number} metres of glass, within the window */
  glass(x) {
    return Math.min(this.to, Math.max(this.from, this.from + (x - this.left) / this.scale));
  }

  /** @param {number} glass @param {number} [margin] metres @returns {boolean} */
  holds(glass, margin = 0) {
    return glass >= this.from - margin && glass <= this.to + margin;
  }
}

/** @typedef {{ from: number, to: number }} Stretch metres of glass */

/** The shortest stretch that is shown, metres. */
const SHORTEST = 20;

/**
 * Comes closer to a place, or goes farther, the place staying where it is.
 * @param {Stretch} stretch
 * @param {number} glass metres, the place
 * @param {number} factor below 1 comes closer
 * @param {number} whole metres of glass of the path
 * @returns {Stretch}
 */
export function zoomed(stretch, glass, factor, whole) {
  const length = Math.min(whole, Math.max(Math.min(SHORTEST, whole), (stretch.to - stretch.from) * factor));
  const share = (glass - stretch.from) / (stretch.to - stretch.from);
  return kept({ from: glass - length * share, to: glass + length * (1 - share) }, whole);
}

/**
 * Moves along the path.
 * @param {Stretch} stretch
 * @param {number} metres ahead
 * @param {number} whole metres of glass of the path
 * @returns {Stretch}
 */
export function moved(stretch, metres, whole) {
  return kept({ from: stretch.from + metres, to: stretch.to + metres }, whole);
}

/**
 * Moves only as far as a place needs to be seen.
 * @param {Stretch} stretch
 * @param {number} glass metres
 * @param {number} whole
 * @returns {Stretch}
 */
export function showing(stretch, glass, whole) {
  if (glass >= stretch.from && glass <= stretch.to) return stretch;
  const middle = (stretch.from + stretch.to) / 2;
  return moved(stretch, glass - middle, whole);
}

/**
 * @param {Stretch} stretch
 * @param {number} whole
 * @returns {Stretch} as long, and on the path
 */
function kept(stretch, whole) {
  const length = Math.min(whole, stretch.to - stretch.from);
  const from = Math.min(Math.max(0, stretch.from), whole - length);
  return { from, to: from + length };
}

/**
 * Chooses which labels are written: none overlaps one of more weight.
 * @template T
 * @param {Array<{ item: T, middle: number, width: number, weight: number }>} wanted
 * @param {number} left px
 * @param {number} right px
 * @returns {Array<{ item: T, middle: number }>} from left to right, each pushed inside the two sides
 */
export function withoutOverlap(wanted, left, right) {
  /** @type {Array<{ item: T, middle: number, width: number }>} */
  const placed = [];
  for (const { item, middle, width } of [...wanted].sort((one, other) => other.weight - one.weight)) {
    const inside = Math.min(right - width / 2, Math.max(left + width / 2, middle));
    if (placed.every((each) => Math.abs(each.middle - inside) >= (each.width + width) / 2 + 6)) placed.push({ item, middle: inside, width });
  }
  return placed.sort((one, other) => one.middle - other.middle);
}
