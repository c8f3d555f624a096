import { METRES_PER_FOOT } from "./units.js";

/** @typedef {import("./units.js").Unit} Unit */

/**
 * @typedef {object} Reading a number as it is read
 * @property {string} number
 * @property {string} unit
 */

/** @type {Map<number, Intl.NumberFormat>} */
const formats = new Map();

/**
 * A number with so many decimals and its thousands parted.
 * @param {number} value
 * @param {number} places
 * @returns {string} with a true minus sign
 */
export function decimal(value, places) {
  let format = formats.get(places);
  if (format === undefined) {
    format = new Intl.NumberFormat("en-US", { minimumFractionDigits: places, maximumFractionDigits: places });
    formats.set(places, format);
  }
  const text = format.format(value);
  return text.startsWith("-") ? withSign(text) : text;
}

/**
 * @param {string} text begins with a hyphen
 * @returns {string} with a minus sign, or none where nothing but zeros is left
 */
function withSign(text) {
  return /[1-9]/.test(text) ? `\u2212${text.slice(1)}` : text.slice(1);
}

/**
 * A length in the unit that people chose: to 0.1 m, or to 1 ft where it is 10 ft or more, else 0.1 ft.
 * @param {number} metres
 * @param {Unit} unit
 * @returns {Reading}
 */
export function length(metres, unit) {
  if (unit === "m") return { number: decimal(metres, 1), unit };
  const feet = metres / METRES_PER_FOOT;
  return { number: decimal(feet, Math.abs(feet) < 10 ? 1 : 0), unit };
}

/**
 * A loss, to 0.01 dB.
 * @param {number} db
 * @returns {Reading}
 */
export function loss(db) {
  return { number: decimal(db, 2), unit: "dB" };
}

/**
 * A count of things.
 * @param {number} value
 * @param {string} [of] what is counted, where it is to be read after the number
 * @returns {Reading}
 */
export function count(value, of = "") {
  return { number: decimal(value, 0), unit: of };
}

/**
 * A reading in one piece.
 * @param {Reading} reading
 * @returns {string}
 */
export function inWords(reading) {
  return reading.unit ? `${reading.number} ${reading.unit}` : reading.number;
}

/** Bearings in words, from north on by eighths. */
const WINDS = ["north", "north-east", "east", "south-east", "south", "south-west", "west", "north-west"];

/**
 * @param {number} degrees from north, clockwise
 * @returns {string} the nearest of the eight winds
 */
export function wind(degrees) {
  return WINDS[Math.round((((degrees % 360) + 360) % 360) / 45) % 8] ?? "north";
}

/**
 * A time as people read it, in the records' own zone.
 * @param {string} time RFC 3339, or a date
 * @param {string} zone IANA name
 * @returns {string} e.g. 31 Mar 2026, 14:05
 */
export function timeInWords(time, zone) {
  if (/^\d{4}-\d{2}-\d{2}$/.test(time)) return dayInWords(time);
  const at = new Date(time);
  if (Number.isNaN(at.getTime())) return time;
  const day = new Intl.DateTimeFormat("en-GB", { day: "numeric", month: "short", year: "numeric", timeZone: zone });
  const clock = new Intl.DateTimeFormat("en-GB", { hour: "2-digit", minute: "2-digit", timeZone: zone });
  return `${day.format(at)}, ${clock.format(at)}`;
}

/**
 * A date as people read it.
 * @param {string} date YYYY-MM-DD
 * @returns {string} e.g. 31 Mar 2026
 */
export function dayInWords(date) {
  const format = new Intl.DateTimeFormat("en-GB", { day: "numeric", month: "short", year: "numeric", timeZone: "UTC" });
  return format.format(new Date(`${date}T00:00:00Z`));
}
