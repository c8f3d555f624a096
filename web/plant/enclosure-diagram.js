import { html, nothing, svg } from "lit";
import { parseColor, patchShapes } from "../color/index.js";
import { wind } from "../quantity/index.js";
import { tubeOf } from "./ends.js";
import { endAtBox } from "./enclosure-boxes.js";
import { DRAWING, layOut, onOutline, rangesText, throughRanges, wayRound, widthOf } from "./enclosure-layout.js";
import { placeLabels } from "./labels.js";

/** @typedef {import("../server/contract.d.ts").Enclosure} Enclosure */
/** @typedef {import("./enclosure-layout.js").Layout} Layout */
/** @typedef {import("./enclosure-layout.js").Gate} Gate */
/** @typedef {import("./enclosure-layout.js").Point} Point */
/** @typedef {import("./enclosure-bands.js").Band} Band */
/** @typedef {import("./enclosure-bands.js").Side} Side */

/** How far a leg is drawn outside the outline, px. */
const LEG = 34;

/**
 * The enclosure in plan: legs in their true direction, a band a range.
 * @param {Enclosure} enclosure
 * @returns {unknown}
 */
export function enclosureDiagram(enclosure) {
  if (enclosure.legs.length === 0) return html`<p class="lighter">No cable enters it.</p>`;
  const layout = layOut(enclosure);
  const bands = layout.bands.map((band) => ({ band, curve: curveOf(band, layout) }));
  return html`<figure class="enclosure-diagram">
    <svg viewBox=${`0 0 ${DRAWING.width} ${DRAWING.height}`} role="img" aria-label=${spoken(enclosure)}>
      ${north()}
      ${throughBars(layout)}
      <ellipse class="outline" cx=${DRAWING.cx} cy=${DRAWING.cy} rx=${DRAWING.rx} ry=${DRAWING.ry}></ellipse>
      ${layout.gates.map((gate) => drawnLeg(gate, layout.scale))}
      ${bands.map(({ band, curve }) => drawnBand(band, curve, widthOf(band.count, layout.scale)))}
      ${layout.boxes.map((box) => svg`<g class="box"><rect x=${box.x - box.width / 2} y=${box.y - box.height / 2} width=${box.width} height=${box.height}></rect>
        <text x=${box.x} y=${box.y + 4}>${box.label}</text></g>`)}
      ${layout.gates.map((gate) => rests(gate))}
      ${layout.gates.map((gate) => slotChips(gate))}
      ${bandLabels(bands, layout)}
    </svg>
  </figure>`;
}

/**
 * @param {Enclosure} enclosure
 * @returns {string}
 */
function spoken(enclosure) {
  const legs = enclosure.legs.map((leg) => `${leg.cable} ${leg.side} toward ${leg.to_structure ?? "nothing"}`);
  return `${enclosure.code} in plan. Legs: ${legs.join("; ")}. The joints are listed below.`;
}

/** @returns {unknown} the north sign */
function north() {
  return svg`<g class="north"><path d="M16 34 V10 M11 16 L16 8 L21 16"></path><text x="16" y="46">N</text></g>`;
}

/**
 * @param {Gate} gate
 * @param {number} scale px a fiber
 * @returns {unknown}
 */
function drawnLeg(gate, scale) {
  const { leg } = gate;
  const from = onOutline(gate.at);
  const to = { x: from.x + LEG * Math.sin(gate.bearing), y: from.y - LEG * Math.cos(gate.bearing) };
  const side = Math.sin(gate.bearing);
  const anchor = side > 0.35 ? "start" : side < -0.35 ? "end" : "middle";
  const toward = leg.to_structure === null ? "nowhere" : `${leg.to_structure}${leg.bearing_deg === null ? "" : `, ${wind(leg.bearing_deg)}`}`;
  const lines = [`to ${toward}`, ...gate.slots.flatMap((slot) => (slot.of.what === "rest" ? [restText(slot.of)] : []))];
  const x = to.x + (anchor === "start" ? 5 : anchor === "end" ? -5 : 0);
  const below = Math.cos(gate.bearing) < 0;
  const y = anchor !== "middle" ? to.y - 2 : below ? to.y + 13 : to.y - 7 - 13 * lines.length;
  return svg`<g class="leg"><title>${`${leg.cable} ${leg.side}, ${leg.fibers} fibers`}</title>
    <line x1=${from.x} y1=${from.y} x2=${to.x} y2=${to.y} stroke-width=${Math.min(12, Math.max(3, widthOf(leg.fibers, scale) / 3))}></line>
    <text class="leg-name" x=${x} y=${y} text-anchor=${anchor}>${leg.cable} ${leg.side}</text>
    ${lines.map((line, index) => svg`<text class="leg-toward" x=${x} y=${y + 13 * (index + 1)} text-anchor=${anchor}>${line}</text>`)}</g>`;
}

