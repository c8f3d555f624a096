import { html, svg } from "lit";
import { parseColor } from "./names.js";

/** Width of a chip drawn in a drawing, px, for a number of up to three figures. */
export const CHIP_WIDTH = 46;
const CHIP_HEIGHT = 14;
const PATCH = 11;

/**
 * A chip in text: the colour as a patch, its stripe drawn as a stripe, the code and the number.
 * @param {string} words colour as recorded
 * @param {number | string} number of the tube or fiber
 * @param {string} what `tube` or `fiber`, for those who hear the page
 * @returns {unknown}
 */
export function chip(words, number, what) {
  const color = parseColor(words);
  return html`<span class="chip" title=${`${what} ${number}, ${words}`}
    >${patch(color)}<span class="chip-code" aria-hidden="true">${color.code}</span
    ><span class="chip-number">${number}</span><span class="unseen">, ${what} ${number}, ${words}</span></span
  >`;
}

/**
 * The colour's patch alone, as an SVG so that it prints.
 * @param {import("./names.js").Color} color
 * @returns {unknown}
 */
export function patch(color) {
  return html`<svg class="chip-patch" width="12" height="12" viewBox="0 0 12 12" aria-hidden="true">
    ${patchShapes(color, 0.5, 0.5, PATCH, PATCH)}
  </svg>`;
}

/**
 * A chip in a drawing.
 * @param {string} words colour as recorded
 * @param {number | string} number
 * @param {number} x left side
 * @param {number} y upper side
 * @returns {unknown} SVG, {@link CHIP_WIDTH} wide
 */
export function drawnChip(words, number, x, y) {
  const color = parseColor(words);
  return svg`<g class="drawn-chip"><title>${words}</title>
    <rect class="chip-box" x=${x} y=${y} width=${CHIP_WIDTH - 2} height=${CHIP_HEIGHT}></rect>
    ${patchShapes(color, x + 1.5, y + 1.5, PATCH - 2, PATCH)}
    <text x=${x + PATCH + 2} y=${y + PATCH}>${color.code}${number}</text></g>`;
}

/**
 * @param {import("./names.js").Color} color
 * @param {number} x
 * @param {number} y
 * @param {number} width
 * @param {number} height
 * @returns {unknown}
 */
export function patchShapes(color, x, y, width, height) {
  const gap = height / (color.tracers + 1);
  const stripe = color.tracers > 2 ? 1.2 : 2.4;
  const stripes = Array.from({ length: Math.min(color.tracers, 4) }, (_, index) => y + gap * (index + 1) - stripe / 2);
  return svg`<rect class=${`patch c-${color.base}`} x=${x} y=${y} width=${width} height=${height}></rect>
    ${stripes.map((at) => svg`<rect class=${`stripe c-${color.tracer}`} x=${x} y=${at} width=${width} height=${stripe}></rect>`)}
    <rect class="patch-edge" x=${x} y=${y} width=${width} height=${height}></rect>`;
}
