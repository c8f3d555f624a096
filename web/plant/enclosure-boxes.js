import { DRAWING } from "./enclosure-layout.js";

/** @typedef {import("./enclosure-layout.js").Layout} Layout */
/** @typedef {import("./enclosure-layout.js").Box} Box */
/** @typedef {import("./enclosure-layout.js").Point} Point */
/** @typedef {import("./enclosure-bands.js").Band} Band */
/** @typedef {import("./enclosure-bands.js").Side} Side */

/** How far a band runs straight out of a box, px. */
const STRAIGHT = 26;

/**
 * Where a band ends at a box: on the side that faces the leg at the band's other end, beside the others there.
 * @param {Band} band
 * @param {Side} side
 * @param {Layout} layout
 * @returns {{ at: Point, toward: Point }} where it ends, and the point it heads for
 */
export function endAtBox(band, side, layout) {
  const box = layout.boxes.find((each) => each.id === side.box);
  if (!box) return { at: { x: DRAWING.cx, y: DRAWING.cy }, toward: { x: DRAWING.cx, y: DRAWING.cy } };
  const facing = facingOf(band, side, box, layout);
  const beside = layout.bands.filter((each) => sideAt(each, box.id).some((one) => facingOf(each, one, box, layout) === facing));
  const share = (beside.indexOf(band) + 1) / (beside.length + 1) - 0.5;
  if (facing === "top" || facing === "bottom") {
    const way = facing === "top" ? -1 : 1;
    const at = { x: box.x + share * (box.width - 12), y: box.y + (way * box.height) / 2 };
    return { at, toward: { x: at.x, y: at.y + way * STRAIGHT } };
  }
  const way = facing === "right" ? 1 : -1;
  const at = { x: box.x + (way * box.width) / 2, y: box.y + share * (box.height - 4) };
  return { at, toward: { x: at.x + way * STRAIGHT, y: at.y } };
}

/**
 * @param {Band} band
 * @param {string} box
 * @returns {Side[]} its sides at a box
 */
function sideAt(band, box) {
  return [band.a, band.b].filter((side) => side.box === box);
}

/**
 * @param {Band} band
 * @param {Side} side
 * @param {Box} box
 * @param {Layout} layout
 * @returns {"top" | "bottom" | "left" | "right"}
 */
function facingOf(band, side, box, layout) {
  const other = side === band.a ? band.b : band.a;
  const gate = layout.gates.find((each) => each.id === other.gate);
  if (!gate) return "left";
  const up = Math.cos(gate.at);
  if (up > 0.8 && box === layout.boxes[0]) return "top";
  if (up < -0.8 && box === layout.boxes.at(-1)) return "bottom";
  return Math.sin(gate.at) >= 0 ? "right" : "left";
}
