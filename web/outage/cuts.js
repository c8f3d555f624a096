/** What is taken as cut, as an address and the server write it: `span:S-1`, `tube:F-1/3`, `place:F-1@1352.2`. */

/** @typedef {import("../address/address.js").Asked} Asked */
/** @typedef {import("../address/address.js").View} View */
/** @typedef {"span" | "structure" | "cable" | "enclosure" | "tube" | "place"} CutKind */

/**
 * @typedef {object} Cut
 * @property {CutKind} kind
 * @property {string} code
 */

/** @type {readonly CutKind[]} */
const KINDS = ["span", "structure", "cable", "enclosure", "tube", "place"];

/**
 * @param {string} text
 * @returns {Cut | null} null where it is none
 */
export function readCut(text) {
  const at = text.indexOf(":");
  const kind = KINDS.find((each) => each === text.slice(0, at));
  const code = text.slice(at + 1);
  return kind && code ? { kind, code } : null;
}

/**
 * @param {Cut} cut
 * @returns {string} the inverse of {@link readCut}
 */
export function writeCut({ kind, code }) {
  return `${kind}:${code}`;
}

/**
 * The cuts that an address holds.
 * @param {Asked} asked
 * @returns {Cut[]}
 */
export function cutsOf(asked) {
  return asked.filter(([name]) => name === "cut").flatMap(([, text]) => readCut(text) ?? []);
}

/**
 * An address' questions with other cuts in place of its own.
 * @param {Asked} asked
 * @param {Cut[]} cuts
 * @returns {Asked}
 */
export function withCuts(asked, cuts) {
  return [...asked.filter(([name]) => name !== "cut"), ...cuts.map((cut) => /** @type {[string, string]} */ (["cut", writeCut(cut)]))];
}

/**
 * A cut in words.
 * @param {Cut} cut
 * @returns {string}
 */
export function cutInWords({ kind, code }) {
  if (kind === "tube") return `tube ${code.slice(code.lastIndexOf("/") + 1)} of ${code.slice(0, code.lastIndexOf("/"))}`;
  if (kind === "place") return `${code.slice(0, code.lastIndexOf("@"))} at the fault place`;
  return `${kind} ${code}`;
}

/**
 * The thing of the records that a cut is of.
 * @param {Cut} cut
 * @returns {{ view: View, code: string }}
 */
export function thingOf({ kind, code }) {
  if (kind === "tube") return { view: "cable", code: code.slice(0, code.lastIndexOf("/")) };
  if (kind === "place") return { view: "cable", code: code.slice(0, code.lastIndexOf("@")) };
  return { view: kind, code };
}
