/** Letter tags of structures, in one plain box each. */
export const TAGS = Object.freeze({
  pole: "P",
  handhole: "HH",
  manhole: "MH",
  vault: "V",
  pedestal: "PED",
  cabinet: "CAB",
  hut: "HUT",
  building: "BLDG",
  point: "PT",
});

/** Line patterns of placements, px on and off. @type {Readonly<Record<string, number[]>>} */
export const PATTERNS = Object.freeze({
  aerial: [],
  duct: [9, 4],
  buried: [2, 3],
  indoor: [1, 4],
  underwater: [10, 3, 2, 3],
});

/**
 * @param {string} kind of structure
 * @returns {string}
 */
export function tagOf(kind) {
  return TAGS[/** @type {keyof typeof TAGS} */ (kind)] ?? "?";
}

/** Line weights, each up to so many fibers. */
const WEIGHTS = [
  { upTo: 24, width: 1.1 },
  { upTo: 96, width: 1.7 },
  { upTo: 288, width: 2.5 },
  { upTo: Infinity, width: 3.4 },
];

/**
 * @param {number} fibers
 * @returns {number} px
 */
export function weightOf(fibers) {
  return WEIGHTS.find((each) => fibers <= each.upTo)?.width ?? 1;
}

/** Structures of this importance and above are sites. */
export const SITE = 3;

/**
 * How much a structure asks for room: sites before enclosures before the rest.
 * @param {string} kind
 * @param {number} enclosures
 * @returns {number} higher is drawn first
 */
export function importanceOf(kind, enclosures) {
  if (kind === "building" || kind === "hut") return 4;
  if (kind === "cabinet" || kind === "vault") return 3;
  if (enclosures > 0) return 2;
  return kind === "pole" || kind === "handhole" ? 0 : 1;
}
