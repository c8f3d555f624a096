import { html } from "lit";
import { ask, pathTo } from "../server/index.js";
import { link } from "../address/index.js";
import { TracedView } from "./traced-view.js";
import { frontText } from "./boxes.js";
import { fact, heading, trustWord } from "./parts.js";

/** @typedef {import("../server/contract.d.ts").Enclosure} Enclosure */

/**
 * A port: what is on its rear and its front, and the paths from it.
 * @extends {TracedView<Enclosure>}
 */
export class PortView extends TracedView {
  /** @param {AbortSignal} signal @override */
  question(signal) {
    return ask(pathTo("enclosures", this.code.split("/")[0] ?? ""), {}, signal);
  }

  /** @param {Enclosure} it @override */
  draw(it) {
    const [, name, number] = this.code.split("/");
    const panel = it.panels.find((each) => each.panel === name);
    const port = panel?.ports.find((each) => each.port === Number(number));
    if (!panel || !port) return html`${heading("port", this.code)}<p class="warning">${it.code} has no such port. Its panels: ${it.panels.map((each) => `${each.panel} 1-${each.ports.length}`).join(", ") || "none"}.</p>`;
    return html`${heading(`port, ${panel.connector}`, this.code)}
      <dl class="facts">
        ${fact("In", html`${link("enclosure", it.code)} <span class="lighter">at</span> ${link("structure", it.structure)}`)}
        ${fact("Rear", port.rear === null ? html`<span class="lighter">nothing is joined to it</span>` : html`${port.rear} ${trustWord(port.rear_trust)}`)}
        ${fact("Front", frontText(port))}
      </dl><h2>Paths from it</h2>`;
  }

  /** @param {Enclosure} it @override */
  foot(it) {
    return this.changedLine(it.changed, it.posting);
  }
}

customElements.define("sw-port", PortView);
