/**
 * Colours of tubes and fibers as the records write them: `blue`, `blue with black tracer`, `blue with 2 black tracers`.
 * The twelve and their order: 7 CFR 1755.200, Table 7; two-letter codes as the trade writes them.
 */

/** Two-letter code of each of the twelve, in their order. */
const CODES = Object.freeze({
  blue: "BL",
  orange: "OR",
  green: "GR",
  brown: "BR",
  slate: "SL",
  white: "WH",
  red: "RD",
  black: "BK",
  yellow: "YL",
  violet: "VI",
  rose: "RS",
  aqua: "AQ",
});

/** Words of other national orders, and the one of the twelve that looks most like each. */
const LOOKS_LIKE = Object.freeze({ gray: "slate", grey: "slate", purple: "violet", pink: "rose", turquoise: "aqua" });

/**
 * @typedef {object} Color
 * @property {string} words as recorded
 * @property {string} base the colour to draw: one of the twelve, or `other`
 * @property {string} code two letters, or the first two of a colour that is not one of the twelve
 * @property {number} tracers how many stripes
 * @property {string} tracer colour of the stripes, one of the twelve or `other`; empty for none
 */

/**
 * Reads a colour's words.
 * @param {string} words
 * @returns {Color}
 */
export function parseColor(words) {
  const match = /^(\S+)(?: with (?:(\d+) )?(\S+) tracers?)?$/.exec(words.trim().toLowerCase());
  const [, name = words, several, tracer = ""] = match ?? [];
  return {
    words,
    base: drawn(name),
    code: Object.hasOwn(CODES, name) ? CODES[/** @type {keyof typeof CODES} */ (name)] : name.slice(0, 2).toUpperCase(),
    tracers: tracer ? Number(several ?? 1) : 0,
    tracer: tracer ? drawn(tracer) : "",
  };
}

/**
 * @param {string} name
 * @returns {string}
 */
function drawn(name) {
  if (Object.hasOwn(CODES, name)) return name;
  return Object.hasOwn(LOOKS_LIKE, name) ? LOOKS_LIKE[/** @type {keyof typeof LOOKS_LIKE} */ (name)] : "other";
}
