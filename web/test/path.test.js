/** The path at hand: its track, its curve, its sections and stops. */
import assert from "node:assert/strict";
import { test } from "node:test";
import { lossAt, powerCurve } from "../path/curve.js";
import { elementAt, sectionsOf, stopsOf } from "../path/sections.js";
import { glassAt, nearestOn, placeAt, trackLength } from "../path/track.js";

/** Tray glass of 2 m, a span of 100 m, a coil of 20 m, a span of 50 m; 2 % more glass than sheath. */
const TRACK = [
  [0, 0, 0, -123, -48],
  [2, 0, 0, -123, -48],
  [104, 100, 100, -122.999, -48],
  [124.4, 120, 100, -122.999, -48],
  [175.4, 170, 150, -122.999, -48.0005],
];

/** @returns {any} a path of two cables, one of which goes through an enclosure uncut */
function path() {
  const fiber = (/** @type {string} */ cable, /** @type {number} */ from, /** @type {number} */ glass, /** @type {number} */ db) => ({ kind: "fiber", cable, fiber: 1, glass_from_m: from, glass_m: glass, loss_db: db, basis: "type" });
  const at = (/** @type {string} */ kind, /** @type {string} */ enclosure, /** @type {number} */ from, /** @type {number} */ db, basis = "planning") => ({ kind, enclosure, glass_from_m: from, loss_db: db, basis });
  return {
    elements: [at("connector", "E1", 0, 0.5), at("splice", "E1", 0, 0.1), fiber("F", 0, 100, 0.2), at("through", "E2", 100, 0), fiber("F", 100, 60, 0.12), at("splice", "E3", 160, 0.05, "measured"), fiber("G", 160, 15.4, 0.03)],
  };
}

test("a place on the track is found by its glass, and the glass by any measure", () => {
  assert.equal(trackLength(TRACK, "glass"), 175.4);
  assert.equal(trackLength([], "glass"), 0);
  const middle = placeAt(TRACK, 53);
  assert.deepEqual([middle.sheath, middle.route], [50, 50]);
  assert.ok(Math.abs(middle.lon - -122.9995) < 1e-9);
  assert.equal(glassAt(TRACK, "sheath", 50), 53);
  assert.equal(glassAt(TRACK, "route", 125), 124.4 + 25.5);
});

test("within a coil the place stays, and the glass goes on", () => {
  assert.deepEqual([placeAt(TRACK, 114.2).sheath, placeAt(TRACK, 114.2).route], [110, 100]);
  assert.equal(glassAt(TRACK, "route", 100), 104, "where the route first reaches the coil");
});

test("beyond the ends a place is the end", () => {
  assert.equal(placeAt(TRACK, -5).glass, 0);
  assert.equal(placeAt(TRACK, 999).route, 150);
});

test("the point of a track nearest to the map's pointer is found across its bends", () => {
  const near = nearestOn(TRACK, -122.9994, -47.9999);
  assert.ok(near && Math.abs(near.glass - (2 + 102 * 0.6)) < 0.5, String(near?.glass));
  assert.equal(nearestOn([], 0, 0), null);
});

test("the power curve steps at joints and slopes along glass", () => {
  const curve = powerCurve(path());
  assert.equal(lossAt(curve, 0).toFixed(3), "0.600");
  assert.equal(lossAt(curve, 50).toFixed(3), "0.700");
  assert.equal(lossAt(curve, 159.999).toFixed(3), "0.920");
  assert.equal(lossAt(curve, 160).toFixed(3), "0.970", "the splice is in");
  assert.equal(lossAt(curve, 1000).toFixed(3), "1.000");
  for (let index = 1; index < curve.length; index++) {
    assert.ok((curve[index]?.[0] ?? 0) >= (curve[index - 1]?.[0] ?? 0), "glass never falls");
  }
});

test("a fiber that goes through an enclosure stays one section", () => {
  const sections = sectionsOf(path());
  assert.deepEqual(sections.map((each) => [each.fiber.cable, each.from, each.to]), [["F", 0, 160], ["G", 160, 175.4]]);
});

test("what is met at one enclosure is one stop, with its loss in sum", () => {
  const stops = stopsOf(path());
  assert.deepEqual(stops.map((each) => [each.at, each.elements.length, Number(each.loss.toFixed(2)), each.through]), [["E1", 2, 0.6, false], ["E2", 1, 0, true], ["E3", 1, 0.05, false]]);
});

test("the glass at a place is the fiber it lies in", () => {
  assert.equal(elementAt(path(), 130)?.glass_from_m, 100);
  assert.equal(elementAt(path(), 500), null);
});
