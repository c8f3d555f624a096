import { html, nothing } from "lit";

/** @typedef {import('./asking.js').Asking<any>} AnyAsking */

/**
 * What stands in place of an answer: the problem, or after a second the progress and a way to stop it.
 * @param {AnyAsking} asking
 * @returns {unknown} nothing where the answer is there
 */
export function waiting(asking) {
  if (asking.problem) return html`<p class="problem" role="alert">${asking.problem.message}</p>`;
  if (!asking.slow) return nothing;
  return html`<p class="waiting" role="status">
    Reading the records <progress></progress>
    <button type="button" @click=${() => asking.stop()}>Stop</button>
  </p>`;
}
