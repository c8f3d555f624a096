import { html, nothing } from "lit";
import { chip, parseColor, patch } from "../color/index.js";
import { hrefTo } from "../address/index.js";
import { parseRange } from "../quantity/index.js";
import { useOf } from "./tube-cells.js";
import { USES, useSign } from "./uses.js";

/** @typedef {import("../server/contract.d.ts").Cable} Cable */
/** @typedef {import("../server/contract.d.ts").CableSection} CableSection */

/**
 * The tube chart: one row a tube, one cell a fiber.
 * @param {Cable} cable
 * @param {CableSection[]} sections whose state is shown; of several, the strongest
 * @returns {unknown}
 */
export function tubeChart(cable, sections) {
  const places = cable.type.fibers_per_tube;
  return html`<table class="tube-chart" @keydown=${moveCell}>
    <caption class="unseen">Tubes of ${cable.code}, a row each, with every fiber's state</caption>
    <colgroup><col class="tube-column"></colgroup>
    <tbody>${cable.tubes.map((tube, row) => {
      const { first, last } = parseRange(tube.fibers);
      const fibers = Array.from({ length: Math.min(places, last - first + 1) }, (_, index) => first + index);
      return html`<tr><th scope="row">${chip(tube.color, tube.tube, "tube")}</th>
        ${fibers.map((fiber, place) => cell(cable, sections, fiber, place, row === 0 && place === 0))}</tr>`;
    })}</tbody></table>`;
}

/**
 * @param {Cable} cable
 * @param {CableSection[]} sections
 * @param {number} fiber
 * @param {number} place within its tube, from 0
 * @param {boolean} entry whether Tab comes in here
 * @returns {unknown}
 */
function cell(cable, sections, fiber, place, entry) {
  const range = useOf(sections, fiber);
  const sign = useSign(range?.use ?? "spare_unknown");
  const color = cable.fiber_colors[place] ?? "";
  const said = [color, sign.words, range?.circuit, range?.owner, range?.reason].filter(Boolean).join(", ");
  return html`<td><a class=${`fiber-cell use-${sign.use}`} href=${hrefTo("fiber", `${cable.code}:${fiber}`)} tabindex=${entry ? 0 : -1}
    title=${`fiber ${fiber}, ${said}`}>${patch(parseColor(color))}<span class="cell-code">${parseColor(color).code}${fiber}</span><span
    class="cell-letter" aria-hidden="true">${sign.letter}</span><span class="unseen">, ${said}</span></a></td>`;
}

/** Rows and columns that each arrow key moves by. @type {Readonly<Record<string, [number, number]>>} */
const STEPS = Object.freeze({ ArrowLeft: [0, -1], ArrowRight: [0, 1], ArrowUp: [-1, 0], ArrowDown: [1, 0] });

/**
 * Arrow keys move from cell to cell.
 * @param {KeyboardEvent} event
 */
function moveCell(event) {
  const here = /** @type {HTMLElement} */ (event.target).closest("td");
  const step = STEPS[event.key];
  if (!here || !step) return;
  const next = neighbour(here, step);
  if (!next) return;
  event.preventDefault();
  here.querySelector("a")?.setAttribute("tabindex", "-1");
  next.setAttribute("tabindex", "0");
  next.focus();
}

/**
 * @param {HTMLTableCellElement} here
 * @param {[number, number]} step
 * @returns {HTMLElement | null | undefined} the link in the cell that lies so many rows and columns away
 */
function neighbour(here, [down, right]) {
  const row = here.closest("tr");
  const rows = [...(row?.parentElement?.children ?? [])];
  const cells = rows[rows.indexOf(/** @type {Element} */ (row)) + down]?.querySelectorAll("td");
  return cells?.[here.cellIndex - 1 + right]?.querySelector("a");
}

/**
 * What the signs in the cells mean, those that occur only.
 * @param {Cable} cable
 * @param {CableSection[]} sections
 * @returns {unknown}
 */
export function tubeLegend(cable, sections) {
  const present = new Set(sections.flatMap((section) => section.uses.map((each) => each.use)));
  const shown = USES.filter((each) => present.has(each.use));
  if (cable.sections.length === 0 || shown.length === 0) return nothing;
  return html`<ul class="tube-legend">${shown.map(
    (each) => html`<li><span class=${`fiber-cell use-${each.use}`} aria-hidden="true"><span class="cell-letter">${each.letter}</span></span> ${each.words}</li>`,
  )}</ul>`;
}
