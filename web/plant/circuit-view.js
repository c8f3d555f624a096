import { html } from "lit";
import { ask, pathTo } from "../server/index.js";
import { link } from "../address/index.js";
import { figure } from "../basis/index.js";
import { fact, heading, listed, portLinks } from "./parts.js";
import { TracedView } from "./traced-view.js";

/** @typedef {import("../server/contract.d.ts").Circuit} Circuit */

/** Restoration priorities in words. */
const PRIORITIES = ["", "first to be restored", "second", "third", "fourth", "last to be restored"];

/**
 * A circuit: whose it is, and the path that it lives on.
 * @extends {TracedView<Circuit>}
 */
export class CircuitView extends TracedView {
  /** @param {AbortSignal} signal @override */
  question(signal) {
    return ask(pathTo("circuits", this.code), {}, signal);
  }

  /** @param {Circuit} it @override */
  draw(it) {
    return html`${heading(`circuit${it.status === "working" ? "" : `, ${it.status}`}${it.service ? `, ${it.service}` : ""}`, it.circuit)}
      <dl class="facts">
        ${fact("Customer", it.customer)}
        ${fact("Priority", html`<span class="number">${it.priority}</span> <span class="lighter">${PRIORITIES[it.priority] ?? ""}</span>`)}
        ${fact("Serves", html`${figure(`Customers served by ${it.circuit}`, "count", it.customers_served, { how: "recorded", changed: it.changed })} ${it.customers_served === 1 ? "customer" : "customers"}`)}
        ${fact("From a", html`${portLinks(it.a)} <span class="lighter">at</span> ${link("structure", it.a_at.structure)}`)}
        ${fact("To z", html`${portLinks(it.z)} <span class="lighter">at</span> ${link("structure", it.z_at.structure)}`)}
        ${fact("Protected by", it.partners.length > 0 ? html`${listed(it.partners.map((each) => link("circuit", each)))} <span class="lighter">group ${it.protection_group}</span>` : null)}
      </dl>`;
  }

  /** @param {Circuit} it @override */
  foot(it) {
    return this.changedLine(it.changed, it.posting);
  }
}

customElements.define("sw-circuit", CircuitView);
