/** Questions to the server, as `schema/openapi.json` says. */

/** @typedef {import('./contract.d.ts').Problem} ProblemBody */
/** @typedef {import('./contract.d.ts').Fault} Fault */

/**
 * @typedef {string | number | boolean | readonly string[] | null | undefined} Param several of a name as a list
 */

/** A refusal that the server explained, or that it could not be reached. */
export class Problem extends Error {
  /**
   * @param {string} code stable name: `not_found`, `unreachable`, ...
   * @param {string} detail what is wrong and what would be right
   * @param {string} [parameter] the parameter that is wrong, where there is one
   * @param {Fault[]} [faults] of a refused posting: each by itself
   */
  constructor(code, detail, parameter = "", faults = []) {
    super(detail);
    this.code = code;
    this.parameter = parameter;
    this.faults = faults;
  }
}

/** @type {{ asOf: string, asIf: string }} */
let standing = { asOf: "", asIf: "" };

/**
 * From which records every later question is answered.
 * @param {string} asOf posting or time; empty for now
 * @param {string} asIf job; empty for none
 */
export function answerFrom(asOf, asIf) {
  standing = { asOf, asIf };
}

/**
 * Asks the server, from the records chosen.
 * @param {string} path parts already encoded, as {@link pathTo} makes them
 * @param {Record<string, Param>} [params] null, undefined and empty ones are left out
 * @param {AbortSignal} [signal]
 * @returns {Promise<any>} the answer, of the type that the contract names
 */
export function ask(path, params = {}, signal) {
  return askAnytime(path, { ...params, as_of: standing.asOf, as_if: standing.asIf }, signal);
}

/**
 * Asks the server, from the records chosen, what is too long for an address, or has it note something.
 * @param {string} path parts already encoded
 * @param {unknown} body written as JSON
 * @param {AbortSignal} [signal]
 * @returns {Promise<any>} the answer, of the type that the contract names
 */
export async function send(path, body, signal) {
  const address = addressOf(path, { as_of: standing.asOf, as_if: standing.asIf });
  const response = await reach(address, signal, { method: "POST", headers: { "Content-Type": "application/json" }, body: JSON.stringify(body) });
  if (response.ok) return response.json();
  throw await problemOf(response);
}

/**
 * Asks the server what does not depend on which records are chosen: the base map, the journal.
 * @param {string} path parts already encoded
 * @param {Record<string, Param>} [params] null, undefined and empty ones are left out
 * @param {AbortSignal} [signal]
 * @returns {Promise<any>} the answer, of the type that the contract names
 */
export async function askAnytime(path, params = {}, signal) {
  const response = await reach(addressOf(path, params), signal);
  if (response.ok) return response.json();
  throw await problemOf(response);
}

/**
 * A path of the contract with codes put in.
 * @param {string} kind e.g. `enclosures`
 * @param {string} code
 * @returns {string}
 */
export function pathTo(kind, code) {
  return `/${kind}/${encodeURIComponent(code)}`;
}

/**
 * @param {string} path
 * @param {Record<string, Param>} params
 * @returns {string}
 */
function addressOf(path, params) {
  const query = new URLSearchParams();
  for (const [name, value] of Object.entries(params)) {
    if (value instanceof Array) value.forEach((each) => query.append(name, each));
    else if (value !== null && value !== undefined && value !== "") query.set(name, String(value));
  }
  const text = query.toString();
  return text ? `${path}?${text}` : path;
}

/**
 * @param {string} address
 * @param {AbortSignal | undefined} signal
 * @param {{ method?: string, headers?: Record<string, string>, body?: string }} [how]
 * @returns {Promise<Response>}
 */
async function reach(address, signal, how = {}) {
  try {
    return await fetch(address, { ...how, signal: signal ?? null, headers: { Accept: "application/json", ...how.headers } });
  } catch (cause) {
    if (cause instanceof DOMException && cause.name === "AbortError") throw cause;
    throw new Problem("unreachable", "The server does not answer. Check that it is running, then try again.");
  }
}

/**
 * @param {Response} response
 * @returns {Promise<Problem>}
 */
async function problemOf(response) {
  try {
    const body = /** @type {ProblemBody} */ (await response.json());
    return new Problem(body.code, [body.detail, ...(body.faults ?? []).map((fault) => fault.text)].join(" "), body.parameter, body.faults);
  } catch {
    return new Problem("internal", `The server answered ${response.status} and did not say why.`);
  }
}
