/**
 * What this browser keeps between visits: the place left, and how its person likes to read. Never any record.
 */

/** @typedef {import("../quantity/units.js").Unit} Unit */
/** @typedef {import("../path/track.js").Measure} Measure */
/** @typedef {import("../map/camera.js").Standpoint} Standpoint */

/**
 * @typedef {object} Kept
 * @property {string} hash the address that was open
 * @property {Standpoint | null} stand where the map stood
 * @property {Unit | null} unit null: the records' own
 * @property {import("./theme.js").Theme | null} theme null: the system's
 * @property {Measure} measure
 * @property {boolean} folded whether the strip is folded
 * @property {boolean} keys whether single keys act
 * @property {string} outage the address at which the outage desk was left; empty for none
 */

const NAME = "spanwright";

/** @type {Kept} */
const FRESH = Object.freeze({ hash: "", stand: null, unit: null, theme: null, measure: "glass", folded: false, keys: true, outage: "" });

/**
 * What is kept; a browser that keeps nothing, or kept something else, gives what is fresh.
 * @returns {Kept}
 */
export function kept() {
  try {
    return { ...FRESH, ...JSON.parse(localStorage.getItem(NAME) ?? "{}") };
  } catch {
    return { ...FRESH };
  }
}

/**
 * Keeps something more.
 * @param {Partial<Kept>} more
 */
export function keep(more) {
  try {
    localStorage.setItem(NAME, JSON.stringify({ ...kept(), ...more }));
  } catch (cause) {
    console.info("This browser keeps nothing between visits.", cause);
  }
}
