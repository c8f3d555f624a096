/** What holds for every file of the pages, whatever it shows. */
import assert from "node:assert/strict";
import { readdirSync, readFileSync } from "node:fs";
import { join, relative } from "node:path";
import { test } from "node:test";
import { fileURLToPath } from "node:url";

const web = fileURLToPath(new URL("..", import.meta.url));
const notServed = new Set(["node_modules", "test", "package.json", "package-lock.json", "eslint.config.js", "tsconfig.json"]);

/** @param {string} folder @returns {string[]} the files below it that the program serves */
function servedFiles(folder) {
  return readdirSync(folder, { withFileTypes: true })
    .filter((entry) => !notServed.has(entry.name))
    .flatMap((entry) => (entry.isDirectory() ? servedFiles(join(folder, entry.name)) : [join(folder, entry.name)]));
}

/** @param {RegExp} pattern @param {RegExp} names @returns {string[]} file and match, of every match in such files */
function matches(pattern, names) {
  return servedFiles(web)
    .filter((file) => names.test(file))
    .flatMap((file) =>
      [...readFileSync(file, "utf8").matchAll(pattern)].map((match) => `${relative(web, file)}: ${match[0]}`),
    );
}

test("the pages load nothing from another host", () => {
  const elsewhere = matches(/(?:src|href|import|from|url\(|fetch\()[\s=("'`]*(?:https?:)?\/\/[\w.-]+/g, /\.(js|html|css|svg)$/);
  assert.deepEqual(elsewhere, []);
});

test("the pages hold no script or style written into the markup's attributes", () => {
  assert.deepEqual(matches(/<[a-z][^>]*\s(?:on[a-z]+)="/g, /\.html$/), []);
});

test("the pages' libraries are checked in the versions that the program serves", () => {
  const pom = readFileSync(join(web, "..", "pom.xml"), "utf8");
  const checked = JSON.parse(readFileSync(join(web, "package.json"), "utf8")).devDependencies;
  const served = (/** @type {string} */ name) => pom.match(new RegExp(`<${name}\\.version>([^<]+)<`))?.[1];
  assert.equal(checked.lit, served("lit"));
  const [major, minor] = (served("leaflet") ?? "").split(".");
  assert.ok(checked["@types/leaflet"].startsWith(`${major}.${minor}.`), "types of the Leaflet that is served");
});
