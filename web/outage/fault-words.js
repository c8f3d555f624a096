import { inWords } from "../quantity/index.js";
import { readingOf } from "../basis/index.js";

/** @typedef {import("../server/contract.d.ts").FaultPlace} FaultPlace */
/** @typedef {import("../basis/figure.js").Figure} Figure */
/** @typedef {import("../basis/basis.js").Basis} Basis */
/** @typedef {import("../address/address.js").View} View */

/** @typedef {string | Figure | { view: View, code: string }} Part words, a number with its basis, or a thing to open */

/** What each cause of an uncertain place is. @type {Readonly<Record<string, string>>} */
const CAUSES = Object.freeze({
  cursor: "cursor and pulse width",
  index: "group index of the glass",
  ratio: "glass in a length of sheath",
  marks: "reading of the sheath marks",
  coils: "coils on the way",
  map: "structures' places on the map",
});

/**
 * A fault place in lines of words, numbers and links: where, how far past and how sure, and the mark to look for.
 * @param {FaultPlace} place
 * @param {string} shot the reading in words, for the basis of each number
 * @returns {Part[][]}
 */
export function placeLines(place, shot) {
  return [whereLine(place), pastLine(place, shot), markLine(place, shot)].filter((line) => line.length > 0);
}

/**
 * @param {FaultPlace} place
 * @returns {Part[]}
 */
function whereLine(place) {
  const before = structure(place.structure_before);
  const after = structure(place.structure_after);
  if (place.past_end) return ["past the end of the path", ...(place.path_end ? [`, ${place.path_end}`] : [])];
  if (place.in_slack_at) return ["in the coil at ", structure(place.in_slack_at)];
  if (place.lies_in === "jumper") return ["in a jumper at ", before];
  if (place.lies_in === "tray") return ["at a joint, or in its tray, at ", before];
  if (place.structure_before === place.structure_after) return ["at ", before];
  return ["between ", before, " and ", after];
}

/**
 * @param {FaultPlace} place
 * @param {string} shot
 * @returns {Part[]}
 */
function pastLine(place, shot) {
  const { structure_before: before, in_slack_at: coil } = place;
  const within = [", within ", withinFigure(place)];
  const basis = { how: "reading", source: shot };
  if (place.past_end) return [{ what: "The reading, beyond the path's end", kind: "length", value: place.over_m ?? 0, basis }, " beyond it by the records"];
  if (coil) return [{ what: `Sheath from where it arrives at ${coil}`, kind: "length", value: place.beyond_before_m, basis }, " into the coil", ...within];
  if (place.span === null) return ["within ", withinFigure(place)];
  return [{ what: `Sheath from ${before} to the fault place`, kind: "length", value: place.beyond_before_m, basis }, ` past ${before}`, ...within];
}

/**
 * @param {FaultPlace} place
 * @param {string} shot
 * @returns {Part[]}
 */
function markLine({ mark, cable, past_end: pastEnd }, shot) {
  if (cable === null || pastEnd) return [];
  if (mark === null) return [`${cable} has no two marks read: no mark can be named`];
  const { value, unit, ink } = mark;
  const source = `${shot}. The marks read along ${cable} give ${value} ${unit} ${ink} there; printed marks are whole numbers`;
  return ["mark ", { what: `Sheath mark of ${cable} at the fault place, ${unit}, ${ink}`, kind: "count", value, basis: { how: "marks", source } }, ` ${unit} ${ink}`];
}

/**
 * How far either side the true place may be.
 * @param {FaultPlace} place
 * @returns {Figure}
 */
export function withinFigure(place) {
  const parts = Object.entries(place.within).map(([cause, metres]) => ({ what: CAUSES[cause] ?? cause, metres }));
  return { what: "The fault place lies within, either side", kind: "length", value: place.within_m, basis: { how: "window", parts } };
}

/**
 * @param {string} code
 * @returns {{ view: View, code: string }}
 */
function structure(code) {
  return { view: "structure", code };
}

/**
 * A line as plain text, in the unit that people chose.
 * @param {Part[]} line
 * @returns {string}
 */
export function textOf(line) {
  return line.map((part) => (typeof part === "string" ? part : "view" in part ? part.code : inWords(readingOf(part)))).join("");
}

/**
 * What to think of the place, in sentences; none where there is nothing to warn of.
 * @param {FaultPlace} place
 * @returns {string[]}
 */
export function cautionsOf(place) {
  /** @type {string[]} */
  const said = [];
  const coil = place.in_slack_at ?? place.may_be_in_slack_at;
  if (coil && !place.past_end) said.push(`It may be inside the coil at ${coil}: open that before you dig.`);
  if (place.past_end) said.push("The light goes farther than the path of the records: nothing is broken before its end. A crossed joint, a wrong patch or a wrong record does that; a cut does not. Look at what was opened lately.");
  return said;
}
