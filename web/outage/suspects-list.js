import { html, nothing } from "lit";
import { hrefTo, link } from "../address/index.js";
import { figure } from "../basis/index.js";
import { likeliest, nameOf, whatOf } from "./suspect-words.js";
import { withCuts } from "./cuts.js";

/** @typedef {import("../server/contract.d.ts").SuspectsAnswer} SuspectsAnswer */
/** @typedef {import("../server/contract.d.ts").Suspect} Suspect */
/** @typedef {import("../address/address.js").Asked} Asked */

/** Suspects shown; more say little. */
const SHOWN = 20;

/**
 * The suspects, best first; one is chosen, and says what it explains, what speaks against it and what it rests on.
 * @param {SuspectsAnswer} answer
 * @param {number} chosen
 * @param {Asked} asked
 * @returns {unknown}
 */
export function suspectsList(answer, chosen, asked) {
  const { suspects, total } = answer;
  if (suspects.length === 0) return html`<p class="warning">Nothing in the records explains what is down. Look at the equipment first, then at power.</p>`;
  return html`${together(answer)}<fieldset class="ranking"><legend>Suspects, the likeliest first</legend><ol>${suspects.slice(0, SHOWN).map((each, index) => html`<li class=${index === chosen ? "chosen" : ""}>
      <label><input type="radio" name="suspect" value=${index} .checked=${index === chosen} @change=${(/** @type {Event} */ event) => choose(event, index)} @keydown=${(/** @type {KeyboardEvent} */ event) => entered(event, each, asked)}>
        <span class="suspect-sign">S${index + 1}</span> <strong>${nameOf(each)}</strong> <span class="lighter">${whatOf(each)}</span></label>
      ${index === chosen ? details(answer, each, asked) : nothing}</li>`)}</ol>
    ${total > SHOWN ? html`<p class="lighter">The first ${Math.min(SHOWN, suspects.length)} of ${total}.</p>` : nothing}</fieldset>`;
}

/**
 * @param {Event} event
 * @param {number} index
 */
function choose(event, index) {
  event.target?.dispatchEvent(new CustomEvent("sw-suspect", { bubbles: true, detail: index }));
}

/**
 * @param {KeyboardEvent} event
 * @param {Suspect} suspect
 * @param {Asked} asked
 */
function entered(event, suspect, asked) {
  if (event.key !== "Enter") return;
  event.preventDefault();
  location.hash = hrefTo("outage", "down", withCuts(asked, likeliest(suspect)));
}

/**
 * Where no one thing explains it all: those that do so together.
 * @param {SuspectsAnswer} answer
 * @returns {unknown}
 */
function together({ together: { suspects } }) {
  if (suspects.length < 2) return nothing;
  const signs = suspects.map((index) => `S${index + 1}`);
  return html`<p class="warning">No one thing explains the alarms as well as ${signs.slice(0, -1).join(", ")} and ${signs.at(-1)} together: more than one thing may be wrong.</p>`;
}

/**
 * @param {SuspectsAnswer} answer
 * @param {Suspect} it
 * @param {Asked} asked
 * @returns {unknown}
 */
function details({ posting }, it, asked) {
  const basis = { how: "alarms", source: `The lists as pasted, on the records as of posting ${posting}` };
  const cuts = likeliest(it);
  return html`<dl class="facts">
      <dt>Explains</dt><dd>${figure("Circuits down that it explains", "count", it.explains, basis)} down ${codes("which", it.explained)}</dd>
      <dt>Contradicts</dt><dd>${figure("Circuits up that speak against it", "count", it.contradicts, basis)} up ${codes("which", it.contradicted)}</dd>
      ${it.route_m > 0 ? html`<dt>Route</dt><dd>${figure("Route of the stretch", "length", it.route_m, { how: "sum", source: "The spans that the lists do not tell apart" })}${it.kind === "cut" && it.span && it.spans.length > 1 ? html`, likeliest ${link("span", it.span)}` : nothing}</dd>` : nothing}
      <dt>Rests on</dt><dd>${restsOn(it)}</dd></dl>
    ${it.kind === "end" ? html`<p>Look at the equipment, the jumper and the drop behind ${it.ports.map((port, index) => html`${index > 0 ? ", " : ""}${link("port", port)}`)} before any cable.</p>` : nothing}
    ${it.kind === "crossed" ? html`<p>A shot through it shows no early break, but an end at the wrong length. Open ${link("enclosure", it.enclosures[0])} and compare its joints with the records.</p>` : nothing}
    ${cuts.length > 0 ? html`<p class="act"><a href=${hrefTo("outage", "down", withCuts(asked, cuts))}>Who is down if ${it.span ?? it.enclosure} is cut</a></p>` : nothing}`;
}

/**
 * @param {string} word
 * @param {string[]} circuits
 * @returns {unknown}
 */
function codes(word, circuits) {
  if (circuits.length === 0) return nothing;
  return html`<details class="which"><summary>${word}</summary>${circuits.map((each, index) => html`${index > 0 ? ", " : ""}${link("circuit", each)}`)}</details>`;
}

/**
 * @param {Suspect} suspect
 * @returns {unknown} joints on the way of which the records are not sure
 */
function restsOn({ rests_on: joints }) {
  if (joints.length === 0) return "records that are posted or verified all along";
  return html`joints that are only reported, or of unknown trust: <ul class="plain">${joints.map((joint) => html`<li>${joint.a} = ${joint.b} <span class="lighter">at</span> ${link("enclosure", joint.enclosure)}, <span class="trust-unknown">? ${joint.trust}</span></li>`)}</ul>`;
}
