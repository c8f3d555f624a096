import { currentAddress, formatAddress } from "../address/index.js";

/** @typedef {import("../address/address.js").Asked} Asked */

/** The parts of the desk, in the order in which the job is done. @type {ReadonlyArray<{ part: string, word: string }>} */
export const PARTS = Object.freeze([
  { part: "alarms", word: "Alarms" },
  { part: "reading", word: "Reading" },
  { part: "down", word: "Who is down" },
  { part: "light", word: "Temporary paths" },
  { part: "incident", word: "Incident" },
]);

/**
 * The part that an address opens.
 * @param {string} code
 * @returns {string} the first where it names none
 */
export function partOf(code) {
  return (PARTS.find(({ part }) => part === code) ?? PARTS[0])?.part ?? "";
}

/**
 * The address of a part, with everything at hand kept.
 * @param {string} part
 * @returns {string} with its #
 */
export function hrefToPart(part) {
  const here = currentAddress();
  return formatAddress({ ...here, view: "outage", code: part, asked: here.view === "outage" ? here.asked : [] });
}
