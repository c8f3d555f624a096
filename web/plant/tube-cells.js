import { parseRange, rangeHolds } from "../quantity/index.js";
import { strongestUse } from "./uses.js";

/** @typedef {import("../server/contract.d.ts").CableSection} CableSection */
/** @typedef {CableSection["uses"][number]} UseRange */

/**
 * What is known of one fiber in the sections asked of.
 * @param {CableSection[]} sections
 * @param {number} fiber
 * @returns {UseRange | null} the range that stands for it
 */
export function useOf(sections, fiber) {
  const ranges = sections.flatMap((section) => section.uses.filter((each) => rangeHolds(parseRange(each.fibers), fiber)));
  if (ranges.length === 0) return null;
  const strongest = strongestUse(ranges.map((each) => each.use));
  return ranges.find((each) => each.use === strongest) ?? null;
}
