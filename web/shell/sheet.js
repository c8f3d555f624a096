import { html } from "lit";

/** @typedef {import("../address/address.js").Address} Address */
/** @typedef {import("../server/contract.d.ts").Status} Status */
/** @typedef {import("../server/contract.d.ts").Path} Path */

/**
 * @typedef {object} SheetState
 * @property {Address} address
 * @property {Status | null} status
 * @property {Path[] | null} paths of the view's own trace; null while it is traced
 * @property {string} stamp from which records
 * @property {Path[] | null} traced of the path at hand, whatever view it came from; null while it is traced
 */

/**
 * The views, each by its name in an address.
 * @type {Readonly<Record<string, (state: SheetState, zone: string) => unknown>>}
 */
const VIEWS = Object.freeze({
  structure: ({ address, stamp }, zone) => html`<sw-structure .code=${address.code} .stamp=${stamp} .zone=${zone}></sw-structure>`,
  span: ({ address, stamp }, zone) => html`<sw-span .code=${address.code} .stamp=${stamp} .zone=${zone}></sw-span>`,
  enclosure: ({ address, stamp }, zone) => html`<sw-enclosure .code=${address.code} .stamp=${stamp} .zone=${zone}></sw-enclosure>`,
  cable: ({ address, stamp }, zone) => html`<sw-cable .code=${address.code} .stamp=${stamp} .zone=${zone}></sw-cable>`,
  circuit: ({ address, stamp, paths }, zone) =>
    html`<sw-circuit .code=${address.code} .stamp=${stamp} .zone=${zone} .paths=${paths} .chosen=${address.path}></sw-circuit>`,
  fiber: ({ address, stamp, paths }, zone) =>
    html`<sw-fiber .code=${address.code} .stamp=${stamp} .zone=${zone} .paths=${paths} .chosen=${address.path}></sw-fiber>`,
  port: ({ address, stamp, paths }, zone) =>
    html`<sw-port .code=${address.code} .stamp=${stamp} .zone=${zone} .paths=${paths} .chosen=${address.path}></sw-port>`,
  circuits: ({ stamp }) => html`<sw-circuits .code=${"circuits"} .stamp=${stamp}></sw-circuits>`,
  postings: ({ stamp }, zone) => html`<sw-postings .code=${"postings"} .stamp=${stamp} .zone=${zone}></sw-postings>`,
  outage: ({ address, stamp, traced }, zone) => html`<sw-outage .address=${address} .stamp=${stamp} .zone=${zone} .paths=${traced}></sw-outage>`,
  posting: ({ address, stamp }, zone) => html`<sw-posting .code=${address.code} .stamp=${stamp} .zone=${zone}></sw-posting>`,
});

/**
 * The view that an address opens.
 * @param {SheetState} state
 * @returns {unknown}
 */
export function sheetView(state) {
  const view = VIEWS[state.address.view];
  return view ? view(state, state.status?.time_zone ?? "UTC") : html`<sw-start .status=${state.status}></sw-start>`;
}

/**
 * What the browser's title says of an address.
 * @param {Address} address
 * @param {Status | null} status
 * @returns {string}
 */
export function titleOf({ view, code, asOf, asIf }, status) {
  const thing = view === "start" ? (status?.owner ?? "") : view === "outage" ? "Outage" : [view, code].filter(Boolean).join(" ");
  const when = [asOf && `as of ${asOf}`, asIf && `as if ${asIf}`].filter(Boolean).join(", ");
  return [thing, when, "Spanwright"].filter(Boolean).join(" · ");
}
