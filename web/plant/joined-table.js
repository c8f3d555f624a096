import { html, nothing } from "lit";
import { chip } from "../color/index.js";
import { link } from "../address/index.js";
import { figure } from "../basis/index.js";
import { tubeOf } from "./ends.js";
import { trustWord } from "./parts.js";

/** @typedef {import("../server/contract.d.ts").Enclosure} Enclosure */
/** @typedef {import("../server/contract.d.ts").Joint} Joint */
/** @typedef {import("../server/contract.d.ts").EndRange} EndRange */

/** Circuits named beside a range; the rest are counted. */
const CIRCUITS_NAMED = 3;

/**
 * What is joined in an enclosure, a row a range, in the one notation.
 * @param {Enclosure} enclosure
 * @returns {unknown}
 */
export function joinedTable(enclosure) {
  if (enclosure.joints.length === 0) return html`<h2>Joined</h2><p class="lighter">Nothing is joined here.</p>`;
  const trays = enclosure.joints.some((joint) => joint.tray !== null);
  return html`<h2>Joined</h2><table class="joined"><thead><tr>${trays ? html`<th>Tray</th>` : nothing}<th>Ends</th><th class="right">Loss each</th><th>Trust</th><th>Circuits</th></tr></thead>
    <tbody>${enclosure.joints.map((joint) => html`<tr>${trays ? html`<td>${joint.tray ?? nothing}</td>` : nothing}
      <td class="ends">${endText(enclosure, joint.a)} <span class="equals">=</span> ${endText(enclosure, joint.b)}${how(joint)}</td>
      <td class="right">${lossOf(joint)}</td><td>${trustWord(joint.trust, joint.verified_on)}</td><td>${circuits(joint)}</td></tr>`)}</tbody></table>`;
}

/**
 * @param {Enclosure} enclosure
 * @param {EndRange} end
 * @returns {unknown} the end, with the chip of its tube where it lies in one
 */
function endText(enclosure, end) {
  const leg = enclosure.legs.find((each) => each.cable === end.of && each.side === end.side);
  const tube = leg && end.kind === "leg" ? tubeOf(leg, end.numbers) : null;
  return html`<span class="end">${end.text}${tube === null || !leg ? nothing : html` ${chip(leg.tube_colors[tube - 1] ?? "", tube, "tube")}`}</span>`;
}

/**
 * @param {Joint} joint
 * @returns {unknown} what is out of the ordinary about how it is made
 */
function how(joint) {
  const said = [
    joint.kind === "jumper" ? "jumper" : joint.method === "mechanical" || joint.method === "direct" ? joint.method : "",
    joint.temporary_until ? `temporary until ${joint.temporary_until}` : "",
    joint.trust === "planned" && joint.job ? `planned, job ${joint.job}` : "",
  ].filter(Boolean);
  return said.length === 0 ? nothing : html`<br><span class="lighter">${said.join(", ")}</span>`;
}

/**
 * @param {Joint} joint
 * @returns {unknown}
 */
function lossOf(joint) {
  if (joint.kind === "termination" && joint.method === "direct") return html`<span class="lighter">none</span>`;
  return figure(`Loss of each joint ${joint.a.text} = ${joint.b.text}`, "loss", joint.loss_db ?? joint.loss_expected_db, {
    how: joint.basis,
    source: joint.source,
    trust: joint.trust,
    verifiedOn: joint.verified_on,
    changed: joint.changed,
  });
}

/**
 * @param {Joint} joint
 * @returns {unknown}
 */
function circuits(joint) {
  const named = joint.circuits.slice(0, CIRCUITS_NAMED);
  const rest = joint.circuits_total - named.length;
  return html`${named.map((each, index) => html`${index > 0 ? ", " : ""}${link("circuit", each)}`)}${rest > 0 ? html` <span class="lighter">and ${rest} more</span>` : nothing}`;
}
