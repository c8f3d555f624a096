/**
 * @typedef {import("../server/contract.d.ts").PostingRef} PostingRef
 */

/**
 * Where a number comes from.
 * @typedef {object} Basis
 * @property {string} how a basis of the contract (`measured`, `planning`, `marks`, ...), or `sum`
 * @property {string} [source] who measured it and when, or the published source; what it was reckoned from
 * @property {string | null} [trust]
 * @property {string | null} [verifiedOn] date
 * @property {PostingRef | null} [changed] the posting that it was last changed by
 * @property {Part[]} [parts] what it is made up of, each with its own length
 */

/** @typedef {{ what: string, metres: number }} Part */

/** @type {Readonly<Record<string, string>>} */
const WORDS = Object.freeze({
  measured: "measured",
  planning: "a planning value, not measured",
  type: "the fiber type's table, not measured",
  sheet: "the reel's own sheet",
  none: "nothing is lost here",
  marks: "sheath marks read in the field",
  nominal: "route length and coils, no sheath marks",
  geodesic: "the line on the map, WGS 84",
  recorded: "as entered in the records",
  sum: "a sum over the path",
  counted: "counted from the records",
  reading: "an instrument's reading, laid along the glass of the records",
  window: "twice the root of the summed squares of what makes it unsure: the true place lies within it in about 95 of 100 shots",
  alarms: "the lists of what is down and what is up, laid on the records",
  unknown: "not known",
});

/** Ways of knowing that rest on a look at the plant itself. */
const SEEN = ["measured", "marks", "sheet", "counted"];

/** Ways of knowing that are said with lighter ink and a dotted line. */
const RECKONED = ["planning", "type", "nominal", "geodesic"];

/**
 * @param {string} how
 * @returns {string} in words
 */
export function basisInWords(how) {
  return WORDS[how] ?? how;
}

/**
 * @param {string} how
 * @returns {"seen" | "reckoned" | "unknown" | "plain"} how its number is drawn
 */
export function basisLook(how) {
  if (how === "unknown") return "unknown";
  if (SEEN.includes(how)) return "seen";
  return RECKONED.includes(how) ? "reckoned" : "plain";
}
