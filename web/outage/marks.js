import { placeLines, textOf } from "./fault-words.js";

/** @typedef {import("../server/contract.d.ts").FaultAnswer} FaultAnswer */
/** @typedef {import("../server/contract.d.ts").FaultPlace} FaultPlace */
/** @typedef {import("../server/contract.d.ts").SuspectsAnswer} SuspectsAnswer */
/** @typedef {import("../map/paint-marks.js").Marks} Marks */
/** @typedef {import("../map/paint-marks.js").Stretch} Stretch */
/** @typedef {import("../map/paint-marks.js").FaultSign} FaultSign */
/** @typedef {import("./questions.js").Shape} Shape */

/** Suspects that are drawn; those below are only listed. */
const DRAWN = 12;

/**
 * @typedef {object} AtHand what the desk has at hand
 * @property {string} part which part of the desk is open
 * @property {SuspectsAnswer | null} suspects
 * @property {number} chosen which suspect
 * @property {FaultAnswer | null} fault
 * @property {number} place which of its places
 * @property {Shape | null} cut
 * @property {Shape | null} way a temporary path
 */

/**
 * What the map draws of it, and where it goes: to what the open part is about.
 * @param {AtHand} hand
 * @returns {Marks}
 */
export function marksOf({ part, suspects, chosen, fault, place, cut, way }) {
  const stretches = suspectStretches(suspects, chosen);
  /** @type {Stretch[]} */
  const cuts = cut === null ? [] : [{ kind: "down", sign: "CUT", chosen: part === "down", ...cut }];
  /** @type {Stretch[]} */
  const ways = way === null || part !== "light" ? [] : [{ kind: "spare", sign: "LIGHT", chosen: true, ...way }];
  const at = fault?.places[place] ?? null;
  const focus = part === "reading" ? pointsOfPlace(at) : part === "down" ? [...pointsOf(cuts[0]), ...(cuts.length > 0 && pointsOf(cuts[0]).length === 0 ? pointsOfPlace(at) : [])] : part === "light" ? pointsOf(ways[0] ?? cuts[0]) : pointsOf(stretches.at(-1));
  return { stretches: [...stretches, ...cuts, ...ways], faults: faultSigns(fault, at), focus };
}

/**
 * @param {SuspectsAnswer | null} suspects
 * @param {number} chosen
 * @returns {Stretch[]} the chosen one last, so that it lies on top
 */
function suspectStretches(suspects, chosen) {
  const all = (suspects?.suspects ?? []).map((each, index) => ({ kind: /** @type {const} */ ("suspect"), sign: `S${index + 1}`, chosen: index === chosen, lines: each.lines, places: each.places }));
  const drawn = all.filter((each, index) => index < DRAWN || each.chosen);
  return [...drawn.filter((each) => !each.chosen).reverse(), ...drawn.filter((each) => each.chosen)];
}

/**
 * @param {FaultAnswer | null} fault
 * @param {FaultPlace | null} at
 * @returns {FaultSign[]} the place, and the second break where there is one
 */
function faultSigns(fault, at) {
  if (at === null) return [];
  const second = fault?.between && !fault.between.one_break ? [signOf(fault.between.to, "second break, ")] : [];
  return [...second, signOf(at, "")];
}

/**
 * @param {FaultPlace} place
 * @param {string} before words before the label
 * @returns {FaultSign}
 */
function signOf(place, before) {
  const lines = placeLines(place, "").map(textOf);
  return { point: [place.lon, place.lat], window: place.window, label: `${before}${(place.mark ? lines.at(-1) : lines[0]) ?? ""}` };
}

/**
 * @param {FaultPlace | null} place
 * @returns {number[][]}
 */
function pointsOfPlace(place) {
  return place === null ? [] : place.window.length > 1 ? place.window : [[place.lon, place.lat]];
}

/**
 * @param {Stretch | undefined} stretch
 * @returns {number[][]} every point of it
 */
function pointsOf(stretch) {
  return stretch === undefined ? [] : [...stretch.lines.flat(), ...stretch.places];
}
