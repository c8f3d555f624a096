import { LitElement, html, nothing } from "lit";
import { Asking, waiting } from "../server/index.js";
import { formatAddress } from "../address/index.js";
import { UnitController, units } from "../quantity/index.js";
import { cutsOf, withCuts, writeCut } from "./cuts.js";
import { cautions } from "./cautions.js";
import { faultView, shotInWords } from "./fault-view.js";
import { keepLists, keptLists } from "./keeping.js";
import { readList } from "./lists.js";
import { marksOf } from "./marks.js";
import { PARTS, hrefToPart, partOf } from "./parts.js";
import { drawnWay, fallen, placed, rankedSuspects } from "./questions.js";
import { SHOT_NAMES, askedOf, faultsOf, shotOf } from "./reading.js";
import { suspectsList } from "./suspects-list.js";

/** @typedef {import("../address/address.js").Address} Address */
/** @typedef {import("../server/contract.d.ts").FaultAnswer} FaultAnswer */
/** @typedef {import("../server/contract.d.ts").Path} Path */
/** @typedef {import("./keeping.js").Lists} Lists */
/** @typedef {import("./reading.js").Shot} Shot */
/** @typedef {import("./cuts.js").Cut} Cut */
/** @typedef {import("./questions.js").Ranked} Ranked */
/** @typedef {import("./questions.js").Fallen} Fallen */

/** The wavelength of a shot of which none is said, nm. */
const USUAL = 1550;

/** The outage desk: from alarms, a place or a reading to where it is cut, who is down, and who is restored first. */
export class OutageDesk extends LitElement {
  /** @override */
  static properties = { address: { attribute: false }, stamp: { attribute: false }, zone: { attribute: false }, paths: { attribute: false }, lists: { state: true }, place: { state: true } };

  constructor() {
    super();
    /** @type {Address | null} */
    this.address = null;
    /** @type {string} from which records; others are asked anew */
    this.stamp = "";
    /** @type {string} time zone of the records */
    this.zone = "UTC";
    /** @type {Path[] | null} of the port that was shot; null while they are traced */
    this.paths = null;
    this.lists = keptLists();
    /** @type {number} which of a reading's places, from 0 */
    this.place = 0;
    /** @type {Asking<Ranked>} */
    this.suspects = new Asking(this);
    /** @type {Asking<FaultAnswer>} */
    this.fault = new Asking(this);
    /** @type {Asking<Fallen>} */
    this.impact = new Asking(this);
    /** @type {Asking<import("./questions.js").Shape>} the temporary path that is open */
    this.way = new Asking(this);
    /** @type {Record<string, string>} what each was asked last */
    this.known = {};
    /** @type {string} what the map and the strip were told last */
    this.told = "";
    /** @type {string} what takes the focus once its answer is there */
    this.wanted = "";
    new UnitController(this);
  }

  /** @override */
  createRenderRoot() {
    return this;
  }

  /** @returns {{ pending: boolean }} whether any question is under way */
  get asking() {
    return { pending: this.suspects.pending || this.fault.pending || this.impact.pending || this.way.pending };
  }

  /** @returns {string} the part that is open */
  get opened() {
    return partOf(this.address?.code ?? "");
  }

  /** @returns {Shot} as the address has it */
  get shot() {
    return shotOf(this.address?.asked ?? []);
  }

  /** @override */
  willUpdate() {
    const { lists, shot } = this;
    const cuts = this.opened === "down" ? cutsOf(this.address?.asked ?? []) : [];
    this.question("suspects", readList(lists.down).codes.length > 0, [lists.down, lists.up, lists.opened, lists.byPath], (signal) => rankedSuspects(lists, signal));
    this.question("fault", shot.distance !== "" && Object.keys(faultsOf(shot)).length === 0, askedOf(shot), (signal) => placed(shot, signal));
    if (this.opened === "down") this.question("impact", cuts.length > 0, cuts.map(writeCut), (signal) => fallen(cuts, signal));
  }

  /**
   * Asks one of the questions where what it asks has changed; forgets its answer where there is nothing to ask.
   * @param {"suspects" | "fault" | "impact"} name
   * @param {boolean} askable
   * @param {unknown} what
   * @param {(signal: AbortSignal) => Promise<any>} question
   */
  question(name, askable, what, question) {
    const key = askable ? `${this.stamp} ${JSON.stringify(what)}` : "";
    if (this.known[name] === key) return;
    this.known[name] = key;
    if (name === "fault") this.place = 0;
    if (askable) void this[name].run(question).then(() => this.answered(name));
    else this[name].forget();
  }

  /** @param {string} name */
  async answered(name) {
    if (this.wanted !== name) return;
    this.wanted = "";
    await this.updateComplete;
    const at = { suspects: ".ranking input:checked", fault: ".fault-place", impact: ".sum" }[name] ?? "";
    /** @type {HTMLElement | null} */ (this.querySelector(at))?.focus();
  }

  /** @override */
  updated() {
    const { opened: part, lists, place } = this;
    const fault = this.fault.answer;
    const map = marksOf({ part, suspects: this.suspects.answer?.answer ?? null, chosen: lists.chosen, fault, place, cut: this.impact.answer?.shape ?? null, way: this.way.answer });
    const at = fault?.places[place];
    const shown = at && !at.past_end && this.address?.trace === `port:${this.shot.port}`;
    const detail = { map, strip: shown ? [{ glass: at.glass_m, within: at.within_m }] : [] };
    const told = `${JSON.stringify(detail)} ${units.unit}`;
    if (told === this.told) return;
    this.told = told;
    this.dispatchEvent(new CustomEvent("sw-marks", { bubbles: true, detail }));
  }

