/** The alarm lists that this browser keeps between visits: codes of circuits, nothing else of the records. */

/**
 * @typedef {object} Lists
 * @property {string} down as it was pasted
 * @property {string} up
 * @property {string} opened enclosures that a crew is known to have opened lately, as typed
 * @property {boolean} byPath whether the alarms are of paths, not of services
 * @property {number} chosen which suspect, from 0
 */

const NAME = "spanwright.outage";

/** @type {Lists} */
const NONE = Object.freeze({ down: "", up: "", opened: "", byPath: false, chosen: 0 });

/**
 * What is kept; a browser that keeps nothing, or kept something else, gives empty lists.
 * @returns {Lists}
 */
export function keptLists() {
  try {
    return { ...NONE, ...JSON.parse(localStorage.getItem(NAME) ?? "{}") };
  } catch {
    return { ...NONE };
  }
}

/**
 * @param {Lists} lists
 */
export function keepLists(lists) {
  try {
    localStorage.setItem(NAME, JSON.stringify(lists));
  } catch (cause) {
    console.info("This browser keeps nothing between visits.", cause);
  }
}
