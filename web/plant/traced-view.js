import { html } from "lit";
import { waiting } from "../server/index.js";
import { RecordView } from "./record-view.js";
import { pathsOf } from "./paths-of.js";

/** @typedef {import("../server/contract.d.ts").Path} Path */

/**
 * A view of what has a path of its own: what the records say of it, and below it the paths that the shell traced.
 * @template T
 * @extends {RecordView<T>}
 */
export class TracedView extends RecordView {
  /** @override */
  static properties = { ...RecordView.properties, paths: { attribute: false }, chosen: { attribute: false } };

  constructor() {
    super();
    /** @type {Path[] | null} null while they are traced */
    this.paths = null;
    /** @type {number} */
    this.chosen = 0;
  }

  /** @override */
  render() {
    const answer = this.asking.answer;
    return html`${answer === null ? html`<h1>${this.code}</h1>` : this.draw(answer)}${waiting(this.asking)}
      ${this.asking.problem ? "" : pathsOf(this, this.paths, this.chosen)}${answer === null ? "" : this.foot(answer)}`;
  }

  /**
   * What stands below the paths.
   * @param {T} answer
   * @returns {unknown}
   */
  foot(answer) {
    throw new Error(`each view has its own foot: ${String(answer)}`);
  }
}
