import { html, nothing } from "lit";
import { link } from "../address/index.js";
import { inWords, length, units } from "../quantity/index.js";
import { daysOn } from "./times.js";

/** @typedef {import("../quantity/units.js").Unit} Unit */
/** @typedef {import("../server/contract.d.ts").Repair} Repair */
/** @typedef {import("./repair-part.js").RepairForm} RepairForm */
/** @typedef {import("./repair-order.js").Group} Group */
/** @typedef {import("./repair-order.js").Field} Field */

/** Circuits that are named one by one. */
const NAMED = 6;

/**
 * The form in which a repair is typed, in the order of a repair sheet.
 * @param {RepairForm} part
 * @returns {unknown}
 */
export function repairForm(part) {
  return html`<form class="desk-form repair" novalidate @submit=${part.submitted} @input=${part.edited} @change=${part.edited}>
    ${group(part, "cut", "The cut", html`${find("cable", "Cable cut", "cable", "FDR-S-2")}${find("span", "On the span", "span", "HH-S044_HH-S045", part.span)}${metred("at", "or along the sheath", "from its start")}`)}
    ${side(part, "first", "Toward the cable's start", "C-R1", "HH-S044")}
    ${side(part, "second", "Toward its end", "C-R2", "HH-S045")}
    ${group(part, "piece", "The piece let in", html`${field("type", "Cable type", "as the cut cable")}${metred("length", "Length", "as its route")}${field("reel", "Reel", "not known")}${metred("tray", "Glass in a new closure's tray", "0")}`)}
    ${group(part, "who", "Who and when", html`${field("spliced_by", "Spliced by", "crew")}${field("spliced_on", "On", "", "date", daysOn(Date.now(), 0))}${field("temporary_until", "Last day, if temporary", "", "date")}
      ${field("by", "Your name", "")}${field("reason", "Why", "", "text", `Repair of incident ${part.incident}: ${part.called}`)}`)}
    ${part.wrong.rest ? html`<p class="problem" role="alert" tabindex="-1">${part.wrong.rest}</p>` : nothing}
    <p class="act"><button type="submit" class="main" ?disabled=${part.busy}>Show what it makes</button> <span class="lighter">Nothing is kept yet.</span></p></form>`;
}

/** @param {RepairForm} part @param {"first" | "second"} name @param {string} legend @param {string} code @param {string} at @returns {unknown} */
function side(part, name, legend, code, at) {
  return group(part, name, legend, html`${field(`${name}_enclosure`, "Enclosure, old or new", code)}${find(`${name}_structure`, "At", "structure", at)}${metred(`${name}_slack`, "Slack used", "none")}`);
}

/** @param {RepairForm} part @param {Group} name @param {string} legend @param {unknown} fields @returns {unknown} */
function group(part, name, legend, fields) {
  const wrong = part.wrong[name];
  return html`<fieldset data-group=${name}><legend>${legend}</legend><div class="field-row">${fields}</div>${wrong ? html`<p class="problem" role="alert" tabindex="-1">${wrong}</p>` : nothing}</fieldset>`;
}

/** @param {Field} name @param {string} label @param {string} kind @param {string} hint @param {string} [value] @returns {unknown} */
function find(name, label, kind, hint, value = "") {
  return html`<sw-find-field data-field=${name} .name=${`repair-${name}`} .label=${label} .kinds=${[kind]} .hint=${hint} .value=${value}></sw-find-field>`;
}

/** @param {Field} name @param {string} label @param {string} hint @returns {unknown} */
function metred(name, label, hint) {
  return field(name, `${label}, ${units.unit}`, hint);
}

/** @param {Field} name @param {string} label @param {string} hint @param {string} [type] @param {string} [value] @returns {unknown} */
function field(name, label, hint, type = "text", value = "") {
  return html`<label class="plain-field" data-field=${name}>${label} <input type=${type} autocomplete=${name === "by" ? "name" : "off"} placeholder=${hint || nothing} .value=${value}></label>`;
}

/**
 * What a repair would make, and the question whether it shall.
 * @param {RepairForm} part
 * @param {Repair} repair
 * @returns {unknown}
 */
export function repairTried(part, repair) {
  const said = (/** @type {number} */ metres) => inWords(length(metres, units.unit));
  const [start, piece, end] = repair.parts;
  return html`<section class="tried" tabindex="-1" aria-label="What the repair makes"><p><strong>Into the records, as one posting:</strong> ${repair.joints} joints, ${repair.changes} changes.</p>
    <ul class="plain"><li><strong>cut</strong> ${repair.part_of} becomes ${start} and ${end}</li>
      <li><strong>let in</strong> ${piece}, ${said(repair.piece_m)} of sheath on ${said(repair.route_m)} of route</li>
      ${repair.joined.map((seam) => html`<li><strong>join</strong> ${seam.a} = ${seam.b} <span class="lighter">in ${seam.enclosure} at</span> ${link("structure", seam.structure)}${seam.slack_before_m === seam.slack_after_m ? nothing : html`, coil ${said(seam.slack_before_m)} to ${said(seam.slack_after_m)}`}</li>`)}
      ${repair.coils_removed_m > 0 ? html`<li><strong>gone</strong> ${said(repair.coils_removed_m)} that was coiled between the two</li>` : nothing}
      <li><strong>light for</strong> ${repair.circuits.length} circuits${repair.circuits.length > 0 ? `: ${named(repair.circuits)}` : ""}</li>
      ${repair.left_in_journal.length > 0 ? html`<li><strong>left in the journal</strong> ${repair.left_in_journal.length} measurements of glass that is there no longer</li>` : nothing}</ul>
    <p class="warning">Before anyone cuts or splices: the fibers proven dark by meter, ends of both sides told apart by test. The program knows records, not the trench.</p>
    <p class="act"><button type="button" class="main" ?disabled=${part.busy} @click=${part.post}>Post the repair</button> <button type="button" @click=${part.edited}>Not now</button></p></section>`;
}

/** @param {string[]} codes @returns {string} the first few */
function named(codes) {
  return codes.length > NAMED ? `${codes.slice(0, NAMED).join(", ")} and ${codes.length - NAMED} more` : codes.join(", ");
}

/**
 * A repair as a line of the log.
 * @param {Repair} repair
 * @param {Unit} unit
 * @returns {string}
 */
export function madeInWords(repair, unit) {
  const [first, second] = repair.joined;
  return `Repair, posting ${repair.posting}: ${repair.parts[1]}, ${inWords(length(repair.piece_m, unit))}, let in between ${first?.enclosure} at ${first?.structure} and ${second?.enclosure} at ${second?.structure}, ${repair.joints} joints`;
}
