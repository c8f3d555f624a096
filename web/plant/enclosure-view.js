import { html, nothing } from "lit";
import { ask, pathTo } from "../server/index.js";
import { link } from "../address/index.js";
import { figure } from "../basis/index.js";
import { wind } from "../quantity/index.js";
import { RecordView } from "./record-view.js";
import { cutLink, fact, heading } from "./parts.js";
import { enclosureDiagram } from "./enclosure-diagram.js";
import { joinedTable } from "./joined-table.js";
import { panelsOf, splittersOf } from "./boxes.js";

/** @typedef {import("../server/contract.d.ts").Enclosure} Enclosure */
/** @typedef {import("../server/contract.d.ts").Leg} Leg */

/**
 * An enclosure: drawn in plan, then its legs, what is joined, and what is not.
 * @extends {RecordView<Enclosure>}
 */
export class EnclosureView extends RecordView {
  constructor() {
    super();
    /** @type {Set<string>} names of the panels and splitters that are open */
    this.open = new Set();
    this.boxes = {
      isOpen: (/** @type {string} */ name) => this.open.has(name),
      set: (/** @type {string} */ name, /** @type {boolean} */ open) => this.setBox(name, open),
    };
  }

  /** @param {string} name @param {boolean} open */
  setBox(name, open) {
    if (open) this.open.add(name);
    else this.open.delete(name);
    this.requestUpdate();
  }

  /** @param {AbortSignal} signal @override */
  question(signal) {
    this.open.clear();
    return ask(pathTo("enclosures", this.code), {}, signal);
  }

  /** @param {Enclosure} it @returns {import("./record-view.js").Shown} @override */
  shownOf(it) {
    return { label: it.code, points: [[it.lon, it.lat]] };
  }

  /** @param {Enclosure} it @override */
  draw(it) {
    return html`${heading(`${it.kind} in ${it.structure_kind} ${it.structure}`, it.code, it.state)}
      ${enclosureDiagram(it)}
      <dl class="facts">
        ${fact("Structure", link("structure", it.structure))}
        ${fact("Tray glass", html`${figure(`Glass between sheath and joint in ${it.code}`, "length", it.tray_glass_m, { how: "recorded", changed: it.changed })} <span class="lighter">each side of a joint</span>`)}
        ${fact("Outage", cutLink("enclosure", it.code))}
        ${fact("Note", it.note)}
      </dl>
      ${joinedTable(it)}${this.legs(it)}${panelsOf(it, this.boxes)}${splittersOf(it, this.boxes)}
      ${this.changedLine(it.changed, it.posting)}`;
  }

  /** @param {Enclosure} it @returns {unknown} */
  legs(it) {
    if (it.legs.length === 0) return nothing;
    return html`<h2>Legs</h2><table><thead><tr><th>Leg</th><th>Toward</th><th class="right">Sheath</th><th>Fibers here</th></tr></thead>
      <tbody>${it.legs.map((leg) => html`<tr><td>${link("cable", leg.cable)} ${leg.side}</td>
        <td>${link("structure", leg.to_structure)}${leg.bearing_deg === null ? "" : html` <span class="lighter">${wind(leg.bearing_deg)}</span>`}
          ${leg.to_enclosure ? html`<br><span class="lighter">next</span> ${link("enclosure", leg.to_enclosure)}` : nothing}</td>
        <td class="right">${figure(`Sheath of ${leg.cable} from ${it.code} to the next enclosure`, "length", leg.sheath_m, { how: leg.length_basis, source: markSource(leg) })}</td>
        <td>${statesOf(leg)}</td></tr>`)}</tbody></table>`;
  }
}

/**
 * @param {Leg} leg
 * @returns {string}
 */
function markSource(leg) {
  if (leg.mark === null) return "No mark read at this enclosure";
  return `${leg.mark.ink} mark ${leg.mark.value} ${leg.mark.unit} at this enclosure${leg.mark.read_on ? `, read ${leg.mark.read_on}` : ""}`;
}

/**
 * Every fiber of a leg and what becomes of it, neighbours alike together.
 * @param {Leg} leg
 * @returns {unknown}
 */
function statesOf(leg) {
  /** @type {Array<{ state: string, ranges: string[] }>} */
  const states = [];
  for (const end of leg.ends) {
    const known = states.find((each) => each.state === end.state);
    if (known) known.ranges.push(end.fibers);
    else states.push({ state: end.state, ranges: [end.fibers] });
  }
  const words = (/** @type {string} */ state) => (state === "unrecorded" ? "not opened" : state === "unknown" ? "not known" : state);
  return states.map(({ state, ranges }) => html`<div class=${state === "unknown" ? "trust-unknown" : ""}><span class="number">${joinRanges(ranges)}</span> ${words(state)}</div>`);
}

/**
 * @param {string[]} ranges rising
 * @returns {string} neighbours joined
 */
function joinRanges(ranges) {
  /** @type {Array<[number, number]>} */
  const spans = [];
  for (const range of ranges) {
    const [first = 0, last = first] = range.split("-").map(Number);
    const before = spans.at(-1);
    if (before && before[1] + 1 === first) before[1] = last;
    else spans.push([first, last]);
  }
  return spans.map(([first, last]) => (first === last ? `${first}` : `${first}-${last}`)).join(", ");
}

customElements.define("sw-enclosure", EnclosureView);