/**
 * @param {import("./enclosure-bands.js").Rest} rest
 * @returns {string}
 */
function restText({ ranges, state }) {
  return `${rangesText(ranges)} ${state === "unknown" ? "not known" : state}`;
}

/**
 * @typedef {object} Curve a band's middle line: a cubic of Bezier
 * @property {Point} p0
 * @property {Point} p1
 * @property {Point} p2
 * @property {Point} p3
 */

/**
 * @param {Band} band
 * @param {Layout} layout
 * @returns {Curve}
 */
function curveOf(band, layout) {
  const p0 = endOf(band, band.a, layout);
  const p3 = endOf(band, band.b, layout);
  return { p0: p0.at, p1: p0.toward, p2: p3.toward, p3: p3.at };
}

/**
 * @param {Band} band
 * @param {Side} side
 * @param {Layout} layout
 * @returns {{ at: Point, toward: Point }} where the band ends, and the point it heads for
 */
function endOf(band, side, layout) {
  const gate = layout.gates.find((each) => each.id === side.gate);
  const slot = gate?.slots.find((each) => each.of === band);
  if (!gate || !slot) return endAtBox(band, side, layout);
  const at = onOutline(slot.at);
  const middle = onOutline(gate.at);
  return { at, toward: { x: at.x + (DRAWING.cx - middle.x) * 0.62, y: at.y + (DRAWING.cy - middle.y) * 0.62 } };
}

/**
 * @param {Curve} curve
 * @returns {string} for the d of an SVG path
 */
function pathOf({ p0, p1, p2, p3 }) {
  return `M${p0.x} ${p0.y} C${p1.x} ${p1.y} ${p2.x} ${p2.y} ${p3.x} ${p3.y}`;
}

/**
 * @param {Band} band
 * @param {Curve} curve
 * @param {number} width px
 * @returns {unknown}
 */
function drawnBand(band, curve, width) {
  const said = `${band.a.of} ${band.a.numbers} = ${band.b.of} ${band.b.numbers}${band.trust === "known" ? "" : `, trust ${band.trust}`}`;
  return svg`<g class=${`band trust-${band.trust}`}><title>${said}</title>
    <path class="band-edge" d=${pathOf(curve)} stroke-width=${width}></path>
    ${width > 3 ? svg`<path class="band-body" d=${pathOf(curve)} stroke-width=${width - 1.6}></path>` : nothing}</g>`;
}

/**
 * @param {Array<{ band: Band, curve: Curve }>} bands
 * @param {Layout} layout
 * @returns {unknown}
 */
function bandLabels(bands, layout) {
  const wanted = bands.map(({ band, curve }) => {
    const trays = band.trays.length === 0 ? "" : band.trays.length === 1 ? ` tray ${band.trays[0]}` : ` trays ${band.trays[0]} to ${band.trays.at(-1)}`;
    return { text: `${sideText(band.a)} = ${sideText(band.b)}`, more: trays, along: (/** @type {number} */ t) => pointAt(curve, t), weight: band.count };
  });
  return placeLabels(wanted, layout.boxes).map((label) => svg`<text class="band-label" x=${label.x} y=${label.y + 4}>${label.text}<tspan class="band-tray">${label.more}</tspan></text>`);
}

