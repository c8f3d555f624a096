import { ask } from "../server/index.js";
import { nearestCode, stemOf } from "./lists.js";

/** @typedef {import("../server/contract.d.ts").CircuitList} CircuitList */

/**
 * A code that the records do not hold.
 * @typedef {object} Stranger
 * @property {string} code
 * @property {string | null} nearest the known code most like it; null where none is
 */

/** Circuits asked for at once. */
const PAGE = 1000;

/** Circuits that begin alike are looked through for the nearest code up to so many. */
const MOST = 5000;

/**
 * The codes of a list that the records do not hold, each with the nearest that they do.
 * Only circuits whose codes begin as the listed ones do are asked for, so that the lists may come from large records.
 * @param {string[]} codes
 * @param {AbortSignal} signal
 * @returns {Promise<Stranger[]>} in the order of the list
 */
export async function strangers(codes, signal) {
  const stems = [...new Set(codes.map(stemOf))];
  const known = new Set((await Promise.all(stems.map((stem) => beginning(stem, Infinity, signal)))).flat());
  const missing = codes.filter((code) => !known.has(code));
  return Promise.all(missing.map(async (code) => ({ code, nearest: await nearest(code, signal) })));
}

/**
 * The nearest known code: among those that begin with the same letters, else with the first letter, else among all.
 * @param {string} code
 * @param {AbortSignal} signal
 * @returns {Promise<string | null>}
 */
async function nearest(code, signal) {
  for (const stem of new Set([stemOf(code), code.match(/^[A-Za-z]+/)?.[0] ?? "", code.slice(0, 1), ""])) {
    const found = nearestCode(code, await beginning(stem, MOST, signal));
    if (found !== null) return found;
  }
  return null;
}

/**
 * Codes of circuits that begin so.
 * @param {string} prefix
 * @param {number} most
 * @param {AbortSignal} signal
 * @returns {Promise<string[]>}
 */
async function beginning(prefix, most, signal) {
  /** @type {string[]} */
  const codes = [];
  /** @type {string | null} */
  let after = null;
  do {
    /** @type {CircuitList} */
    const page = await ask("/circuits", { prefix, limit: PAGE, after }, signal);
    codes.push(...page.circuits.map((each) => each.circuit));
    after = page.next;
  } while (after !== null && codes.length < most);
  return codes;
}
