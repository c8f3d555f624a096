/** @typedef {{ west: number, east: number, north: number, south: number }} Box on the world's square, north above south */

/**
 * The box round lines.
 * @param {Float64Array[]} lines x and y in turn, on the world's square
 * @returns {Box}
 */
export function boxOf(lines) {
  const box = { west: Infinity, east: -Infinity, north: Infinity, south: -Infinity };
  for (const line of lines) {
    for (let index = 0; index < line.length; index += 2) {
      const x = line[index] ?? 0;
      const y = line[index + 1] ?? 0;
      if (x < box.west) box.west = x;
      if (x > box.east) box.east = x;
      if (y < box.north) box.north = y;
      if (y > box.south) box.south = y;
    }
  }
  return box;
}

/**
 * How the world's square lies on the screen at one moment.
 */
export class Frame {
  /**
   * @param {number} zoom
   * @param {number} left pixel x of the screen's left side, at this zoom
   * @param {number} top pixel y of the screen's upper side
   * @param {number} width px
   * @param {number} height px
   */
  constructor(zoom, left, top, width, height) {
    this.zoom = zoom;
    this.scale = 2 ** zoom;
    this.left = left;
    this.top = top;
    this.width = width;
    this.height = height;
  }

  /** @param {number} x on the world's square @returns {number} px from the screen's left */
  x(x) {
    return x * this.scale - this.left;
  }

  /** @param {number} y on the world's square @returns {number} px from the screen's top */
  y(y) {
    return y * this.scale - this.top;
  }

  /**
   * @param {number} x px
   * @param {number} y px
   * @param {number} margin px
   * @returns {boolean} whether a point of the screen is within it, or at most so far outside
   */
  holds(x, y, margin) {
    return x >= -margin && y >= -margin && x <= this.width + margin && y <= this.height + margin;
  }

  /**
   * Whether anything within a box can be on the screen.
   * @param {Box} box on the world's square
   * @returns {boolean}
   */
  meets({ west, east, north, south }) {
    return this.x(east) >= 0 && this.y(south) >= 0 && this.x(west) <= this.width && this.y(north) <= this.height;
  }

  /**
   * Adds a line to the present path of a canvas.
   * @param {CanvasRenderingContext2D} canvas
   * @param {Float64Array} line on the world's square
   */
  trace(canvas, line) {
    canvas.moveTo(this.x(line[0] ?? 0), this.y(line[1] ?? 0));
    for (let index = 2; index < line.length; index += 2) canvas.lineTo(this.x(line[index] ?? 0), this.y(line[index + 1] ?? 0));
  }
}

/** Room on a drawing: rectangles that are taken. */
export class Room {
  constructor() {
    /** @type {Map<number, Array<[number, number, number, number]>>} by cell */
    this.cells = new Map();
  }

  /**
   * Takes a rectangle if nothing is there yet.
   * @param {number} left px
   * @param {number} top px
   * @param {number} right px
   * @param {number} bottom px
   * @returns {boolean} whether it was free
   */
  take(left, top, right, bottom) {
    /** @type {Array<Array<[number, number, number, number]>>} */
    const lists = [];
    for (let column = Math.floor(left / 64); column <= Math.floor(right / 64); column++) {
      for (let row = Math.floor(top / 64); row <= Math.floor(bottom / 64); row++) {
        const list = this.cell(column, row);
        if (list.some(([l, t, r, b]) => l < right && r > left && t < bottom && b > top)) return false;
        lists.push(list);
      }
    }
    for (const list of lists) list.push([left, top, right, bottom]);
    return true;
  }

  /**
   * @param {number} x px
   * @param {number} y px
   * @returns {boolean} whether something is there
   */
  taken(x, y) {
    return this.cell(Math.floor(x / 64), Math.floor(y / 64)).some(([l, t, r, b]) => l < x && r > x && t < y && b > y);
  }

  /** @param {number} column @param {number} row @returns {Array<[number, number, number, number]>} */
  cell(column, row) {
    const key = (column + 1000) * 4096 + row + 1000;
    const list = this.cells.get(key);
    if (list) return list;
    /** @type {Array<[number, number, number, number]>} */
    const fresh = [];
    this.cells.set(key, fresh);
    return fresh;
  }
}