  /** @param {Partial<Address>} change */
  go(change) {
    if (this.address) location.hash = formatAddress({ ...this.address, view: "outage", ...change });
  }

  /** @param {Lists} lists */
  setLists(lists) {
    this.lists = lists;
    keepLists(lists);
  }

  /** @param {CustomEvent<Lists>} event */
  listed({ detail }) {
    this.known["suspects"] = "";
    this.wanted = "suspects";
    this.setLists(detail);
  }

  /** @param {CustomEvent<Shot>} event */
  shotTyped({ detail }) {
    const rest = (this.address?.asked ?? []).filter(([name]) => !SHOT_NAMES.includes(name));
    this.known["fault"] = "";
    this.wanted = "fault";
    this.go({ code: "reading", asked: [...askedOf(detail), ...rest], trace: `port:${detail.port}`, path: 0, nm: [Number(detail.wavelength) || USUAL] });
    this.requestUpdate();
  }

  /** @param {CustomEvent<number>} event */
  placeChosen({ detail }) {
    this.place = detail;
    const end = this.fault.answer?.places[detail]?.path_end;
    const path = (this.paths ?? []).findIndex((each) => each.ends[1] === end);
    if (path >= 0) this.go({ path });
  }

  /** @param {CustomEvent<{ spans: string[], structures: string[] } | null>} event */
  wayShown({ detail }) {
    const key = JSON.stringify(detail);
    if (this.known["way"] === key) return;
    this.known["way"] = key;
    if (detail) void this.way.run((signal) => drawnWay(detail, signal));
    else this.way.forget();
  }

  /** What was posted changes who is down and what is suspect: they are asked anew when they are looked at. */
  posted() {
    this.known = { way: this.known["way"] ?? "" };
  }

  /** @param {CustomEvent<Cut[]>} event */
  cutsChosen({ detail }) {
    this.go({ code: "down", asked: withCuts(this.address?.asked ?? [], detail) });
  }

  /** @override */
  render() {
    if (this.address === null) return nothing;
    return html`<header class="heading desk-heading"><h1>Outage</h1><nav aria-label="Parts of the desk">${PARTS.map(({ part, word }, index) => html`<a href=${hrefToPart(part)}
        aria-current=${part === this.opened ? "page" : nothing}>${word} <kbd>${index + 1}</kbd></a>`)}</nav></header>
      <div @sw-lists=${this.listed} @sw-shot=${this.shotTyped} @sw-place=${this.placeChosen} @sw-cuts=${this.cutsChosen} @sw-way=${this.wayShown} @sw-posted=${this.posted}
        @sw-incident=${(/** @type {CustomEvent<string>} */ event) => this.go({ code: "incident", asked: [...(this.address?.asked ?? []).filter(([name]) => name !== "incident"), ["incident", event.detail]] })}
        @sw-suspect=${(/** @type {CustomEvent<number>} */ event) => this.setLists({ ...this.lists, chosen: event.detail })}>${this.open()}</div>
      ${cautions()}`;
  }

  /** @returns {unknown} the part that is open */
  open() {
    if (this.opened === "reading") return this.reading();
    if (this.opened === "down") return this.whoIsDown();
    if (this.opened === "light") return html`<sw-light .cuts=${cutsOf(this.address?.asked ?? []).map(writeCut)} .stamp=${this.stamp}></sw-light>`;
    if (this.opened === "incident") return this.incident();
    return this.alarms();
  }

  /** @returns {unknown} */
  alarms() {
    const ranked = this.suspects.answer;
    const [down, up] = [readList(this.lists.down).codes.length, readList(this.lists.up).codes.length];
    const closed = ranked !== null && ranked.answer !== null && ranked.strangers.length === 0;
    return html`${waiting(this.suspects)}${ranked?.answer ? suspectsList(ranked.answer, this.lists.chosen, this.address?.asked ?? []) : nothing}
      <details class="asked" ?open=${!closed}><summary>${closed ? html`Lists <span class="lighter">${down} down, ${up} up: open to change them</span>` : "What is down, and what is up"}</summary>
        <sw-alarms .lists=${this.lists} .strangers=${ranked?.strangers ?? []}></sw-alarms></details>`;
  }

  /** @returns {unknown} */
  reading() {
    const { shot, fault } = this;
    const closed = fault.answer !== null;
    const beside = fault.problem?.parameter ? nothing : waiting(fault);
    return html`${beside}${fault.answer ? faultView(fault.answer, this.place, shot, this.address?.asked ?? []) : nothing}
      <details class="asked" ?open=${!closed}><summary>${closed ? html`Shot <span class="lighter">${shotInWords(shot)}: open to change it</span>` : "What the OTDR shows"}</summary>
        <sw-reading .shot=${shot} .problem=${fault.problem}></sw-reading></details>`;
  }

  /** @returns {unknown} */
  incident() {
    const { lists, shot } = this;
    const asked = this.address?.asked ?? [];
    const hand = { cuts: cutsOf(asked).map(writeCut), down: readList(lists.down).codes, up: readList(lists.up).codes, reading: shot.distance ? shotInWords(shot) : "" };
    const number = asked.find(([name]) => name === "incident")?.[1] ?? "";
    return html`<sw-incident .number=${number} .hand=${hand} .zone=${this.zone} .stamp=${this.stamp}></sw-incident>`;
  }

  /** @returns {unknown} */
  whoIsDown() {
    return html`<sw-who-is-down .cuts=${cutsOf(this.address?.asked ?? [])} .answer=${this.impact.answer?.answer ?? null}></sw-who-is-down>${waiting(this.impact)}`;
  }
}

customElements.define("sw-outage", OutageDesk);
