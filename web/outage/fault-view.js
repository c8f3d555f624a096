import { html, nothing } from "lit";
import { link, hrefTo } from "../address/index.js";
import { figure } from "../basis/index.js";
import { length, inWords, units } from "../quantity/index.js";
import { cautionsOf, placeLines, textOf } from "./fault-words.js";
import { withCuts } from "./cuts.js";
import { printLinks } from "./print-links.js";
import { questionOf } from "./reading.js";

/** @typedef {import("../server/contract.d.ts").FaultAnswer} FaultAnswer */
/** @typedef {import("../server/contract.d.ts").FaultPlace} FaultPlace */
/** @typedef {import("../address/address.js").Asked} Asked */
/** @typedef {import("./fault-words.js").Part} Part */
/** @typedef {import("./reading.js").Shot} Shot */

/**
 * A shot in words, as the basis of what is reckoned from it.
 * @param {Shot} shot
 * @returns {string}
 */
export function shotInWords({ port, distance, unit, index, launch, wavelength, events }) {
  return [
    `${distance} ${unit} from the front of ${port}`,
    wavelength ? `${wavelength} nm` : "1550 nm",
    index && `index ${index}`,
    launch && `launch fiber ${launch} ${unit}`,
    events.length > 0 && `fitted to ${events.map((each) => `${each.enclosure} at ${each.reading} ${unit}`).join(" and ")}`,
  ].filter(Boolean).join(", ");
}

/**
 * Where a reading lies, big enough to read across a desk.
 * @param {FaultAnswer} answer
 * @param {number} chosen which of several places
 * @param {Shot} shot
 * @param {Asked} asked
 * @returns {unknown}
 */
export function faultView(answer, chosen, shot, asked) {
  const place = answer.places[chosen] ?? answer.places[0];
  if (!place) return nothing;
  const said = shotInWords(shot);
  return html`<section class="fault-place" aria-live="polite" aria-label="Fault place">
      ${placeLines(place, said).map((line) => html`<p class="fault-line">${line.map(drawn)}</p>`)}
    </section>
    ${cautionsOf(place).map((each) => html`<p class="warning">${each}</p>`)}
    ${places(answer, chosen, said)}${between(answer)}
    ${place.cable === null ? nothing : facts(place, said)}
    ${printLinks("The crew's page", "crew", crewAsked(shot, answer.places.indexOf(place) + 1))}
    <p class="act"><a class="main" href=${hrefTo("outage", "down", downHere(place, asked))}>Who is down if it is cut here</a></p>`;
}

/**
 * What the crew's page is asked: the shot as the server reads it, and which of its places.
 * @param {Shot} shot
 * @param {number} place from 1
 * @returns {Array<[string, string]>}
 */
function crewAsked(shot, place) {
  const asked = Object.entries(questionOf(shot)).flatMap(([name, value]) => [value].flat().filter((each) => each !== "").map((each) => /** @type {[string, string]} */ ([name, each])));
  return [...asked, ["place", String(place)]];
}

/**
 * @param {Part} part
 * @returns {unknown}
 */
function drawn(part) {
  if (typeof part === "string") return part;
  return "view" in part ? link(part.view, part.code) : figure(part.what, part.kind, part.value, part.basis);
}

/**
 * @param {FaultPlace} place
 * @param {Asked} asked
 * @returns {Asked}
 */
function downHere(place, asked) {
  if (place.cable !== null && place.sheath_position_m !== null) return withCuts(asked, [{ kind: "place", code: `${place.cable}@${place.sheath_position_m}` }]);
  return withCuts(asked, [{ kind: "structure", code: place.structure_before }]);
}

/**
 * Several places: behind a splitter, one an output.
 * @param {FaultAnswer} answer
 * @param {number} chosen
 * @param {string} said
 * @returns {unknown}
 */
function places(answer, chosen, said) {
  if (answer.places.length < 2) return nothing;
  return html`<fieldset class="ranking"><legend>${answer.places.length} places: behind a splitter the light of all outputs comes back together</legend>
    <ol>${answer.places.map((place, index) => html`<li><label><input type="radio" name="place" value=${index} .checked=${index === chosen}
      @change=${(/** @type {Event} */ event) => choose(event, index)}> toward ${place.path_end ?? "no end"}: ${placeLines(place, said).map(textOf).join(", ")}</label></li>`)}</ol></fieldset>`;
}

/**
 * @param {Event} event
 * @param {number} index
 */
function choose(event, index) {
  event.target?.dispatchEvent(new CustomEvent("sw-place", { bubbles: true, detail: index }));
}

/**
 * What lies between this shot's place and the far end's.
 * @param {FaultAnswer} answer
 * @returns {unknown}
 */
function between({ between: it }) {
  if (!it) return nothing;
  const parts = [{ what: "either side", metres: it.within_m }];
  const apart = figure("Sheath from this break to the one seen from the far end", "length", Math.abs(it.sheath_m), { how: "reading", source: "The two shots, each laid along the glass of the records from its own end", parts });
  const far = placeLines(it.to, "the shot from the far end").map((line) => html`${line.map(drawn)} `);
  if (it.one_break) return html`<h2>From the far end</h2><p>Both shots see one break: their places are ${apart} apart.</p>`;
  return html`<h2>From the far end</h2><p class="warning"><strong>Two breaks.</strong> The glass between them is damaged: ${apart} of sheath, within ${inWords(length(it.within_m, units.unit))}.</p>
    <p>The second: ${far}</p>`;
}

/**
 * @param {FaultPlace} place
 * @param {string} said
 * @returns {unknown}
 */
function facts(place, said) {
  const basis = { how: "reading", source: said };
  return html`<dl class="facts">
    <dt>Cable</dt><dd>${link("cable", place.cable)}${place.fiber === null ? nothing : html`, fiber ${link("fiber", `${place.cable}:${place.fiber}`, String(place.fiber))}`}</dd>
    ${place.span === null ? nothing : html`<dt>Span</dt><dd>${link("span", place.span)}, ${figure(`Sheath from the fault place to ${place.structure_after}`, "length", place.short_of_after_m, basis)} short of ${link("structure", place.structure_after)}</dd>`}
    <dt>Glass</dt><dd>${figure("Glass from the port to the fault place", "length", place.glass_m, basis)} <span class="lighter">from the port</span></dd>
    <dt>Sheath</dt><dd>${figure(`Sheath position on ${place.cable}`, "length", place.sheath_position_m, basis)} <span class="lighter">from its start</span></dd></dl>`;
}
