import { Problem } from "./client.js";

/** @typedef {import('lit').ReactiveControllerHost} Host */

/** After this long a question shows that it is under way, ms. */
const SLOW_MS = 1000;

/**
 * One question at a time of a part of the page: a new one stops the one before; a slow one can be stopped by hand.
 * @template T
 */
export class Asking {
  /** @param {Host} host is drawn again whenever something changes here */
  constructor(host) {
    this.host = host;
    /** @type {T | null} the last answer, kept while the next one is awaited */
    this.answer = null;
    /** @type {Problem | null} */
    this.problem = null;
    /** @type {boolean} true once the answer is overdue */
    this.slow = false;
    /** @type {boolean} */
    this.pending = false;
    /** @type {AbortController | null} */
    this.abort = null;
    host.addController({ hostDisconnected: () => this.stop() });
  }

  /**
   * Asks, and draws the host again when the answer is there.
   * @param {(signal: AbortSignal) => Promise<T>} question
   * @returns {Promise<void>}
   */
  async run(question) {
    this.stop();
    const abort = new AbortController();
    this.abort = abort;
    this.pending = true;
    this.problem = null;
    const timer = setTimeout(() => this.overdue(abort), SLOW_MS);
    try {
      const answer = await question(abort.signal);
      if (!abort.signal.aborted) this.answer = answer;
    } catch (cause) {
      if (!abort.signal.aborted) this.fail(cause);
    } finally {
      clearTimeout(timer);
      if (this.abort === abort) this.settle();
    }
  }

  /** Stops the question under way, if any. */
  stop() {
    if (this.abort === null) return;
    this.abort.abort();
    this.settle();
  }

  /** Forgets the last answer. */
  forget() {
    this.stop();
    this.answer = null;
    this.problem = null;
    this.host.requestUpdate();
  }

  /** @param {AbortController} abort */
  overdue(abort) {
    if (this.abort !== abort) return;
    this.slow = true;
    this.host.requestUpdate();
  }

  /** @param {unknown} cause */
  fail(cause) {
    this.answer = null;
    this.problem = cause instanceof Problem ? cause : new Problem("internal", String(cause));
  }

  settle() {
    this.abort = null;
    this.pending = false;
    this.slow = false;
    this.host.requestUpdate();
  }
}
