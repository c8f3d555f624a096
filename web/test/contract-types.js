/**
 * Writes the types of `schema/openapi.json` as TypeScript declarations, so that the pages are checked against the contract.
 * Run `node test/contract-types.js` in this folder's parent to write `server/contract.d.ts` anew.
 */
import { readFileSync, writeFileSync } from "node:fs";

const CONTRACT = new URL("../../schema/openapi.json", import.meta.url);
const TYPES = new URL("../server/contract.d.ts", import.meta.url);

/** @typedef {Record<string, any>} Schema */

/**
 * The declarations of every named schema, in the contract's order.
 * @returns {string}
 */
export function contractTypes() {
  /** @type {Record<string, Schema>} */
  const schemas = JSON.parse(readFileSync(CONTRACT, "utf8")).components.schemas;
  const lines = ["// Written from schema/openapi.json by test/contract-types.js: change the contract, not this file.", ""];
  for (const [name, schema] of Object.entries(schemas)) lines.push(`export type ${name} = ${typeOf(schema, "")};`, "");
  return lines.join("\n");
}

/**
 * The declarations that are kept.
 * @returns {string}
 */
export function keptTypes() {
  return readFileSync(TYPES, "utf8");
}

/**
 * @param {Schema} schema
 * @param {string} indent
 * @returns {string}
 */
function typeOf(schema, indent) {
  if (schema["$ref"]) return schema["$ref"].split("/").at(-1);
  if (schema["oneOf"]) return schema["oneOf"].map((/** @type {Schema} */ each) => typeOf(each, indent)).join(" | ");
  if ("const" in schema) return JSON.stringify(schema["const"]);
  if (schema["enum"]) return schema["enum"].map((/** @type {unknown} */ each) => JSON.stringify(each)).join(" | ");
  const types = [schema["type"] ?? "any"].flat();
  return types.map((type) => plainType(type, schema, indent)).join(" | ");
}

/**
 * @param {string} type
 * @param {Schema} schema
 * @param {string} indent
 * @returns {string}
 */
function plainType(type, schema, indent) {
  if (type === "integer") return "number";
  if (type === "array") return `Array<${typeOf(schema["items"], indent)}>`;
  if (type === "object") return objectType(schema, indent);
  return type;
}

/**
 * @param {Schema} schema
 * @param {string} indent
 * @returns {string}
 */
function objectType(schema, indent) {
  const inner = `${indent}  `;
  if (!schema["properties"]) return `Record<string, ${typeOf(schema["additionalProperties"] ?? {}, inner)}>`;
  /** @type {Array<[string, Schema]>} */
  const properties = Object.entries(schema["properties"]);
  const required = new Set(schema["required"]);
  const lines = properties.map(([name, each]) => {
    const comment = each["description"] ? `${inner}/** ${each["description"]} */\n` : "";
    return `${comment}${inner}${name}${required.has(name) ? "" : "?"}: ${typeOf(each, inner)};`;
  });
  return `{\n${lines.join("\n")}\n${indent}}`;
}

if (process.argv[1] === new URL(import.meta.url).pathname) writeFileSync(TYPES, contractTypes());
