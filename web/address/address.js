/**
 * Addresses of views: what stands after the # in the browser's address line.
 * `#/circuit/RC-01?as_of=41&nm=1310,1550` opens the same thing wherever it is pasted.
 */

/** @typedef {'start'|'structure'|'span'|'enclosure'|'cable'|'fiber'|'port'|'circuit'|'circuits'|'postings'|'posting'|'outage'} View */

/**
 * @typedef {object} Address
 * @property {View} view what is open
 * @property {string} code on what, in the notation of the records; empty where the view needs none
 * @property {string} trace the path at hand as `circuit:RC-01`, `port:E1/P/1` or `fiber:F-1:3`; empty for none
 * @property {number} path which of the trace's paths, from 0
 * @property {number[]} nm wavelengths drawn, nm; empty for the path's own
 * @property {string} asOf posting or time; empty for now
 * @property {string} asIf job; empty for none
 * @property {Asked} asked what the view itself was asked, in order; a name may come several times
 */

/** @typedef {ReadonlyArray<readonly [string, string]>} Asked names and values */

/** @type {readonly View[]} */
const VIEWS = ["start", "structure", "span", "enclosure", "cable", "fiber", "port", "circuit", "circuits", "postings", "posting", "outage"];

/** Views whose thing has a path of its own. */
const TRACED = ["circuit", "port", "fiber"];

/** Parameters that mean the same in every view. */
const COMMON = ["trace", "path", "nm", "as_of", "as_if"];

/** @type {Address} */
const START = { view: "start", code: "", trace: "", path: 0, nm: [], asOf: "", asIf: "", asked: [] };

/**
 * Reads an address; what cannot be read opens the start.
 * @param {string} hash with or without its #
 * @returns {Address}
 */
export function parseAddress(hash) {
  const [route, query] = halves(hash.replace(/^#?\/?/, ""), "?");
  const [view, rest] = halves(route, "/");
  const known = VIEWS.find((each) => each === view) ?? "start";
  const code = decode(rest);
  const params = new URLSearchParams(query);
  const text = (/** @type {string} */ name) => params.get(name) ?? "";
  return {
    view: known,
    code,
    trace: TRACED.includes(known) ? `${known}:${code}` : text("trace"),
    path: Number.parseInt(text("path"), 10) || 0,
    nm: text("nm").split(",").map(Number).filter((each) => each > 0),
    asOf: text("as_of"),
    asIf: text("as_if"),
    asked: [...params].filter(([name]) => !COMMON.includes(name)),
  };
}

/**
 * Writes an address; the inverse of {@link parseAddress}.
 * @param {Address} address
 * @returns {string} with its #
 */
export function formatAddress(address) {
  const params = new URLSearchParams();
  const own = TRACED.includes(address.view) ? `${address.view}:${address.code}` : "";
  if (address.trace && address.trace !== own) params.set("trace", address.trace);
  if (address.path > 0) params.set("path", String(address.path));
  if (address.nm.length > 0) params.set("nm", address.nm.join(","));
  if (address.asOf) params.set("as_of", address.asOf);
  if (address.asIf) params.set("as_if", address.asIf);
  for (const [name, value] of address.asked) params.append(name, value);
  const code = address.code.split("/").map(encodeURIComponent).join("/").replaceAll("%3A", ":").replaceAll("%20", "+");
  const query = params.toString().replaceAll("%2F", "/").replaceAll("%3A", ":").replaceAll("%2C", ",").replaceAll("%40", "@").replaceAll("%3D", "=");
  return `#/${address.view}${code ? `/${code}` : ""}${query ? `?${query}` : ""}`;
}

/**
 * The address of another view, the time, the job and the path at hand kept.
 * @param {View} view
 * @param {string} [code]
 * @param {Asked} [asked] what the view is asked
 * @returns {string} with its #
 */
export function hrefTo(view, code = "", asked = []) {
  const here = currentAddress();
  const traced = TRACED.includes(view);
  const trace = traced ? `${view}:${code}` : here.trace;
  const same = trace === here.trace;
  return formatAddress({ ...here, view, code, asked, trace, path: same ? here.path : 0, nm: same ? here.nm : [] });
}

/**
 * The address that is open.
 * @returns {Address}
 */
export function currentAddress() {
  return typeof location === "undefined" ? START : parseAddress(location.hash);
}

/**
 * @param {string} text
 * @param {string} mark
 * @returns {[string, string]} what stands before the first mark, and after it
 */
function halves(text, mark) {
  const at = text.indexOf(mark);
  return at < 0 ? [text, ""] : [text.slice(0, at), text.slice(at + 1)];
}

/**
 * @param {string} text
 * @returns {string}
 */
function decode(text) {
  try {
    return decodeURIComponent(text.replaceAll("+", " "));
  } catch {
    return text;
  }
}
