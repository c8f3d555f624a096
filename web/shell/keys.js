import { html } from "lit";

/**
 * @typedef {object} Key
 * @property {string} key as the browser names it
 * @property {string} says what it does
 */

/** Keys that act anywhere but in a field. @type {readonly Key[]} */
export const KEYS = Object.freeze([
  { key: "/", says: "Find" },
  { key: "m", says: "to the map" },
  { key: "s", says: "to the sheet" },
  { key: "p", says: "to the distance strip" },
  { key: "f", says: "fold or unfold the strip" },
  { key: "u", says: "metres or feet" },
  { key: "d", says: "distance in glass, sheath or route" },
  { key: "t", says: "day, night, red night" },
  { key: "o", says: "to the outage desk, as it was left" },
  { key: "0", says: "all the plant on the map" },
  { key: "?", says: "this list" },
]);

/** Keys that act where the focus is. */
const PLACES = [
  ["On the map", [["arrows", "move"], ["+ −", "closer, farther"], ["Enter", "open what is nearest the middle"]]],
  ["On the strip", [["← →", "along the glass (with Shift, farther)"], ["↑ ↓", "next, last structure"], ["Home End", "the path's ends"], ["+ −", "closer, farther"], ["Enter", "open what is nearest"], ["Esc", "let the pointer go"]]],
  ["On the outage desk", [["1 to 5", "its parts in turn"], ["↑ ↓", "in the list of suspects: the next, the one before; the map follows"], ["Enter", "in that list: who is down if it is cut"]]],
  ["On a number", [["Enter", "How do you know?"], ["Esc", "back to the number"]]],
  ["In a tube chart", [["arrows", "from fiber to fiber"], ["Enter", "open the fiber"]]],
];

/**
 * Whether a key is typed into something and so means itself.
 * @param {KeyboardEvent} event
 * @returns {boolean}
 */
export function isTyped(event) {
  if (event.ctrlKey || event.metaKey || event.altKey || event.isComposing) return true;
  const target = event.composedPath()[0];
  return target instanceof HTMLElement && (target.isContentEditable || /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName) && !isSwitch(target));
}

/**
 * @param {HTMLElement} target
 * @returns {boolean} whether nothing can be typed into it
 */
function isSwitch(target) {
  return target instanceof HTMLInputElement && (target.type === "checkbox" || target.type === "radio");
}

/**
 * The list of keys.
 * @param {boolean} on whether single keys act
 * @param {(on: boolean) => void} setKeys
 * @returns {unknown}
 */
export function keyList(on, setKeys) {
  return html`<h2>Keys</h2>
    <dl class="keys">${KEYS.map(({ key, says }) => html`<dt><kbd>${key}</kbd></dt><dd>${says}</dd>`)}</dl>
    ${PLACES.map(([place, keys]) => html`<h3>${place}</h3><dl class="keys">${/** @type {string[][]} */ (keys).map(([key, says]) => html`<dt><kbd>${key}</kbd></dt><dd>${says}</dd>`)}</dl>`)}
    <p><label><input type="checkbox" .checked=${on} @change=${(/** @type {Event} */ event) => setKeys(/** @type {HTMLInputElement} */ (event.target).checked)}>
      Single keys act</label> <span class="lighter">Off: only <kbd>Tab</kbd>, <kbd>Enter</kbd> and <kbd>Esc</kbd> do.</span></p>`;
}
