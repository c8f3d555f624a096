import { isNumber, metres } from "./reading.js";

/** @typedef {import("../quantity/units.js").Unit} Unit */
/** @typedef {import("../server/contract.d.ts").RepairRequest} RepairRequest */
/** @typedef {import("../server/contract.d.ts").Repair} Repair */
/** @typedef {import("../server/client.js").Problem} Problem */

/**
 * What a person types of a repair, as it was typed: lengths in the unit shown, empty where nothing was.
 * @typedef {Record<Field, string>} Typed
 */

/** @typedef {"cable" | "span" | "at" | "first_enclosure" | "first_structure" | "second_enclosure" | "second_structure" | "tray" | "type" | "reel" | "length" | "first_slack" | "second_slack" | "spliced_by" | "spliced_on" | "temporary_until" | "by" | "reason"} Field */

/** A group of fields, beside which what is wrong with one of them is said. */
/** @typedef {"cut" | "first" | "second" | "piece" | "who" | "rest"} Group */

/** Every field. @type {readonly Field[]} */
export const FIELDS = Object.freeze([
  "cable", "span", "at", "first_enclosure", "first_structure", "second_enclosure", "second_structure", "tray", "type", "reel", "length",
  "first_slack", "second_slack", "spliced_by", "spliced_on", "temporary_until", "by", "reason",
]);

/** Fields that are lengths. @type {readonly Field[]} */
export const LENGTH_FIELDS = Object.freeze(["at", "tray", "length", "first_slack", "second_slack"]);

/** In which group a field of the form, or a column that the server refused, stands. @type {Readonly<Record<string, Group>>} */
const GROUPS = Object.freeze({
  cable: "cut", span: "cut", at_m: "cut", at: "cut", first: "first", second: "second", piece: "piece", type: "piece", length: "piece",
  first_enclosure: "first", first_structure: "first", first_slack: "first", tray: "piece", slack: "piece",
  second_enclosure: "second", second_structure: "second", second_slack: "second", by: "who", reason: "who",
});

/**
 * What is wrong with a repair before it is sent.
 * @param {Typed} typed
 * @returns {Partial<Record<Field, string>>} a sentence a field
 */
export function faultsOfRepair(typed) {
  /** @type {Partial<Record<Field, string>>} */
  const faults = {};
  const need = (/** @type {Field} */ field, /** @type {string} */ says) => {
    if (typed[field] === "") faults[field] = says;
  };
  need("cable", "The reel that was cut, such as FDR-S-2.");
  if ((typed.span === "") === (typed.at === "")) faults.span = "Say where the cut is by the span, or by its place along the sheath: one of the two.";
  for (const side of /** @type {const} */ (["first", "second"])) {
    need(`${side}_enclosure`, "The enclosure's code: one that is there, or the code of a new closure, such as C-R1.");
    need(`${side}_structure`, "The structure it is at, which the cable visits, such as HH-S044.");
  }
  for (const field of LENGTH_FIELDS) {
    if (typed[field] !== "" && !isNumber(typed[field])) faults[field] = "A length, 0 or more, such as 170; blank where it is not known.";
  }
  need("by", "Your name: it stands by the posting.");
  need("reason", "Why, in a few words.");
  return faults;
}

/**
 * A repair as the server takes it, its slack left out.
 * @param {Typed} typed without faults
 * @param {Unit} unit of its lengths
 * @returns {RepairRequest}
 */
export function requestOf(typed, unit) {
  const number = (/** @type {Field} */ field) => Number(metres(typed[field], unit));
  const tray = typed.tray === "" ? {} : { tray_glass_m: number("tray") };
  return {
    cable: typed.cable,
    ...(typed.span === "" ? { at_m: number("at") } : { span: typed.span }),
    by: typed.by,
    reason: typed.reason,
    enclosures: [{ enclosure: typed.first_enclosure, structure: typed.first_structure, ...tray }, { enclosure: typed.second_enclosure, structure: typed.second_structure, ...tray }],
    piece: { cable_type: typed.type || null, reel: typed.reel || null, ...(typed.length === "" ? {} : { length_m: number("length") }) },
    spliced_by: typed.spliced_by || null,
    spliced_on: typed.spliced_on || null,
    temporary_until: typed.temporary_until || null,
  };
}

/**
 * The coils that were drawn from. A crew says what it used; the records keep what is left.
 * @param {Typed} typed
 * @param {Unit} unit
 * @param {Repair["joined"]} joined what the coils hold, as a trial without slack answers
 * @returns {{ slack: NonNullable<RepairRequest["slack"]>, short: Partial<Record<Field, number>> }} short: what a coil holds, m, where more was typed
 */
export function slackOf(typed, unit, joined) {
  /** @type {ReturnType<typeof slackOf>} */
  const all = { slack: [], short: {} };
  (/** @type {const} */ (["first_slack", "second_slack"])).forEach((field, side) => {
    const seam = joined[side];
    const used = Number(metres(typed[field], unit) || 0);
    if (!seam || used === 0) return;
    if (used > seam.slack_before_m) all.short[field] = seam.slack_before_m;
    else all.slack.push({ structure: seam.structure, left_m: Number((seam.slack_before_m - used).toFixed(4)) });
  });
  return all;
}

/**
 * What a server refused, by the group beside which it is said.
 * @param {Problem} problem
 * @returns {Partial<Record<Group, string>>}
 */
export function refusedBy(problem) {
  if (problem.faults.length === 0) return { [groupOf(problem.parameter)]: problem.message };
  /** @type {Partial<Record<Group, string>>} */
  const said = {};
  for (const { column, text } of problem.faults) {
    const group = groupOf(column ?? "");
    said[group] = said[group] ? `${said[group]} ${text}` : text;
  }
  return said;
}

/**
 * @param {string} name of a field or a column
 * @returns {Group}
 */
export function groupOf(name) {
  return GROUPS[name] ?? "rest";
}
