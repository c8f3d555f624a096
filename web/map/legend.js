import { html, nothing, svg } from "lit";
import { PATTERNS, TAGS, weightOf } from "./tags.js";

/** Cable sizes whose weights are shown. */
const SIZES = [24, 96, 288, 864];

/** @typedef {import("../server/contract.d.ts").Status} Status */

/**
 * What the signs on the map mean, written out; and the tiles, where an operator named an address.
 * @param {boolean} thinned whether structures are left out at this zoom
 * @param {Status["tile"]} tile
 * @param {boolean} tilesOn
 * @param {(on: boolean) => void} setTiles
 * @returns {unknown}
 */
export function legend(thinned, tile, tilesOn, setTiles) {
  return html`<details class="map-legend"><summary>Signs</summary><div class="legend-body">
    <p>${Object.entries(TAGS).map(([kind, letters]) => html`<span class="sign"><b class="tag">${letters}</b> ${kind === "point" ? "marked place" : kind}</span> `)}</p>
    <p><span class="sign"><span class="ring"><b class="tag">HH</b></span> ring: an enclosure in it</span></p>
    <p>${Object.entries(PATTERNS).map(([placement, pattern]) => html`<span class="sign">${line(pattern, 1.7)} ${placement}</span> `)}</p>
    <p>${SIZES.map((fibers, index) => html`<span class="sign">${line([], weightOf(fibers))} ${index === SIZES.length - 1 ? "more" : `to ${fibers}`}</span> `)} fibers</p>
    <p><span class="sign">${handLine()} at hand: a to z, in brackets, or ringed</span></p>
    <p><span class="sign">${hatched("suspect", "2 4")} <b class="tag">S1</b> suspect, by rank</span> <span class="sign">${hatched("down", "6 3")} <b class="tag">CUT</b> taken as cut</span></p>
    <p><span class="sign">${crossed()} fault place; the strokes across the line are the ends of its window</span></p>
    <p class="lighter">Paler line or letter: planned or abandoned.</p>
    ${thinned ? html`<p class="lighter">At this distance poles and handholes are left out: come closer.</p>` : nothing}
    ${tile === null ? nothing : html`<p><label><input type="checkbox" .checked=${tilesOn} @change=${(/** @type {Event} */ event) => setTiles(/** @type {HTMLInputElement} */ (event.target).checked)}>
      Tiles from ${new URL(tile.url.replace(/[{}]/g, "")).host}</label><br><span class="lighter">They tell that host where you look, and so where the plant is.</span></p>`}
  </div></details>`;
}

/**
 * @param {number[]} pattern
 * @param {number} width
 * @returns {unknown}
 */
function line(pattern, width) {
  return html`<svg width="36" height="8" aria-hidden="true">${svg`<line class="sample" x1="0" y1="4" x2="36" y2="4" stroke-width=${width} stroke-dasharray=${pattern.join(" ")}></line>`}</svg>`;
}

/**
 * @param {string} state
 * @param {string} pattern
 * @returns {unknown}
 */
function hatched(state, pattern) {
  return html`<svg width="36" height="14" aria-hidden="true">${svg`<line class=${`sample-hatch hatch-${state}`} x1="0" y1="7" x2="36" y2="7" stroke-dasharray=${pattern}></line>`}</svg>`;
}

/** @returns {unknown} */
function crossed() {
  return html`<svg width="36" height="14" aria-hidden="true">${svg`<path class="sample-fault" d="M6 1 V13 M30 1 V13"></path><path class="sample" stroke-width="2.5" d="M13 2 L23 12 M23 2 L13 12"></path>`}</svg>`;
}

/** @returns {unknown} */
function handLine() {
  return html`<svg width="36" height="8" aria-hidden="true">${svg`<line class="sample-hand" x1="0" y1="4" x2="36" y2="4"></line><line class="sample-core" x1="0" y1="4" x2="36" y2="4"></line>`}</svg>`;
}
