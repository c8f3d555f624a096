import { html, nothing } from "lit";
import { ask } from "../server/index.js";
import { link } from "../address/index.js";
import { RecordView } from "./record-view.js";

/** @typedef {import("../server/contract.d.ts").CircuitList} CircuitList */

/** Circuits asked for at once. */
const PAGE = 100;

/**
 * Circuits by code.
 * @extends {RecordView<CircuitList>}
 */
export class CircuitsView extends RecordView {
  constructor() {
    super();
    /** @type {string} only codes that begin so */
    this.begins = "";
  }

  /** @param {AbortSignal} signal @override */
  question(signal) {
    return ask("/circuits", { prefix: this.begins, limit: PAGE }, signal);
  }

  /** @param {string | null} after */
  async more(after) {
    const before = this.asking.answer;
    await this.asking.run((signal) => ask("/circuits", { prefix: this.begins, limit: PAGE, after }, signal));
    const next = this.asking.answer;
    if (before && next && next !== before) this.asking.answer = { ...next, circuits: [...before.circuits, ...next.circuits] };
    this.requestUpdate();
  }

  /** @param {Event} event */
  narrow(event) {
    this.begins = /** @type {HTMLInputElement} */ (event.target).value;
    void this.reload(false);
  }

  /** @override */
  render() {
    return html`<h1>Circuits</h1>
      <p class="chooser"><label>Code begins <input type="search" .value=${this.begins} @input=${this.narrow}></label></p>${super.render()}`;
  }

  /** @param {CircuitList} it @override */
  draw(it) {
    return html`<table><thead><tr><th>Circuit</th><th class="right">Priority</th><th>Service</th><th>From, to</th></tr></thead>
      <tbody>${it.circuits.map((each) => html`<tr><td>${link("circuit", each.circuit)}</td><td class="right">${each.priority}</td>
        <td>${each.service ?? nothing}${each.status === "working" ? nothing : html` <strong>${each.status}</strong>`}${each.customer ? html`<br><span class="lighter">${each.customer}</span>` : nothing}</td>
        <td class="ends">${each.a}<br>${each.z}</td></tr>`)}</tbody></table>
      <p class="lighter">${it.circuits.length} of ${it.total}.${it.next === null ? nothing : html` <button type="button" @click=${() => this.more(it.next)}>Show more</button>`}</p>`;
  }
}

customElements.define("sw-circuits", CircuitsView);
