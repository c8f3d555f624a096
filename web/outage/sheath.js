/** @typedef {import("../server/contract.d.ts").ImpactAnswer} ImpactAnswer */
/** @typedef {NonNullable<ImpactAnswer["sheath"]>[number]} Sheath */
/** @typedef {Sheath["fibers"][number]} SheathFiber */

/**
 * A tube of a cut sheath.
 * @typedef {object} Tube
 * @property {number} tube
 * @property {string} color
 * @property {SheathFiber[]} fibers by number
 * @property {number | null} priority the first to be restored; null where no fiber carries a working circuit
 * @property {number} down fibers whose service is down
 * @property {number} single fibers whose service works unprotected
 * @property {boolean} first whether it holds what is to be restored first of the whole sheath
 */

/** Stands for the priority of a tube that has none. */
const LAST = 99;

/**
 * The tubes of a sheath in the order to splice them: crews finish tube by tube, so the tube that holds what is to be
 * restored first comes first; of several such, the one with more circuits down.
 * @param {Sheath} sheath
 * @returns {Tube[]}
 */
export function tubesOf(sheath) {
  /** @type {Map<number, Tube>} */
  const tubes = new Map();
  for (const fiber of sheath.fibers) {
    const tube = tubes.get(fiber.tube) ?? { tube: fiber.tube, color: fiber.tube_color, fibers: [], priority: null, down: 0, single: 0, first: false };
    tubes.set(fiber.tube, tube);
    tube.fibers.push(fiber);
    if (fiber.state === "down") tube.down += 1;
    if (fiber.state === "single") tube.single += 1;
    if (fiber.priority !== null && (tube.priority === null || fiber.priority < tube.priority)) tube.priority = fiber.priority;
  }
  const sorted = [...tubes.values()].sort(before);
  if (sorted[0]) sorted[0].first = true;
  return sorted;
}

/**
 * @param {Tube} one
 * @param {Tube} other
 * @returns {number} below 0 where the one is spliced before the other
 */
function before(one, other) {
  return (one.priority ?? LAST) - (other.priority ?? LAST) || firstDown(other) - firstDown(one) || one.tube - other.tube;
}

/**
 * @param {Tube} tube
 * @returns {number} how many circuits are down on its fibers of its first priority
 */
function firstDown(tube) {
  return tube.fibers.filter((fiber) => fiber.state === "down" && fiber.priority === tube.priority).reduce((sum, fiber) => sum + fiber.carries.length, 0);
}