/**
 * @param {Side} side
 * @returns {string}
 */
function sideText(side) {
  return side.gate ? side.numbers : `${side.of} ${side.numbers}`;
}

/**
 * @param {Curve} curve
 * @param {number} t 0 to 1
 * @returns {Point}
 */
function pointAt({ p0, p1, p2, p3 }, t) {
  const u = 1 - t;
  const mix = (/** @type {"x" | "y"} */ k) => u ** 3 * p0[k] + 3 * u * u * t * p1[k] + 3 * u * t * t * p2[k] + t ** 3 * p3[k];
  return { x: mix("x"), y: mix("y") };
}

/**
 * What goes through, as one plain bar round the outside.
 * @param {Layout} layout
 * @returns {unknown}
 */
function throughBars(layout) {
  const ahead = layout.gates.filter((gate) => gate.leg.side === "ahead");
  return ahead.map((gate, index) => {
    const back = layout.gates.find((each) => each.leg.cable === gate.leg.cable && each.leg.side === "back");
    const ranges = throughRanges(gate.leg);
    if (!back || ranges.length === 0) return nothing;
    const beyond = 11 + index * 12;
    const turn = wayRound(back, gate, layout.gates);
    const from = onOutline(back.at, beyond);
    const to = onOutline(gate.at, beyond);
    const middle = onOutline(back.at + turn / 2, beyond);
    const flags = `${Math.abs(turn) > Math.PI ? 1 : 0} ${turn > 0 ? 1 : 0}`;
    const arc = `M${from.x} ${from.y} A${DRAWING.rx + beyond} ${DRAWING.ry + beyond} 0 ${flags} ${to.x} ${to.y}`;
    return svg`<g class="through"><title>${`${gate.leg.cable} ${ranges.join(", ")} through`}</title><path d=${arc}></path>
      <text x=${middle.x} y=${middle.y + 4}>${`${gate.leg.cable} ${rangesText(ranges)} through`}</text></g>`;
  });
}

/**
 * Ends that nothing is joined to: a bar stop where capped, a ring where stored, a question mark where not known.
 * @param {Gate} gate
 * @returns {unknown}
 */
function rests(gate) {
  return gate.slots.map((slot) => {
    if (slot.of.what !== "rest") return nothing;
    const { state, ranges } = slot.of;
    const out = onOutline(slot.at);
    const tip = onOutline(slot.at, -26);
    const [dx, dy] = [Math.cos(slot.at) * 7, Math.sin(slot.at) * 7];
    const sign = state === "capped"
      ? svg`<line class="stop" x1=${tip.x - dx} y1=${tip.y - dy} x2=${tip.x + dx} y2=${tip.y + dy}></line>`
      : state === "stored" ? svg`<circle cx=${tip.x} cy=${tip.y} r="5"></circle>` : svg`<text class="asks" x=${tip.x} y=${tip.y + 4}>?</text>`;
    return svg`<g class="rest"><title>${`${gate.leg.cable} ${gate.leg.side} ${ranges.join(", ")} ${state}`}</title>
      <line x1=${out.x} y1=${out.y} x2=${tip.x} y2=${tip.y} stroke-width=${Math.min(slot.width, 8)}></line>${sign}</g>`;
  });
}

/**
 * The tube's colour at each band's gate, where the band lies in one tube.
 * @param {Gate} gate
 * @returns {unknown}
 */
function slotChips(gate) {
  return gate.slots.map((slot) => {
    if (slot.of.what !== "band") return nothing;
    const side = slot.of.a.gate === gate.id ? slot.of.a : slot.of.b;
    const tube = tubeOf(gate.leg, side.numbers);
    if (tube === null) return nothing;
    const at = onOutline(slot.at, -1);
    return svg`<g class="slot-chip"><title>${`tube ${tube}, ${gate.leg.tube_colors[tube - 1] ?? ""}`}</title>${patchShapes(parseColor(gate.leg.tube_colors[tube - 1] ?? ""), at.x - 5, at.y - 4, 10, 8)}</g>`;
  });
}
