import { html } from "lit";
import { ask, pathTo } from "../server/index.js";
import { chip } from "../color/index.js";
import { link } from "../address/index.js";
import { dayInWords, parseRange, rangeHolds } from "../quantity/index.js";
import { TracedView } from "./traced-view.js";
import { fact, heading } from "./parts.js";
import { useOf } from "./tube-cells.js";
import { useSign } from "./uses.js";

/** @typedef {import("../server/contract.d.ts").Cable} Cable */
/** @typedef {import("./tube-cells.js").UseRange} UseRange */

/**
 * A fiber: its colours, what it is used for section by section, and the paths through it.
 * @extends {TracedView<Cable>}
 */
export class FiberView extends TracedView {
  /** @returns {[string, number]} cable and fiber */
  parts() {
    const at = this.code.lastIndexOf(":");
    return [this.code.slice(0, at), Number(this.code.slice(at + 1))];
  }

  /** @param {AbortSignal} signal @override */
  question(signal) {
    return ask(pathTo("cables", this.parts()[0]), {}, signal);
  }

  /** @param {Cable} it @override */
  draw(it) {
    const [, fiber] = this.parts();
    const tube = it.tubes.find((each) => rangeHolds(parseRange(each.fibers), fiber));
    if (!tube) return html`${heading("fiber", this.code)}<p class="warning">${it.code} has ${it.type.fibers} fibers, numbered from 1.</p>`;
    const place = fiber - parseRange(tube.fibers).first;
    const counts = it.counts.filter((each) => rangeHolds(parseRange(each.fibers), fiber));
    return html`${heading("fiber", this.code)}
      <dl class="facts">
        ${fact("Colours", html`${chip(tube.color, tube.tube, "tube")} ${chip(it.fiber_colors[place] ?? "", fiber, "fiber")} <span class="lighter">${tube.color} tube, ${it.fiber_colors[place] ?? ""} fiber</span>`)}
        ${fact("Cable", link("cable", it.code))}
        ${counts.map((each) => fact("Also counted", `${each.name} ${parseRange(each.numbers).first + fiber - parseRange(each.fibers).first}`))}
      </dl>
      <h2>Used for</h2><table><thead><tr><th>From</th><th>To</th><th>Use</th></tr></thead><tbody>
      ${it.sections.map((section) => html`<tr><td>${section.from === null ? link("structure", section.from_structure) : link("enclosure", section.from)}</td>
        <td>${section.to === null ? link("structure", section.to_structure) : link("enclosure", section.to)}</td><td>${useText(useOf([section], fiber))}</td></tr>`)}</tbody></table>
      <h2>Paths through it</h2>`;
  }

  /** @param {Cable} it @override */
  foot(it) {
    return this.changedLine(it.changed, it.posting);
  }
}

/**
 * @param {UseRange | null} range
 * @returns {unknown}
 */
function useText(range) {
  if (range === null) return html`<span class="not-known">not known</span>`;
  const sign = useSign(range.use);
  const more = [range.owner, range.reason, range.until ? `until ${dayInWords(range.until)}` : null].filter(Boolean).join(", ");
  return html`<span class=${`use-word word-${range.use}`}>${sign.letter ? html`<b>${sign.letter}</b> ` : ""}${sign.words}</span>
    ${range.circuit === null ? "" : link("circuit", range.circuit)}${range.circuits_total > 1 ? html` <span class="lighter">and ${range.circuits_total - 1} more</span>` : ""}
    <span class="lighter">${more}</span>`;
}

customElements.define("sw-fiber", FiberView);
