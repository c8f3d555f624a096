import { html, nothing } from "lit";
import { askAnytime } from "../server/index.js";
import { link } from "../address/index.js";
import { decimal, timeInWords } from "../quantity/index.js";
import { RecordView } from "./record-view.js";
import { heading } from "./parts.js";

/** @typedef {import("../server/contract.d.ts").PostingList} PostingList */
/** @typedef {import("../server/contract.d.ts").Posting} Posting */

/**
 * The postings, latest first.
 * @extends {RecordView<PostingList>}
 */
export class PostingsView extends RecordView {
  /** @param {AbortSignal} signal @override */
  question(signal) {
    return askAnytime("/postings", {}, signal);
  }

  /** @param {number | null} before */
  async more(before) {
    const shown = this.asking.answer;
    await this.asking.run((signal) => askAnytime("/postings", { before }, signal));
    const next = this.asking.answer;
    if (shown && next && next !== shown) this.asking.answer = { ...next, postings: [...shown.postings, ...next.postings] };
    this.requestUpdate();
  }

  /** @param {PostingList} it @override */
  draw(it) {
    return html`<h1>Postings</h1><table><thead><tr><th class="right">Posting</th><th>When</th><th>Who and why</th><th class="right">Changes</th></tr></thead>
      <tbody>${it.postings.map((each) => html`<tr><td class="right">${link("posting", String(each.posting))}</td><td>${timeInWords(each.time, this.zone)}</td>
        <td>${each.by}<br><span class="lighter">${each.reason}</span></td><td class="right">${decimal(each.changes, 0)}</td></tr>`)}</tbody></table>
      ${it.next === null ? nothing : html`<p><button type="button" @click=${() => this.more(it.next)}>Show earlier ones</button></p>`}`;
  }
}

/**
 * One posting: what it changed, before and after.
 * @extends {RecordView<Posting>}
 */
export class PostingView extends RecordView {
  /** @param {AbortSignal} signal @override */
  question(signal) {
    return askAnytime(`/postings/${encodeURIComponent(this.code)}`, {}, signal);
  }

  /** @param {number | null} from */
  async more(from) {
    const shown = this.asking.answer;
    await this.asking.run((signal) => askAnytime(`/postings/${encodeURIComponent(this.code)}`, { from_change: from }, signal));
    const next = this.asking.answer;
    if (shown && next && next !== shown) this.asking.answer = { ...next, changes: [...shown.changes, ...next.changes] };
    this.requestUpdate();
  }

  /** @param {Posting} it @override */
  draw(it) {
    return html`${heading("posting", String(it.posting))}
      <p>${it.by}, ${timeInWords(it.time, this.zone)}: ${it.reason}</p>
      <p class="lighter">${decimal(it.changes_total, 0)} ${it.changes_total === 1 ? "change" : "changes"}.</p>
      <table class="changes"><thead><tr><th>Changed</th><th>Before</th><th>After</th></tr></thead>
      <tbody>${it.changes.map((each) => html`<tr><td>${each.action === "change" ? "changed" : each.action === "add" ? "added" : "removed"}<br>
        <span class="lighter">${each.table.replaceAll("_", " ")}</span>${each.code ? html`<br>${each.code}` : nothing}</td>
        <td>${row(each.before, each.after)}</td><td>${row(each.after, each.before)}</td></tr>`)}</tbody></table>
      ${it.next_change === null ? nothing : html`<p><button type="button" @click=${() => this.more(it.next_change)}>Show more changes</button></p>`}`;
  }
}

/**
 * A row's columns, those that differ from the other row in strong ink.
 * @param {Record<string, string | number | null> | null} one
 * @param {Record<string, string | number | null> | null} other
 * @returns {unknown}
 */
function row(one, other) {
  if (one === null) return html`<span class="lighter">nothing</span>`;
  const columns = Object.entries(one).filter(([name, value]) => value !== null && value !== "" && (other === null || other[name] !== value));
  if (columns.length === 0) return html`<span class="lighter">the same</span>`;
  return columns.map(([name, value]) => html`<div><span class="lighter">${name.replaceAll("_", " ")}</span> ${value}</div>`);
}

customElements.define("sw-postings", PostingsView);
customElements.define("sw-posting", PostingView);
