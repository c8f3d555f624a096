import { html, nothing } from "lit";
import { ask, pathTo } from "../server/index.js";
import { link } from "../address/index.js";
import { figure } from "../basis/index.js";
import { dayInWords } from "../quantity/index.js";
import { RecordView } from "./record-view.js";
import { cutLink, fact, heading, listed, marksRead } from "./parts.js";
import { tubeChart, tubeLegend } from "./tube-chart.js";

/** @typedef {import("../server/contract.d.ts").Cable} Cable */
/** @typedef {import("../server/contract.d.ts").CableRow} CableRow */

/** Rows of a run listed at once; the rest on demand. */
const ROWS_SHOWN = 40;

/**
 * A cable: its tube chart, its run with sheath positions and marks, its sections.
 * @extends {RecordView<Cable>}
 */
export class CableView extends RecordView {
  /** @override */
  static properties = { ...RecordView.properties, section: { state: true }, allRows: { state: true } };

  constructor() {
    super();
    /** @type {number} index of the section shown in the chart; -1: all along the cable */
    this.section = -1;
    /** @type {boolean} */
    this.allRows = false;
  }

  /** @param {AbortSignal} signal @override */
  question(signal) {
    this.section = -1;
    this.allRows = false;
    return ask(pathTo("cables", this.code), {}, signal);
  }

  /** @param {Cable} it @returns {import("./record-view.js").Shown} @override */
  shownOf(it) {
    return { label: it.code, points: /** @type {Array<[number, number]>} */ (it.line) };
  }

  /** @param {Cable} it @override */
  draw(it) {
    const sections = this.section < 0 ? it.sections : it.sections.slice(this.section, this.section + 1);
    return html`${heading(`cable, ${it.type.fibers} fibers${it.part_of ? `, part of ${it.part_of}` : ""}`, it.code, it.state)}
      ${this.facts(it)}
      <h2 id="tubes">Tubes</h2>
      <p class="chooser"><label>State <select @change=${(/** @type {Event} */ event) => this.choose(event)}>
        <option value="-1" ?selected=${this.section < 0}>anywhere along the cable</option>
        ${it.sections.map((each) => html`<option value=${each.index} ?selected=${each.index === this.section}>${each.from ?? `${each.from_structure} (bare)`} to ${each.to ?? `${each.to_structure} (bare)`}</option>`)}
      </select></label></p>
      ${tubeChart(it, sections)}${tubeLegend(it, sections)}
      ${this.flags(it)}${this.run(it)}${this.changedLine(it.changed, it.posting)}`;
  }

  /** @param {Event} event */
  choose(event) {
    this.section = Number(/** @type {HTMLSelectElement} */ (event.target).value);
  }

  /** @param {Cable} it @returns {unknown} */
  facts(it) {
    const basis = { how: it.length_basis, changed: it.changed };
    const first = it.rows[0]?.structure;
    const last = it.rows.at(-1)?.structure;
    return html`<dl class="facts">
      ${fact("From, to", html`${link("structure", first)} to ${link("structure", last)}`)}
      ${fact("Type", html`${it.type.code}: ${it.type.fibers_per_tube} fibers a ${it.type.ribbon ? "ribbon" : "tube"}, ${it.type.fiber_type}, ${it.type.colors} colours`)}
      ${fact("Sheath", figure(`Sheath of ${it.code}`, "length", it.sheath_m, basis))}
      ${fact("Route", figure(`Route of ${it.code}`, "length", it.route_m, { how: "sum", source: "Spans along its run" }))}
      ${fact("In coils", figure(`Sheath of ${it.code} in coils`, "length", it.slack_m, { how: "sum", source: "Coils along its run" }))}
      ${fact("Excess length", figure(`Excess length of ${it.code}'s glass over its sheath`, "percent", it.overlength_pct, { how: "recorded", source: it.overlength_source, changed: it.changed }))}
      ${fact("Reel", it.reel)}${fact("Laid", it.installed_on === null ? null : dayInWords(it.installed_on))}
      ${fact("Marks", `${it.marks_ink} set governs`)}${fact("Note", it.note)}
      ${fact("Outage", cutLink("cable", it.code))}${fact("", html`<span class="lighter">or a tube alone:</span> ${listed(it.tubes.map(({ tube }) => cutLink("tube", `${it.code}/${tube}`, String(tube))))}`)}
      ${fact("Other counts", it.counts.length > 0 ? it.counts.map((each) => `${each.fibers} is ${each.name} ${each.numbers}`).join("; ") : null)}
    </dl>`;
  }

  /** @param {Cable} it @returns {unknown} */
  flags(it) {
    if (it.flags.length === 0) return nothing;
    return html`<h2>Flags</h2><ul class="plain">${it.flags.map(
      (each) => html`<li><strong>${each.fibers} ${each.flag}</strong>${each.from || each.to ? ` ${each.from ?? "start"} to ${each.to ?? "end"}` : ""}
        <span class="lighter">${[each.owner, each.reason, each.until ? `until ${dayInWords(each.until)}` : null].filter(Boolean).join(", ")}</span></li>`,
    )}</ul>`;
  }

  /** @param {Cable} it @returns {unknown} */
  run(it) {
    const telling = it.rows.filter((row, index) => index === 0 || index === it.rows.length - 1 || row.enclosure || row.slack_m > 0 || row.marks.length > 0);
    const rows = this.allRows ? it.rows : telling.slice(0, ROWS_SHOWN);
    return html`<h2>Run</h2><table><thead><tr><th>Structure</th><th>Enters</th><th class="right">Sheath from start</th><th class="right">Coil</th><th>Marks</th></tr></thead>
      <tbody>${rows.map((row) => this.row(it, row))}</tbody></table>
      ${rows.length < it.rows.length
        ? html`<p><button type="button" @click=${() => (this.allRows = true)}>Show all ${it.rows.length} structures</button>
            <span class="lighter">Shown: ends, enclosures, coils and marks.</span></p>`
        : nothing}`;
  }

  /** @param {Cable} it @param {CableRow} row @returns {unknown} */
  row(it, row) {
    const coil = { how: row.slack_trust === "unknown" ? "unknown" : "recorded", trust: row.slack_trust, source: row.slack_on ? `Coil seen ${dayInWords(row.slack_on)}` : "When the coil was seen is not recorded" };
    return html`<tr><td>${link("structure", row.structure)}</td><td>${row.enclosure ? link("enclosure", row.enclosure) : nothing}</td>
      <td class="right">${figure(`Sheath of ${it.code} from its start to ${row.structure}`, "length", row.position_in_m, { how: row.position_basis })}</td>
      <td class="right">${row.slack_m > 0 ? figure(`Coil of ${it.code} at ${row.structure}`, "length", row.slack_m, coil) : nothing}</td>
      <td>${row.marks.length > 0 ? marksRead(row.marks) : nothing}</td></tr>`;
  }
}

customElements.define("sw-cable", CableView);
