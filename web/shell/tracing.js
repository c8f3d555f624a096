import { ask } from "../server/index.js";

/** @typedef {import("../server/contract.d.ts").TraceAnswer} TraceAnswer */
/** @typedef {import("../server/contract.d.ts").Path} Path */

/** Wavelengths always offered, nm. */
const USUAL = [1310, 1550];

/** At most so many wavelengths are drawn at once. */
export const MOST_WAVELENGTHS = 4;

/**
 * The paths of a trace, at one or several wavelengths.
 * @typedef {object} Traced
 * @property {string} trace `circuit:RC-01` ...
 * @property {Map<number, Path[]>} byWavelength in the order asked for; the paths of all are in the same order
 */

/**
 * Traces what is at hand.
 * @param {string} trace `circuit:RC-01`, `port:E1/P/1` or `fiber:F-1:3`
 * @param {number[]} wavelengths nm; empty for the path's own
 * @param {AbortSignal} signal
 * @returns {Promise<Traced>}
 */
export async function traced(trace, wavelengths, signal) {
  const at = trace.indexOf(":");
  const asked = { [trace.slice(0, at)]: trace.slice(at + 1) };
  const wanted = wavelengths.length > 0 ? wavelengths.slice(0, MOST_WAVELENGTHS) : [null];
  /** @type {TraceAnswer[]} */
  const answers = await Promise.all(wanted.map((wavelength) => ask("/trace", { ...asked, wavelength }, signal)));
  const byWavelength = new Map(answers.map((answer, index) => [wanted[index] ?? answer.paths[0]?.wavelength_nm ?? 1310, answer.paths]));
  return { trace, byWavelength };
}

/**
 * One path at each wavelength drawn.
 * @param {Traced | null} all
 * @param {number} index which path
 * @returns {Path[]}
 */
export function pathAtHand(all, index) {
  if (all === null) return [];
  return [...all.byWavelength.values()].map((paths) => paths[index] ?? paths[0]).filter((path) => path !== undefined);
}

/**
 * The wavelengths that may be drawn: those drawn, the records' own, the usual ones.
 * @param {Traced | null} all
 * @param {number[]} inUse nm
 * @returns {number[]} rising
 */
export function offeredWavelengths(all, inUse) {
  return [...new Set([...(all?.byWavelength.keys() ?? []), ...inUse, ...USUAL])].sort((one, other) => one - other);
}
