import { html, nothing } from "lit";
import { link } from "../address/index.js";
import { figure } from "../basis/index.js";

/** @typedef {import("../server/contract.d.ts").LightAnswer} LightAnswer */
/** @typedef {import("../server/contract.d.ts").LightGroup} LightGroup */
/** @typedef {import("../server/contract.d.ts").LightOffer} LightOffer */
/** @typedef {import("../server/contract.d.ts").LightRefused} LightRefused */

/** Circuits of a group that are named. */
const NAMED = 3;

/**
 * Temporary paths, group by group in the order to restore: what is offered, and what is refused with why.
 * @param {LightAnswer} answer
 * @param {number} since the posting that what was shared out rests on: the answer's, or one that posted a share of it since
 * @returns {unknown}
 */
export function lightView(answer, since) {
  const shared = new Map(answer.assigned.map((each) => [each.group, each.offer]));
  const basis = { how: "counted", source: `Spare glass shared out so that no fiber is used twice, as of posting ${answer.posting}` };
  return html`<p class="sum">${figure("Groups of circuits that come back another way", "count", answer.assigned.length, basis)} <span class="sum-word">of ${answer.groups.length} groups come back</span></p>
    <p>${answer.unserved.length === 0 ? "Nothing is left over." : html`${figure("Groups for which nothing is left", "count", answer.unserved.length, basis)} get nothing: choose who does.`}
      ${answer.proven ? nothing : html`<span class="lighter">A better sharing out was not ruled out: the search was cut short.</span>`}</p>
    ${answer.strays.length === 0 ? nothing : html`<p class="warning">Not hit by what is cut, by the records: ${answer.strays.slice(0, 8).join(", ")}${answer.strays.length > 8 ? ` and ${answer.strays.length - 8} more` : ""}.</p>`}
    <ol class="plain groups">${answer.groups.map((group, index) => groupItem(group, shared.get(index), { shared: since, other: answer.posting }))}</ol>`;
}

/**
 * @param {LightGroup} group
 * @param {LightOffer | undefined} chosen the offer that it got when the glass was shared out
 * @param {{ shared: number, other: number }} since the postings that its share, and what it did not get, rest on
 * @returns {unknown}
 */
function groupItem(group, chosen, since) {
  const named = group.circuits.slice(0, NAMED);
  const rest = group.circuits.length - named.length;
  const others = group.offers.filter((offer) => chosen === undefined || String(offer.fibers) !== String(chosen.fibers));
  return html`<li><p class="group-head">${chosen === undefined ? html`<strong class="state-down">dark</strong>` : html`<strong class="state-light">light</strong>`}
      ${named.map((each, index) => html`${index > 0 ? ", " : ""}${link("circuit", each)}`)}${rest > 0 ? ` and ${rest} more` : ""}
      <span class="lighter">priority ${group.priority}, ${group.customers} ${group.customers === 1 ? "customer" : "customers"}</span></p>
    ${chosen === undefined ? nothing : offerItem(chosen, "its share", group, since.shared)}${others.map((offer) => offerItem(offer, chosen === undefined ? "would do, but is shared out to others" : "would do too", group, since.other))}${group.refused.map(refusedItem)}</li>`;
}

/**
 * @param {LightOffer} offer
 * @param {string} standing
 * @param {LightGroup} group
 * @param {number} since the posting that it rests on
 * @returns {unknown}
 */
function offerItem(offer, standing, group, since) {
  const source = `${offer.worst}, traced as if the joints were posted`;
  const show = (/** @type {Event} */ event) => shown(event, offer);
  return html`<details class="offer" @toggle=${show} @focusin=${show}><summary><strong>${standing}</strong>: ${workInWords(offer.work)}</summary>
    <dl class="facts"><dt>Glass</dt><dd>${figure("Glass of the longest temporary path", "length", offer.glass_m, { how: "sum", source: "The fibers of the path" })}</dd>
      <dt>Loss</dt><dd>${figure(`Loss of ${offer.worst} on its temporary path`, "loss", offer.loss_db, { how: "sum", source })}${offer.left_db === null ? nothing : html`, ${figure(`Left of the budget of ${offer.worst}`, "loss", offer.left_db, { how: "sum", source: `${source}, taken from its budget of ${offer.budget_db} dB` })} left`}</dd>
      <dt>Hands at</dt><dd>${offer.structures.map((each, index) => html`${index > 0 ? ", " : ""}${link("structure", each)}`)}</dd>
      <dt>Joints</dt><dd><ul class="plain">${offer.joints.map((joint) => html`<li>${joint.a} = ${joint.b} <span class="lighter">${joint.kind} at</span> ${link("enclosure", joint.enclosure)}</li>`)}</ul></dd></dl>
    ${offer.unknown.map((each) => html`<p class="warning">${each}</p>`)}
    <sw-post-light .offer=${offer} .circuits=${group.circuits} .since=${since}></sw-post-light></details>`;
}

/**
 * Has the map draw a path while it is open, and no path once none is.
 * @param {Event} event
 * @param {LightOffer} offer
 */
function shown(event, offer) {
  const item = /** @type {HTMLDetailsElement} */ (event.currentTarget);
  if (!item.open && event.type === "focusin") return;
  const way = item.open ? { spans: offer.spans, structures: offer.structures } : null;
  item.dispatchEvent(new CustomEvent("sw-way", { bubbles: true, detail: way }));
}

/**
 * @param {LightRefused} refused
 * @returns {unknown}
 */
function refusedItem(refused) {
  return html`<p class="refused"><strong class="state-down">refused</strong> ${refused.text}</p>`;
}

/**
 * What hands must do.
 * @param {LightOffer["work"]} work
 * @returns {string}
 */
export function workInWords(work) {
  const counted = (/** @type {number} */ count, /** @type {string} */ one, /** @type {string} */ many) => (count === 0 ? "" : `${count} ${count === 1 ? one : many}`);
  const said = [
    counted(work.visits, "visit", "visits"), counted(work.patches, "patch", "patches"), counted(work.new_splices, "splice", "splices"),
    counted(work.tubes_opened, "tube to open", "tubes to open"), counted(work.unverified, "joint unverified", "joints unverified"),
  ].filter(Boolean);
  return said.join(", ") || "nothing to do";
}
