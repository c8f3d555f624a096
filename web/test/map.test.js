/** What the map draws, and what a click on it means. */
import assert from "node:assert/strict";
import { test } from "node:test";
import { Frame, Room, boxOf } from "../map/frame.js";
import { distanceTo, hitAt } from "../map/nearest.js";
import { projectBase, projectPlant, worldLine, worldSpot } from "../map/projected.js";
import { PATTERNS, TAGS, weightOf } from "../map/tags.js";
import { useOf } from "../plant/tube-cells.js";
import { strongestUse, usesInWords, useSign } from "../plant/uses.js";

test("the world's square has the meridian and the equator in its middle (EPSG:3857)", () => {
  assert.deepEqual(worldSpot(0, 0), { x: 128, y: 128 });
  assert.deepEqual(worldSpot(-180, 0), { x: 0, y: 128 });
  const corner = worldSpot(180, 85.05112878);
  assert.ok(Math.abs(corner.x - 256) < 1e-9 && Math.abs(corner.y) < 1e-3);
});

test("every kind of structure has its letters, every placement its own pattern", () => {
  assert.equal(new Set(Object.values(TAGS)).size, 9);
  assert.equal(new Set(Object.values(PATTERNS).map(String)).size, 5);
  assert.ok(weightOf(24) < weightOf(96) && weightOf(96) < weightOf(288) && weightOf(288) < weightOf(289));
});

/** @returns {any} */
function plant() {
  const point = (/** @type {string} */ code, /** @type {string} */ kind, /** @type {number} */ enclosures, /** @type {number} */ lon) => ({ type: "Feature", geometry: { type: "Point", coordinates: [lon, 0] }, properties: { record: "structure", code, kind, state: "in service", enclosures, fibers: 12 } });
  const line = { type: "Feature", geometry: { type: "LineString", coordinates: [[0, 0], [0.01, 0]] }, properties: { record: "span", code: "SP-1", from: "P-1", to: "HE-1", placement: "duct", state: "in service", fibers: 12, cables: 1 } };
  return { type: "FeatureCollection", posting: 1, truncated: false, features: [line, point("P-1", "pole", 0, 0), point("HE-1", "building", 1, 0.01)] };
}

/** @returns {Frame} zoom 16, the point 0, 0 at the middle of 800 by 600 px */
const frame = () => new Frame(16, 128 * 2 ** 16 - 400, 128 * 2 ** 16 - 300, 800, 600);

test("sites come before the rest, so that they get the room", () => {
  assert.deepEqual(projectPlant(plant()).structures.map((each) => each.code), ["HE-1", "P-1"]);
});

test("a click means the nearest structure, else the span under it, else nothing", () => {
  const { structures, spans } = projectPlant(plant());
  assert.deepEqual(hitAt(frame(), structures, spans, 405, 303), { view: "structure", code: "P-1", kind: "pole" });
  assert.deepEqual(hitAt(frame(), structures, spans, 600, 304), { view: "span", code: "SP-1", kind: "duct span" });
  assert.equal(hitAt(frame(), structures, spans, 600, 340), null);
  assert.equal(hitAt(frame(), structures, spans, 600, 340, 60)?.code, "SP-1");
});

test("the distance to a line is to its nearest piece, not to its ends' line", () => {
  const bent = worldLine([[0, 0], [0.005, 0.005], [0.01, 0]]);
  assert.ok(distanceTo(frame(), bent, 400, 300) < 1e-6);
  assert.ok(distanceTo(frame(), bent, 633, 300) > 100);
});

test("base map areas lie under lines, and lines under places", () => {
  const feature = (/** @type {string} */ type, /** @type {any} */ coordinates, /** @type {string} */ kind) => ({ type: "Feature", geometry: { type, coordinates }, properties: { kind, name: kind, rank: null } });
  const base = projectBase(/** @type {any} */ ({ features: [feature("Point", [0, 0], "place"), feature("LineString", [[0, 0], [1, 1]], "road"), feature("MultiPolygon", [[[[0, 0], [1, 0], [1, 1], [0, 0]]]], "water")] }));
  assert.deepEqual(base.map((each) => [each.kind, each.area, each.rank]), [["water", true, 2], ["road", false, 2], ["place", false, 3]]);
});

test("room once taken is not given again, across cells too", () => {
  const room = new Room();
  assert.ok(room.take(10, 10, 200, 30));
  assert.ok(!room.take(150, 20, 160, 25));
  assert.ok(room.taken(70, 20) && !room.taken(70, 40));
  assert.ok(room.take(-50, -50, 5, 5));
});

test("a line off the screen is not drawn", () => {
  assert.ok(frame().meets(boxOf([worldLine([[0, 0], [0.001, 0.001]])])));
  assert.ok(!frame().meets(boxOf([worldLine([[1, 1], [1.1, 1]])])));
  assert.ok(frame().meets(boxOf([worldLine([[-1, 0], [1, 0]])])), "it crosses the screen");
});

test("of several uses along a cable the one that a person must know of stands in the chart", () => {
  assert.equal(strongestUse(["spare", "dead", "in_use"]), "dead");
  assert.equal(strongestUse(["spare_verified", "spare_unknown"]), "spare_unknown", "unknown never looks like spare");
  const section = (/** @type {any[]} */ uses) => /** @type {any} */ ({ uses });
  const range = (/** @type {string} */ fibers, /** @type {string} */ use) => ({ fibers, use });
  assert.equal(useOf([section([range("1-12", "spare")]), section([range("1-6", "in_use"), range("7-12", "spare")])], 3)?.use, "in_use");
  assert.equal(useOf([section([range("1-12", "spare")])], 13), null);
});

test("every use has words, and all but spare a letter of its own", () => {
  const letters = ["in_use", "jumpered", "reserved", "leased", "dead", "suspect", "spare_unknown", "spare", "spare_verified"].map((use) => useSign(/** @type {any} */ (use)).letter);
  assert.deepEqual(letters, ["U", "J", "R", "L", "D", "?", "n", "", "✓"]);
  const none = { in_use: 0, jumpered: 0, reserved: 0, leased: 0, dead: 0, suspect: 0, spare_unknown: 0, spare: 0, spare_verified: 0 };
  assert.equal(usesInWords({ ...none, in_use: 10, spare: 2 }), "10 in use, 2 spare");
  assert.equal(usesInWords(none), "none known");
});
