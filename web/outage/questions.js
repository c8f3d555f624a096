import { ask, pathTo, send } from "../server/index.js";
import { thingOf, writeCut } from "./cuts.js";
import { strangers } from "./known-codes.js";
import { readList } from "./lists.js";
import { questionOf } from "./reading.js";

/** @typedef {import("../server/contract.d.ts").FaultAnswer} FaultAnswer */
/** @typedef {import("../server/contract.d.ts").ImpactAnswer} ImpactAnswer */
/** @typedef {import("../server/contract.d.ts").SuspectsAnswer} SuspectsAnswer */
/** @typedef {import("./keeping.js").Lists} Lists */
/** @typedef {import("./known-codes.js").Stranger} Stranger */
/** @typedef {import("./cuts.js").Cut} Cut */

/** @typedef {{ lines: number[][][], places: number[][] }} Shape where something lies: longitudes and latitudes */

/**
 * @typedef {object} Ranked
 * @property {SuspectsAnswer | null} answer null where no known circuit is down
 * @property {Stranger[]} strangers codes that the records do not hold
 */

/** @typedef {{ answer: ImpactAnswer, shape: Shape }} Fallen */

/**
 * Ranks the suspects of two lists; codes that the records do not hold are left out and told.
 * @param {Lists} lists
 * @param {AbortSignal} signal
 * @returns {Promise<Ranked>}
 */
export async function rankedSuspects(lists, signal) {
  const [down, up] = [readList(lists.down).codes, readList(lists.up).codes];
  const unknown = await strangers([...new Set([...down, ...up])], signal);
  const out = new Set(unknown.map((each) => each.code));
  const known = (/** @type {string[]} */ codes) => codes.filter((code) => !out.has(code));
  const asked = { down: known(down), up: known(up), by_path: lists.byPath, opened: readList(lists.opened).codes };
  return { answer: asked.down.length === 0 ? null : await send("/suspects", asked, signal), strangers: unknown };
}

/**
 * Where a reading lies.
 * @param {import("./reading.js").Shot} shot without faults
 * @param {AbortSignal} signal
 * @returns {Promise<FaultAnswer>}
 */
export function placed(shot, signal) {
  return ask("/fault", questionOf(shot), signal);
}

/**
 * Who is down if all of it is cut, and where that lies on the map.
 * @param {Cut[]} cuts at least one
 * @param {AbortSignal} signal
 * @returns {Promise<Fallen>}
 */
export async function fallen(cuts, signal) {
  const [answer, ...shapes] = await Promise.all([ask("/impact", { cut: cuts.map(writeCut), fibers: "yes" }, signal), ...cuts.map((cut) => shapeOf(cut, signal))]);
  return { answer, shape: { lines: shapes.flatMap((each) => each.lines), places: shapes.flatMap((each) => each.places) } };
}

/**
 * Where a temporary path runs on the map, and where hands work for it.
 * @param {{ spans: string[], structures: string[] }} way codes
 * @param {AbortSignal} signal
 * @returns {Promise<Shape>}
 */
export async function drawnWay({ spans, structures }, signal) {
  const cuts = [...spans.map((code) => ({ kind: /** @type {const} */ ("span"), code })), ...structures.map((code) => ({ kind: /** @type {const} */ ("structure"), code }))];
  const shapes = await Promise.all(cuts.map((cut) => shapeOf(cut, signal)));
  return { lines: shapes.flatMap((each) => each.lines), places: shapes.flatMap((each) => each.places) };
}

/**
 * @param {Cut} cut
 * @param {AbortSignal} signal
 * @returns {Promise<Shape>} empty for a place: the reading that found it has it
 */
async function shapeOf(cut, signal) {
  if (cut.kind === "place") return { lines: [], places: [] };
  const { view, code } = thingOf(cut);
  const it = await ask(pathTo(`${view}s`, code), {}, signal);
  if (it.line) return { lines: [it.line], places: [] };
  return { lines: [], places: it.lon === undefined ? [] : [[it.lon, it.lat]] };
}
