/** @typedef {import("../server/contract.d.ts").FiberUse} FiberUse */
/** @typedef {import("../server/contract.d.ts").UseCounts} UseCounts */

/**
 * What a fiber is used for: the letter in its cell of the tube chart, and its words.
 * Ordered so that the first of several uses along a cable is the one that a person must know of.
 * @type {ReadonlyArray<{ use: FiberUse, letter: string, words: string }>}
 */
export const USES = Object.freeze([
  { use: "dead", letter: "D", words: "dead" },
  { use: "suspect", letter: "?", words: "suspect" },
  { use: "in_use", letter: "U", words: "in use" },
  { use: "jumpered", letter: "J", words: "jumpered, no circuit known" },
  { use: "leased", letter: "L", words: "leased" },
  { use: "reserved", letter: "R", words: "reserved" },
  { use: "spare_unknown", letter: "n", words: "spare of unknown trust" },
  { use: "spare", letter: "", words: "spare" },
  { use: "spare_verified", letter: "✓", words: "verified spare" },
]);

/**
 * @param {FiberUse} use
 * @returns {{ use: FiberUse, letter: string, words: string }}
 */
export function useSign(use) {
  return USES.find((each) => each.use === use) ?? { use, letter: "n", words: "not known" };
}

/**
 * The use that stands for several along a cable.
 * @param {FiberUse[]} uses at least one
 * @returns {FiberUse}
 */
export function strongestUse(uses) {
  return USES.find((each) => uses.includes(each.use))?.use ?? "spare_unknown";
}

/**
 * Counts of fibers by use.
 * @param {UseCounts} counts
 * @returns {string} e.g. 24 in use, 12 spare
 */
export function usesInWords(counts) {
  const said = USES.filter((each) => counts[each.use] > 0).map((each) => `${counts[each.use]} ${each.words}`);
  return said.length > 0 ? said.join(", ") : "none known";
}
