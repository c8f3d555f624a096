import { html, nothing } from "lit";
import { ask, pathTo } from "../server/index.js";
import { link } from "../address/index.js";
import { figure } from "../basis/index.js";
import { RecordView } from "./record-view.js";
import { cutLink, fact, heading } from "./parts.js";
import { usesInWords } from "./uses.js";

/** @typedef {import("../server/contract.d.ts").Span} Span */

/**
 * A span: its route, its placement, the cables that lie on it.
 * @extends {RecordView<Span>}
 */
export class SpanView extends RecordView {
  /** @param {AbortSignal} signal @override */
  question(signal) {
    return ask(pathTo("spans", this.code), {}, signal);
  }

  /** @param {Span} it @returns {import("./record-view.js").Shown | null} @override */
  shownOf(it) {
    return it.line === null ? null : { label: it.code, points: /** @type {Array<[number, number]>} */ (it.line) };
  }

  /** @param {Span} it @override */
  draw(it) {
    return html`${heading(`span, ${it.placement}`, it.code, it.state)}
      <dl class="facts">
        ${fact("Between", html`${link("structure", it.from)} and ${link("structure", it.to)}`)}
        ${fact("Route", figure(`Route of span ${it.code}`, "length", it.length_m, { how: it.length_basis, changed: it.changed }))}
        ${fact("Circuits on it", figure(`Working circuits on ${it.code}`, "count", it.circuits, { how: "counted", source: "Circuits whose path lies on this span" }))}
        ${fact("Outage", cutLink("span", it.code))}
        ${fact("Shares", it.shared_risk.length > 0 ? it.shared_risk.join(", ") : null)}
        ${fact("Note", it.note)}
      </dl>
      <h2>Cables on it</h2>
      <table><thead><tr><th>Cable</th><th>Duct</th><th class="right">Sheath</th><th>Fibers</th></tr></thead>
        <tbody>${it.cables.map(
          (each) => html`<tr><td>${link("cable", each.cable)}</td><td>${each.duct ?? nothing}</td>
            <td class="right">${figure(`Sheath of ${each.cable} on this span`, "length", each.sheath_m, { how: each.sheath_basis })}</td>
            <td>${each.fibers}: ${usesInWords(each.uses)}</td></tr>`,
        )}</tbody></table>
      ${this.changedLine(it.changed, it.posting)}`;
  }
}

customElements.define("sw-span", SpanView);
