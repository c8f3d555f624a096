import { html, nothing } from "lit";
import { ask, pathTo } from "../server/index.js";
import { link } from "../address/index.js";
import { figure } from "../basis/index.js";
import { decimal, wind } from "../quantity/index.js";
import { RecordView } from "./record-view.js";
import { cutLink, fact, heading, listed, marksRead } from "./parts.js";

/** @typedef {import("../server/contract.d.ts").Structure} Structure */
/** @typedef {import("../server/contract.d.ts").RunRowHere} RunRowHere */

/**
 * A structure: its enclosures, the spans that meet there, the cables that visit it.
 * @extends {RecordView<Structure>}
 */
export class StructureView extends RecordView {
  /** @param {AbortSignal} signal @override */
  question(signal) {
    return ask(pathTo("structures", this.code), {}, signal);
  }

  /** @param {Structure} it @returns {import("./record-view.js").Shown} @override */
  shownOf(it) {
    return { label: it.code, points: [[it.lon, it.lat]] };
  }

  /** @param {Structure} it @override */
  draw(it) {
    const recorded = { how: "recorded", changed: it.changed };
    return html`${heading(it.kind === "point" ? "marked place" : it.kind, it.code, it.state)}
      <dl class="facts">
        ${fact("Address", it.address)}
        ${fact("Position", html`<span class="number">${decimal(it.lat, 6)}, ${decimal(it.lon, 6)}</span>`)}
        ${fact("Within", figure(`Accuracy of ${it.code}'s position`, "length", it.accuracy_m, recorded))}
        ${fact("Shares", it.shared_risk.length > 0 ? it.shared_risk.join(", ") : null)}
        ${fact("Outage", cutLink("structure", it.code))}
        ${fact("Note", it.note)}
      </dl>
      <h2>Enclosures</h2>
      ${it.enclosures.length === 0 ? html`<p class="lighter">None here.</p>` : html`<ul class="plain">${it.enclosures.map(
        (each) => html`<li>${link("enclosure", each.enclosure)} <span class="lighter">${each.kind}, ${each.cables} ${each.cables === 1 ? "cable" : "cables"}${each.state === "in service" ? "" : `, ${each.state}`}</span></li>`,
      )}</ul>`}
      ${this.spans(it)}${this.cables(it)}${this.changedLine(it.changed, it.posting)}`;
  }

  /** @param {Structure} it @returns {unknown} */
  spans(it) {
    return html`<h2>Spans</h2><table><thead><tr><th>Span</th><th>Toward</th><th>Placed</th><th class="right">Fibers</th><th class="right">Route</th></tr></thead>
      <tbody>${it.spans.map(
        (each) => html`<tr><td>${link("span", each.span)}</td>
          <td>${link("structure", each.to)}${each.bearing_deg === null ? nothing : html` <span class="lighter">${wind(each.bearing_deg)}</span>`}</td>
          <td>${each.placement}${each.state === "in service" ? "" : `, ${each.state}`}</td>
          <td class="right">${each.fibers}</td>
          <td class="right">${figure(`Route of span ${each.span}`, "length", each.length_m, { how: each.length_basis })}</td></tr>`,
      )}</tbody></table>`;
  }

  /** @param {Structure} it @returns {unknown} */
  cables(it) {
    if (it.cables.length === 0) return html`<h2>Cables</h2><p class="lighter">None visits it.</p>`;
    return html`<h2>Cables</h2><table><thead><tr><th>Cable</th><th>Enters</th><th>Sheath marks</th><th class="right">Coil</th></tr></thead>
      <tbody>${it.cables.map((row) => this.row(row))}</tbody></table>`;
  }

  /** @param {RunRowHere} row @returns {unknown} */
  row(row) {
    const coil = { how: row.slack_trust === "unknown" ? "unknown" : "recorded", trust: row.slack_trust, source: row.slack_on ? `Coil seen ${row.slack_on}` : "When the coil was seen is not recorded" };
    return html`<tr><td>${link("cable", row.cable)}</td>
      <td>${row.enclosure === null ? html`<span class="lighter">passes unseen</span>` : link("enclosure", row.enclosure)}</td>
      <td>${listed([marksRead(row.marks)])}</td>
      <td class="right">${row.slack_m > 0 ? figure(`Coil of ${row.cable}`, "length", row.slack_m, coil) : html`<span class="lighter">none</span>`}</td></tr>`;
  }
}

customElements.define("sw-structure", StructureView);
