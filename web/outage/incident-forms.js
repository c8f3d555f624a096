import { html, nothing } from "lit";
import { readList } from "./lists.js";
import { localTime, withOffset } from "./times.js";

/** @typedef {import("../server/contract.d.ts").Incident} Incident */
/** @typedef {import("./incident-part.js").IncidentPart} IncidentPart */

/** Kinds of entries that a person writes, in the order of a usual incident. @type {ReadonlyArray<{ kind: Incident["log"][number]["kind"], word: string }>} */
export const KINDS = Object.freeze([
  { kind: "note", word: "note" },
  { kind: "called", word: "called" },
  { kind: "on_site", word: "on site" },
  { kind: "found", word: "found" },
  { kind: "first_light", word: "first light" },
  { kind: "all_light", word: "all light" },
  { kind: "reading", word: "reading" },
  { kind: "circuits_down", word: "circuits down" },
  { kind: "circuits_back", word: "circuits back" },
  { kind: "stated", word: "stated for a report" },
  { kind: "closed", word: "closed" },
  { kind: "reopened", word: "reopened" },
]);

/**
 * What stands in a form.
 * @param {SubmitEvent} event
 * @returns {(name: string) => string}
 */
function fieldsOf(event) {
  const data = new FormData(/** @type {HTMLFormElement} */ (event.target));
  return (name) => String(data.get(name) ?? "").trim();
}

/**
 * The form that begins an incident on what is at hand.
 * @param {IncidentPart} part
 * @returns {unknown}
 */
export function beginForm(part) {
  const { cuts, down, up, reading } = part.hand;
  const body = (/** @type {SubmitEvent} */ event) => {
    const of = fieldsOf(event);
    return { title: of("title"), by: of("by"), began_at: withOffset(of("began_at"), part.zone), cuts, down, up, reading: reading || null };
  };
  const hand = [cuts.length > 0 && `${cuts.length} taken as cut`, down.length > 0 && `${down.length} circuits down, ${up.length} up`, reading && "the reading"].filter(Boolean).join(", ");
  return html`<h2>Begin an incident</h2><form class="desk-form" @submit=${(/** @type {SubmitEvent} */ event) => part.begin(event, body(event))}>
    <div class="field-row"><label class="plain-field wide">What it is called <input name="title" required maxlength="200" autocomplete="off"></label></div>
    <div class="field-row"><label class="plain-field">Your name <input name="by" required maxlength="200" autocomplete="name"></label>
      <label class="plain-field">Service was lost <input name="began_at" type="datetime-local" required .value=${localTime(Date.now(), part.zone)}></label></div>
    <p class="lighter">${hand ? `It begins with what is at hand: ${hand}.` : "Nothing is at hand yet: lists, a reading or a cut can be named first."} It keeps which posting the records stood at. Times are those of ${part.zone}.</p>
    <p class="act"><button type="submit" class="main">Begin</button></p></form>`;
}

/**
 * The form that writes an entry into the log.
 * @param {IncidentPart} part
 * @param {Incident} incident
 * @returns {unknown}
 */
export function entryForm(part, incident) {
  const body = (/** @type {SubmitEvent} */ event) => {
    const of = fieldsOf(event);
    const number = (/** @type {string} */ name) => (of(name) === "" ? null : Number(of(name)));
    const named = ["circuits_down", "circuits_back"].includes(of("kind")) ? { circuits: readList(of("circuits")).codes } : {};
    const stated = of("kind") === "stated" ? { users: number("users"), oc3: number("oc3") } : {};
    return { kind: of("kind"), at: withOffset(of("at"), part.zone), by: of("by"), text: of("text") || null, corrects: number("corrects"), ...named, ...stated };
  };
  const offered = KINDS.filter(({ kind }) => incident.open ? kind !== "reopened" : kind === "reopened" || kind === "note");
  return html`<h2>Write in the log</h2><form class="desk-form" @submit=${(/** @type {SubmitEvent} */ event) => part.write(event, body(event))}>
    <div class="field-row"><label class="plain-field">What <select name="kind">${offered.map(({ kind, word }) => html`<option value=${kind}>${word}</option>`)}</select></label>
      <label class="plain-field">When <input name="at" type="datetime-local" required .value=${localTime(Date.now(), part.zone)}></label>
      <label class="plain-field">Your name <input name="by" required maxlength="200" autocomplete="name"></label></div>
    <label class="plain-field wide">In words <input name="text" maxlength="2000" autocomplete="off"></label>
    <details class="more"><summary>Circuits, stated figures, a correction</summary>
      <label class="plain-field wide">Circuits <span class="lighter">for circuits down and circuits back</span> <input name="circuits" autocomplete="off"></label>
      <div class="field-row"><label class="plain-field">Users stated <input name="users" inputmode="numeric" autocomplete="off"></label><label class="plain-field">OC3 stated <input name="oc3" inputmode="decimal" autocomplete="off"></label>
      <label class="plain-field">In place of entry <input name="corrects" inputmode="numeric" autocomplete="off"></label></div></details>
    <p class="act"><button type="submit" class="main">Write</button> <span class="lighter">Nothing is erased: a later entry stands in place of a wrong one.</span></p></form>${nothing}`;
}
