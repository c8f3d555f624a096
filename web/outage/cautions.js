import { html } from "lit";

/** The usual cautions for whoever goes out, where they are needed. @type {ReadonlyArray<{ word: string, says: string }>} */
const CAUTIONS = Object.freeze([
  { word: "Light", says: "is infrared and unseen: meter before you look into a fiber or a port; treat every fiber as live until proven dark." },
  { word: "Digging", says: "needs a ticket with the one-call center (811 in the United States) and marks on the ground first; hand-dig near them. A position here is a record, not a locate." },
  { word: "Poles", says: "carry power above: keep your distance, and lower no one else's cable." },
  { word: "Manholes", says: "are tested for gas before and while anyone is in them; the opening is guarded." },
]);

/**
 * The cautions, and whose rules prevail.
 * @returns {unknown}
 */
export function cautions() {
  return html`<aside class="cautions" aria-label="Cautions"><ul class="plain">${CAUTIONS.map(({ word, says }) => html`<li><strong>${word}</strong> ${says}</li>`)}</ul>
    <p>Local rules and licensed practice prevail over anything said here.</p></aside>`;
}
