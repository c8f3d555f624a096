import { html, nothing } from "lit";
import { link } from "../address/index.js";
import { figure } from "../basis/index.js";
import { listed, trustWord } from "./parts.js";

/** @typedef {import("../server/contract.d.ts").Enclosure} Enclosure */
/** @typedef {import("../server/contract.d.ts").Port} Port */

/**
 * Which boxes are open: a panel of hundreds of ports is drawn only once it is.
 * @typedef {object} Boxes
 * @property {(name: string) => boolean} isOpen
 * @property {(name: string, open: boolean) => void} set
 */

/**
 * The panels of an enclosure, a row a port.
 * @param {Enclosure} enclosure
 * @param {Boxes} boxes
 * @returns {unknown}
 */
export function panelsOf(enclosure, boxes) {
  return enclosure.panels.map((panel) => {
    const taken = panel.ports.filter((port) => port.front !== "free").length;
    return box(boxes, `Panel ${panel.panel}`, `${panel.ports.length} ports, ${panel.connector}, ${taken} fronts taken`, () => html`<table><thead><tr><th class="right">Port</th><th>Rear</th><th>Trust</th><th>Front</th></tr></thead>
      <tbody>${panel.ports.map((port) => html`<tr><td class="right">${link("port", `${enclosure.code}/${panel.panel}/${port.port}`, String(port.port))}</td>
        <td class="rear">${port.rear ?? html`<span class="lighter">nothing</span>`}</td><td>${port.rear === null ? nothing : trustWord(port.rear_trust)}</td><td>${frontText(port)}</td></tr>`)}</tbody></table>`);
  });
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
 * @param {Boxes} boxes
 * @returns {unknown}
 */
export function splittersOf(enclosure, boxes) {
  return enclosure.splitters.map((splitter) => {
    const joined = splitter.terminals.filter((each) => each.joined_to !== null && each.terminal.startsWith("out")).length;
    return box(boxes, `Splitter ${splitter.splitter}`, `${splitter.inputs}:${splitter.outputs}, ${joined} outputs joined`, () => html`<table><thead><tr><th>End</th><th>Joined to</th><th class="right">Loss from input</th><th class="right">Circuits</th></tr></thead>
      <tbody>${splitter.terminals.map((each) => html`<tr><td>${splitter.splitter} ${each.terminal}</td>
        <td>${each.joined_to ?? html`<span class="lighter">nothing</span>`}</td>
        <td class="right">${each.loss_db === null ? nothing : figure(`Loss of ${splitter.splitter} to ${each.terminal}`, "loss", each.loss_db, { how: each.loss_basis, source: splitter.source })}</td>
        <td class="right">${each.circuits_total}</td></tr>`)}</tbody></table>`);
  });
}

/**
 * @param {Boxes} boxes
 * @param {string} name
 * @param {string} said about it while it is closed
 * @param {() => unknown} inside
 * @returns {unknown}
 */
function box(boxes, name, said, inside) {
  const toggled = (/** @type {Event} */ event) => boxes.set(name, /** @type {HTMLDetailsElement} */ (event.target).open);
  return html`<details class="box-list" ?open=${boxes.isOpen(name)} @toggle=${toggled}><summary><h2>${name}</h2> <span class="lighter">${said}</span></summary>
    ${boxes.isOpen(name) ? inside() : nothing}</details>`;
}
