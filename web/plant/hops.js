import { html, nothing } from "lit";
import { chip } from "../color/index.js";
import { link } from "../address/index.js";
import { figure } from "../basis/index.js";
import { trustWord } from "./parts.js";

/** @typedef {import("../server/contract.d.ts").Path} Path */
/** @typedef {import("../server/contract.d.ts").Element} Element */

/**
 * A path hop by hop, each with its trust and its loss, in the notation of the records.
 * @param {Path} path
 * @returns {unknown}
 */
export function hopList(path) {
  return html`<ol class="hops">${path.elements.map((element, index) => html`<li class=${`hop ${element.kind}`}>
    <span class="hop-what">${what(element, path.elements[index - 1]?.kind === "through")}</span><span class="hop-trust">${sure(element)}</span><span class="hop-loss">${element.kind === "through" ? nothing : lossOf(element)}</span></li>`)}</ol>`;
}

/**
 * @param {Element} element
 * @returns {unknown}
 */
function lossOf(element) {
  const verifiedOn = element.kind === "splice" ? element.verified_on : null;
  const trust = "trust" in element ? element.trust : null;
  return figure(nameOf(element), "loss", element.loss_db, { how: element.basis, source: element.source, trust, verifiedOn });
}

/**
 * @param {Element} element
 * @returns {string} what its loss is the loss of
 */
function nameOf(element) {
  if (element.kind === "connector") return `Connector pair at ${element.port}`;
  if (element.kind === "splice") return `Splice ${element.a} = ${element.b} at ${element.enclosure}`;
  if (element.kind === "fiber") return `Glass of ${element.cable}:${element.fiber}`;
  if (element.kind === "jumper") return `Jumper ${element.a} to ${element.b}`;
  if (element.kind === "splitter") return `Splitter ${element.splitter} at ${element.enclosure}`;
  return `${element.cable} through ${element.enclosure}`;
}

/**
 * @param {Element} element
 * @param {boolean} goesOn whether it is the same glass as before, beyond an enclosure that it passes uncut
 * @returns {unknown}
 */
function what(element, goesOn) {
  if (element.kind === "fiber") return fiber(element, goesOn);
  if (element.kind === "connector") return html`${link("port", element.port)} <span class="lighter">connector pair</span>`;
  if (element.kind === "splice") return html`${element.a} = ${element.b} <span class="lighter">${spliced(element)}</span>`;
  if (element.kind === "jumper") return html`jumper ${link("port", element.a)} to ${link("port", element.b)} ${figure(`Jumper ${element.a} to ${element.b}`, "length", element.glass_m, { how: "recorded" })}`;
  if (element.kind === "splitter") return html`${element.splitter} <span class="lighter">1:${element.outputs},</span> output ${element.output} <span class="lighter">in</span> ${link("enclosure", element.enclosure)}`;
  return html`${link("enclosure", element.enclosure)} <span class="lighter">${element.cable}:${element.fiber} through</span>`;
}

/**
 * @param {import("../server/contract.d.ts").SpliceElement} splice
 * @returns {unknown}
 */
function spliced(splice) {
  const kind = splice.pigtail ? "pigtail" : splice.method === "mechanical" ? "mechanical splice" : "splice";
  const until = splice.temporary_until ? `, temporary until ${splice.temporary_until}` : "";
  return html`${kind}${splice.tray === null ? "" : `, tray ${splice.tray}`}${until} in ${link("enclosure", splice.enclosure)}`;
}

/**
 * @param {import("../server/contract.d.ts").FiberElement} it
 * @param {boolean} goesOn
 * @returns {unknown}
 */
function fiber(it, goesOn) {
  const name = html`${link("cable", it.cable)} ${chip(it.tube_color, it.tube, "tube")} ${chip(it.fiber_color, it.fiber, "fiber")}`;
  return html`${goesOn ? nothing : name}
    ${it.flags.map((flag) => html`<strong class=${`flag-${flag}`}>${flag}</strong> `)}
    <span class="hop-length">${figure(`Glass of ${it.cable}:${it.fiber}, ${it.from ?? "its start"} to ${it.to ?? "its end"}`, "length", it.glass_m, { how: it.length_basis, source: it.length_source })}
      <span class="lighter">${it.toward} to</span> ${it.to === null ? link("structure", it.to_structure) : link("enclosure", it.to)}</span>`;
}

/**
 * @param {Element} element
 * @returns {unknown}
 */
function sure(element) {
  if (element.kind === "splice") return trustWord(element.trust, element.verified_on);
  return element.kind === "connector" && element.trust !== null ? trustWord(element.trust) : nothing;
}
