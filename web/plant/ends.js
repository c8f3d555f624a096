import { parseRange } from "../quantity/index.js";

/** @typedef {import("../server/contract.d.ts").Leg} Leg */

/**
 * The tube that a range of fibers lies in.
 * @param {Leg} leg
 * @param {string} numbers
 * @returns {number | null} null where it lies in several
 */
export function tubeOf(leg, numbers) {
  const { first, last } = parseRange(numbers);
  const tube = Math.ceil(first / leg.fibers_per_tube);
  return tube === Math.ceil(last / leg.fibers_per_tube) ? tube : null;
}

/**
 * The colour and place in its tube of a fiber.
 * @param {Leg} leg
 * @param {number} fiber
 * @returns {{ tube: number, tubeColor: string, color: string }}
 */
export function fiberOf(leg, fiber) {
  const tube = Math.ceil(fiber / leg.fibers_per_tube);
  return { tube, tubeColor: leg.tube_colors[tube - 1] ?? "", color: leg.fiber_colors[(fiber - 1) % leg.fibers_per_tube] ?? "" };
}
