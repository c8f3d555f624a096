/** @typedef {import("../server/contract.d.ts").Suspect} Suspect */
/** @typedef {import("./cuts.js").Cut} Cut */

/**
 * What of a suspect is cut, so that it is seen who is down: the likeliest span, else the enclosure.
 * @param {Suspect} suspect
 * @returns {Cut[]} none where nothing of the plant would be cut
 */
export function likeliest({ span, enclosure, kind }) {
  if (kind === "end") return [];
  if (span) return [{ kind: "span", code: span }];
  return enclosure ? [{ kind: "enclosure", code: enclosure }] : [];
}

/**
 * @param {Suspect} suspect
 * @returns {string} what it is, in a few words
 */
export function nameOf({ kind, tubes, ports, spans, enclosures, ends }) {
  if (kind === "crossed") return crossedInWords(tubes, enclosures[0] ?? "");
  if (kind === "end") return `behind ${ports.join(", ")}`;
  const whole = spans.length + enclosures.length === 1 ? `${spans[0] ?? enclosures[0]}` : ends.map(({ structure, enclosure }) => enclosure ?? structure).join(" to ") || spans.join(", ") || enclosures.join(", ");
  return tubes.length > 0 ? `${tubesInWords(tubes)}, ${whole}` : whole;
}

/**
 * @param {string[]} tubes
 * @param {string} enclosure
 * @returns {string}
 */
function crossedInWords(tubes, enclosure) {
  const numbers = tubes.map(numberOf);
  if (numbers.length < 2) return `tube ${numbers[0]} joined to the wrong glass at ${enclosure}`;
  return `tubes ${numbers.join(" and ")} crossed at ${enclosure}`;
}

/**
 * @param {string[]} tubes each as F-1/7
 * @returns {string}
 */
function tubesInWords(tubes) {
  return `tube${tubes.length > 1 ? "s" : ""} ${tubes.map(numberOf).join(", ")}`;
}

/**
 * @param {string} tube as F-1/7
 * @returns {string}
 */
function numberOf(tube) {
  return tube.slice(tube.lastIndexOf("/") + 1);
}

/**
 * @param {Suspect} suspect
 * @returns {string} what it is made up of
 */
export function whatOf({ kind, spans, enclosures, tubes }) {
  if (kind === "crossed") return `opened lately; ${tubes.map((tube) => tube.replace("/", " tube ")).join(", ")}`;
  if (kind === "end") return "equipment, jumper or drop";
  const counted = (/** @type {number} */ count, /** @type {string} */ word) => (count === 0 ? "" : `${count} ${word}${count === 1 ? "" : "s"}`);
  return [counted(spans.length, "span"), counted(enclosures.length, "enclosure")].filter(Boolean).join(", ");
}
