import { html, nothing, svg } from "lit";
import { METRES_PER_FOOT, decimal, units } from "../quantity/index.js";

/** Metres round the equator at zoom 0, a pixel (EPSG:3857). */
const METRES_PER_PIXEL = 156543.03392804097;

/** Longest bar, px. */
const LONGEST = 120;

/**
 * A bar as long as a round distance, at the middle of the screen.
 * @param {import("leaflet").Map | null} map
 * @param {boolean} ready whether the map has been placed
 * @returns {unknown}
 */
export function scaleBar(map, ready) {
  if (!map || !ready) return nothing;
  const perPixel = (METRES_PER_PIXEL * Math.cos((map.getCenter().lat * Math.PI) / 180)) / 2 ** map.getZoom();
  const { text, metres } = roundDistance(LONGEST * perPixel, units.unit);
  const width = metres / perPixel;
  return html`<div class="scale-bar"><svg width=${Math.ceil(width) + 2} height="8" aria-hidden="true">${svg`<path d=${`M1 0 V7 H${width + 1} V0`}></path>`}</svg> ${text}</div>`;
}

/**
 * The longest round distance that fits.
 * @param {number} metres
 * @param {"m" | "ft"} unit
 * @returns {{ text: string, metres: number }}
 */
export function roundDistance(metres, unit) {
  const each = unit === "m" ? 1 : METRES_PER_FOOT;
  const fits = metres / each;
  const power = 10 ** Math.floor(Math.log10(fits));
  const round = ([5, 2, 1].find((factor) => factor * power <= fits) ?? 1) * power;
  return { text: `${decimal(round, round < 1 ? 1 : 0)} ${unit}`, metres: round * each };
}
