/** Lists of circuits as people paste them: an alarm list, a column of a spreadsheet, a line of a message. */

/**
 * @typedef {object} Listed
 * @property {string[]} codes each once, in the order in which they came
 * @property {string[]} twice codes that came more than once
 */

/**
 * Reads a list: codes parted by commas, semicolons, spaces, tabs or lines; quotes round a code are not part of it.
 * @param {string} text
 * @returns {Listed}
 */
export function readList(text) {
  /** @type {Set<string>} */
  const codes = new Set();
  /** @type {Set<string>} */
  const twice = new Set();
  for (const each of text.split(/[\s,;]+/)) {
    const code = each.replace(/^["']+|["']+$/g, "");
    if (code === "") continue;
    if (codes.has(code)) twice.add(code);
    codes.add(code);
  }
  return { codes: [...codes], twice: [...twice] };
}

/**
 * Codes that stand in both lists: they say nothing, and one of the two is wrong.
 * @param {Listed} down
 * @param {Listed} up
 * @returns {string[]}
 */
export function inBoth(down, up) {
  const ups = new Set(up.codes);
  return down.codes.filter((code) => ups.has(code));
}

/**
 * Puts one code in place of another, wherever it stands as a whole in a list.
 * @param {string} text
 * @param {string} code
 * @param {string} better empty: the code is taken out
 * @returns {string}
 */
export function replaced(text, code, better) {
  return text
    .split(/([\s,;]+)/)
    .map((each) => (each.replace(/^["']+|["']+$/g, "") === code ? better : each))
    .join("");
}

/**
 * What is before the number at a code's end: circuits are mostly numbered, and lists of them come in such rows.
 * @param {string} code
 * @returns {string} e.g. PON-09- of PON-09-001; the whole code where it ends in no number
 */
export function stemOf(code) {
  return code.replace(/\d+[A-Za-z]?$/, "");
}

/** Changes that make two codes as unlike as any. */
const UNLIKE = 4;

/**
 * The known code that is most like one that is not known.
 * @param {string} code
 * @param {Iterable<string>} known
 * @returns {string | null} null where none is like it: 4 letters or more would have to change, or half of them
 */
export function nearestCode(code, known) {
  const wanted = code.toUpperCase();
  /** @type {string | null} */
  let nearest = null;
  let least = Math.min(UNLIKE, Math.ceil(code.length / 2));
  for (const each of known) {
    if (Math.abs(each.length - code.length) >= least) continue;
    const changes = changesBetween(wanted, each.toUpperCase(), least);
    if (changes >= least) continue;
    least = changes;
    nearest = each;
    if (least === 0) break;
  }
  return nearest;
}

/**
 * Letters to be changed, put in, left out or changed over with their neighbour, to make one word of another.
 * (The optimal string alignment distance.)
 * @param {string} one
 * @param {string} other
 * @param {number} enough from here on it no longer matters how many
 * @returns {number}
 */
export function changesBetween(one, other, enough) {
  const rows = [Array.from({ length: other.length + 1 }, (_, index) => index)];
  for (let row = 1; row <= one.length; row++) {
    const now = [row];
    for (let column = 1; column <= other.length; column++) now.push(leastChanges(one, other, row, column, rows, now));
    if (Math.min(...now) >= enough) return enough;
    rows.push(now);
  }
  return rows.at(-1)?.at(-1) ?? 0;
}

/**
 * @param {string} one
 * @param {string} other
 * @param {number} row letters of the one
 * @param {number} column letters of the other
 * @param {number[][]} rows of fewer letters of the one
 * @param {number[]} now this row, as far as it is known
 * @returns {number} changes between so many letters of each
 */
function leastChanges(one, other, row, column, rows, now) {
  const of = (/** @type {number} */ back, /** @type {number} */ at) => rows[row - back]?.[at] ?? Infinity;
  const same = one[row - 1] === other[column - 1] ? 0 : 1;
  const least = Math.min(of(1, column) + 1, (now[column - 1] ?? Infinity) + 1, of(1, column - 1) + same);
  const crossed = row > 1 && column > 1 && one[row - 1] === other[column - 2] && one[row - 2] === other[column - 1];
  return crossed ? Math.min(least, of(2, column - 2) + 1) : least;
}
