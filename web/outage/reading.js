import { METRES_PER_FOOT } from "../quantity/index.js";

/** @typedef {import("../address/address.js").Asked} Asked */
/** @typedef {import("../quantity/units.js").Unit} Unit */

/**
 * What a person types of a shot, as it was typed: lengths in the shot's own unit, empty where nothing was.
 * @typedef {object} Shot
 * @property {string} port
 * @property {string} to port or end that the path reaches, behind a splitter
 * @property {Unit} unit
 * @property {string} distance
 * @property {string} index group index set on the instrument
 * @property {string} launch
 * @property {string} wavelength nm
 * @property {Array<{ enclosure: string, reading: string }>} events known joints of the same shot
 * @property {string} farPort
 * @property {string} farDistance
 * @property {string} farLaunch
 */

/** @typedef {"port" | "to" | "distance" | "index" | "launch" | "wavelength" | "event" | "far_port" | "far_distance" | "far_launch"} Field as an address and the server name it */

/** Members of a shot that stand in an address by themselves. @type {ReadonlyArray<readonly [Exclude<Field, "event">, Exclude<keyof Shot, "events" | "unit">]>} */
const SINGLE = Object.freeze([
  ["port", "port"], ["to", "to"], ["distance", "distance"], ["index", "index"], ["launch", "launch"], ["wavelength", "wavelength"],
  ["far_port", "farPort"], ["far_distance", "farDistance"], ["far_launch", "farLaunch"],
]);

/** Members that are lengths. */
const LENGTHS = new Set(["distance", "launch", "far_distance", "far_launch"]);

/** Members that are plain numbers. */
const NUMBERS = new Set([...LENGTHS, "index", "wavelength"]);

/** What each field holds, with an example. @type {Readonly<Partial<Record<Field, string>>>} */
const RIGHT = Object.freeze({
  port: "The port that was shot, such as HE-1/FDR-S/72.",
  event: "A known joint: the enclosure, and where this shot shows it, such as C-S03 at 6038.",
  far_port: "The port at the far end that was shot, such as HUT-S/FDR-S/12.",
  distance: "A distance as the instrument shows it, such as 7412.",
  launch: "A length of launch fiber, such as 150; blank for none.",
  index: "A group index, such as 1.4682; blank: the distance is glass as it is.",
  wavelength: "A wavelength in nm, such as 1550.",
  far_distance: "A distance as the instrument at the far end shows it, such as 5334.",
  far_launch: "A length of launch fiber, such as 150; blank for none.",
});

/**
 * The shot that an address holds.
 * @param {Asked} asked
 * @returns {Shot}
 */
export function shotOf(asked) {
  const first = (/** @type {string} */ name) => asked.find(([each]) => each === name)?.[1] ?? "";
  const shot = Object.fromEntries(SINGLE.map(([name, member]) => [member, first(name)]));
  const events = asked.filter(([name]) => name === "event").map(([, event]) => {
    const at = event.lastIndexOf("=");
    return { enclosure: event.slice(0, Math.max(0, at)), reading: event.slice(at + 1) };
  });
  return /** @type {Shot} */ ({ ...shot, unit: first("in") === "ft" ? "ft" : "m", events });
}

/**
 * A shot as an address holds it; the inverse of {@link shotOf}.
 * @param {Shot} shot
 * @returns {Asked}
 */
export function askedOf(shot) {
  return [
    ...SINGLE.map(([name, member]) => /** @type {[string, string]} */ ([name, shot[member]])).filter(([, value]) => value !== ""),
    .../** @type {Array<[string, string]>} */ (shot.unit === "ft" ? [["in", "ft"]] : []),
    ...shot.events.map(({ enclosure, reading }) => /** @type {[string, string]} */ (["event", `${enclosure}=${reading}`])),
  ];
}

/** Names in an address that belong to a shot. @type {readonly string[]} */
export const SHOT_NAMES = Object.freeze([...SINGLE.map(([name]) => name), "in", "event"]);

/**
 * The question to the server: all lengths in metres.
 * @param {Shot} shot without faults
 * @returns {Record<string, string | string[]>}
 */
export function questionOf(shot) {
  const single = SINGLE.map(([name, member]) => [name, LENGTHS.has(name) ? metres(shot[member], shot.unit) : plain(shot[member])]);
  return { ...Object.fromEntries(single), event: shot.events.map(({ enclosure, reading }) => `${enclosure}=${metres(reading, shot.unit)}`) };
}

/**
 * What is wrong with a shot before it is sent.
 * @param {Shot} shot
 * @returns {Partial<Record<Field, string>>} a sentence a field
 */
export function faultsOf(shot) {
  /** @type {Partial<Record<Field, string>>} */
  const faults = {};
  const need = (/** @type {Field} */ field, /** @type {boolean} */ missing) => {
    if (missing) faults[field] = RIGHT[field] ?? "";
  };
  need("port", shot.port === "");
  need("distance", shot.distance === "");
  need("far_port", shot.farDistance !== "" && shot.farPort === "");
  need("far_distance", shot.farPort !== "" && shot.farDistance === "");
  need("event", shot.events.some(({ enclosure, reading }) => enclosure === "" || !isNumber(reading)));
  for (const [name, member] of SINGLE) {
    need(name, NUMBERS.has(name) && shot[member] !== "" && !isNumber(shot[member]));
  }
  return faults;
}

/**
 * A number as people type it: thousands may be parted by commas or spaces.
 * @param {string} text
 * @returns {string} without them
 */
function plain(text) {
  return text.replace(/(?<=\d)[, \u202f](?=\d{3}(?:\D|$))/g, "").trim();
}

/**
 * @param {string} text
 * @returns {boolean} whether it is a plain number, 0 or above
 */
export function isNumber(text) {
  return /^\d+(\.\d+)?$/.test(plain(text));
}

/**
 * @param {string} text in the unit
 * @param {Unit} unit
 * @returns {string} metres, to a tenth of a millimetre; empty for nothing
 */
export function metres(text, unit) {
  if (text === "" || unit === "m") return plain(text);
  return String(Number((Number(plain(text)) * METRES_PER_FOOT).toFixed(4)));
}
