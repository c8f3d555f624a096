import { html, nothing } from "lit";
import { currentAddress, formatAddress, link } from "../address/index.js";
import { figure } from "../basis/index.js";
import { decimal, timeInWords } from "../quantity/index.js";
import { KINDS } from "./incident-forms.js";
import { printLinks } from "./print-links.js";
import { minutesInWords } from "./times.js";

/** @typedef {import("../server/contract.d.ts").Incident} Incident */

/** The steps of the clock. @type {ReadonlyArray<readonly [Exclude<keyof Incident["clock"], "began">, string]>} */
const STEPS = Object.freeze([["called", "called"], ["on_site", "on site"], ["found", "found"], ["first_light", "first light"], ["all_light", "all light"], ["closed", "closed"]]);

/**
 * An incident: its clock, what it counts to, how far that is from what may have to be reported, its log.
 * @param {Incident} it
 * @param {string} zone
 * @returns {unknown}
 */
export function incidentSheet(it, zone) {
  const { counts } = it;
  const basis = { how: "counted", source: `The log of incident ${it.incident}, on the records as of posting ${it.posting}; counted ${timeInWords(it.counted_at, zone)}` };
  const here = currentAddress();
  const list = formatAddress({ ...here, asked: here.asked.filter(([name]) => name !== "incident") });
  return html`<h2 class="incident-title">${it.incident}. ${it.title} ${it.open ? html`<strong class="state-down">open</strong>` : html`<span class="lighter">closed</span>`}</h2>
    <p class="lighter">Begun by ${it.by}. <a href=${formatAddress({ ...here, asOf: String(it.posting) })}>Read the records as they stood then</a>, posting ${it.posting}. <a href=${list}>All incidents</a></p>
    <p class="sum">${figure("Customers down", "count", counts.customers_down, basis)} <span class="sum-word">customers down</span></p>
    <p>${figure("Circuits down", "count", counts.circuits_down.length, basis)} circuits <strong class="state-down">down</strong>, ${figure("Circuits back", "count", counts.circuits_back.length, basis)} back.
      ${counts.first_priority_down.length > 0 ? html`<strong>Priority 1 down: ${counts.first_priority_down.map((each, index) => html`${index > 0 ? ", " : ""}${link("circuit", each)}`)}.</strong>` : nothing}</p>
    ${counts.single_path.map((each) => html`<p><strong class="state-single">${each.protection_group}</strong> ${each.now ? "runs" : "ran"} on a single path, ${decimal(each.days, 2)} days in all.</p>`)}
    ${it.from.cuts.length > 0 ? printLinks("The cut list of the incident", "cut-list", [["incident", String(it.incident)]]) : nothing}
    ${clock(it, zone)}${thresholds(it, zone)}${log(it, zone)}`;
}

/**
 * @param {Incident} it
 * @param {string} zone
 * @returns {unknown}
 */
function clock({ clock: times }, zone) {
  const since = (/** @type {string} */ time) => minutesInWords((Date.parse(time) - Date.parse(times.began)) / 60000);
  return html`<h2>Clock</h2><table class="clock"><tbody><tr><th scope="row">began</th><td>${timeInWords(times.began, zone)}</td><td></td></tr>
    ${STEPS.map(([step, word]) => {
      const time = times[step];
      return html`<tr><th scope="row">${word}</th><td>${time ? timeInWords(time, zone) : html`<span class="lighter">not yet</span>`}</td><td class="right">${time ? since(time) : nothing}</td></tr>`;
    })}</tbody></table>`;
}

/**
 * @param {Incident} it
 * @param {string} zone
 * @returns {unknown} each count against what a regulator may ask, with the source of the figure; a person decides
 */
function thresholds({ thresholds: all, papers }, zone) {
  return html`<h2>What may have to be reported</h2><p class="lighter">The tool counts and warns; a person decides.</p>
    <table><thead><tr><th>Count</th><th class="right">So far</th><th class="right">Of</th><th>Reached</th></tr></thead><tbody>${all.map((each) => html`<tr><td>${each.title}<br><span class="lighter">${each.source}${each.note ? `; ${each.note}` : ""}</span></td>
      <td class="right">${each.value === null ? html`<span class="not-known">not stated</span>` : figure(each.title, "count", each.value, { how: "counted", source: each.basis })} ${each.unit}</td>
      <td class="right">${figure(`Threshold: ${each.title}`, "count", each.limit, { how: "recorded", source: `${each.source}${each.source_status ? ` (${each.source_status})` : ""}; setting ${each.setting}` })}</td>
      <td>${each.reached ? html`<strong class="state-down">reached</strong>` : "no"}${each.reached_at ? html` <span class="lighter">${timeInWords(each.reached_at, zone)}</span>` : nothing}</td></tr>`)}</tbody></table>
    <table><thead><tr><th>Paper</th><th>Due</th><th class="right">Left</th></tr></thead><tbody>${papers.map((each) => html`<tr><td>${each.title}<br><span class="lighter">${each.source}</span></td>
      <td>${each.due_at ? timeInWords(each.due_at, zone) : html`<span class="lighter">nothing has set it running</span>`}</td><td class="right">${each.left_minutes === null ? nothing : minutesInWords(each.left_minutes)}</td></tr>`)}</tbody></table>`;
}

/**
 * @param {Incident} it
 * @param {string} zone
 * @returns {unknown}
 */
function log({ log: entries }, zone) {
  const word = (/** @type {string} */ kind) => KINDS.find((each) => each.kind === kind)?.word ?? kind;
  return html`<h2>Log</h2>${entries.length === 0 ? html`<p class="lighter">Nothing is written yet.</p>` : html`<ol class="plain log">${entries.map((each) => html`<li class=${each.corrected_by ? "corrected" : ""}>
    <span class="number">${each.number}</span> ${timeInWords(each.at, zone)} <strong>${word(each.kind)}</strong> ${each.text ?? nothing}
    ${each.circuits.length > 0 ? html`<span class="lighter">${each.circuits.length} circuits: ${each.circuits.slice(0, 6).join(", ")}${each.circuits.length > 6 ? " ..." : ""}</span>` : nothing}
    ${each.users === null ? nothing : html`${each.users} users`} ${each.oc3 === null ? nothing : html`${each.oc3} OC3`}
    <span class="lighter">${each.by}${each.corrects ? `, in place of ${each.corrects}` : ""}${each.corrected_by ? `, replaced by ${each.corrected_by}` : ""}</span></li>`)}</ol>`}`;
}
