import { html, nothing } from "lit";
import { link } from "../address/index.js";
import { figure } from "../basis/index.js";
import { listed, trustWord } from "./parts.js";

/** @typedef {import("../server/contract.d.ts").Enclosure} Enclosure */
/** @typedef {import("../server/contract.d.ts").Port} Port */

/**
 * The panels of an enclosure, a row a port.
 * @param {Enclosure} enclosure
 * @returns {unknown}
 */
export function panelsOf(enclosure) {
  return enclosure.panels.map((panel) => html`<details class="box-list"><summary><h2>Panel ${panel.panel}</h2>
      <span class="lighter">${panel.ports.length} ports, ${panel.connector}, ${panel.ports.filter((port) => port.front !== "free").length} fronts taken</span></summary>
    <table><thead><tr><th class="right">Port</th><th>Rear</th><th>Trust</th><th>Front</th></tr></thead>
    <tbody>${panel.ports.map((port) => html`<tr><td class="right">${link("port", `${enclosure.code}/${panel.panel}/${port.port}`, String(port.port))}</td>
      <td>${port.rear ?? html`<span class="lighter">nothing</span>`}</td><td>${port.rear === null ? nothing : trustWord(port.rear_trust)}</td><td>${frontText(port)}</td></tr>`)}</tbody></table></details>`);
}

/**
 * What is on the front of a port.
 * @param {Port} port
 * @returns {unknown}
 */
export function frontText(port) {
  if (port.front === "free") return html`<span class="lighter">free</span>`;
  if (port.front === "jumper") return html`jumper to ${link("port", port.jumper_to)}`;
  const rest = port.circuits_total - port.circuits.length;
  return html`${listed(port.circuits.map((each) => link("circuit", each)))}${rest > 0 ? ` and ${rest} more` : ""}`;
}

/**
 * The splitters of an enclosure, a row an output.
 * @param {Enclosure} enclosure
 * @returns {unknown}
 */
export function splittersOf(enclosure) {
  return enclosure.splitters.map((splitter) => html`<details class="box-list"><summary><h2>Splitter ${splitter.splitter}</h2>
      <span class="lighter">${splitter.inputs}:${splitter.outputs}, ${splitter.terminals.filter((each) => each.joined_to !== null && each.terminal.startsWith("out")).length} outputs joined</span></summary>
    <table><thead><tr><th>End</th><th>Joined to</th><th class="right">Loss from input</th><th class="right">Circuits</th></tr></thead>
    <tbody>${splitter.terminals.map((each) => html`<tr><td>${splitter.splitter} ${each.terminal}</td>
      <td>${each.joined_to ?? html`<span class="lighter">nothing</span>`}</td>
      <td class="right">${each.loss_db === null ? nothing : figure(`Loss of ${splitter.splitter} to ${each.terminal}`, "loss", each.loss_db, { how: each.loss_basis, source: splitter.source })}</td>
      <td class="right">${each.circuits_total}</td></tr>`)}</tbody></table></details>`);
}
