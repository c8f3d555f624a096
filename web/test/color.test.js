/** Colours of tubes and fibers. Order and tracers: 7 CFR 1755.200, Table 7. */
import assert from "node:assert/strict";
import { test } from "node:test";
import { parseColor } from "../color/names.js";

const TWELVE = ["blue", "orange", "green", "brown", "slate", "white", "red", "black", "yellow", "violet", "rose", "aqua"];

test("each of the twelve has its two letters", () => {
  assert.deepEqual(TWELVE.map((words) => parseColor(words).code), ["BL", "OR", "GR", "BR", "SL", "WH", "RD", "BK", "YL", "VI", "RS", "AQ"]);
  assert.deepEqual(TWELVE.map((words) => parseColor(words).base), TWELVE);
});

test("a tracer is a stripe, several are several", () => {
  const twenty = parseColor("black with yellow tracer");
  assert.deepEqual([twenty.base, twenty.tracers, twenty.tracer], ["black", 1, "yellow"]);
  const third = parseColor("blue with 2 black tracers");
  assert.deepEqual([third.base, third.code, third.tracers, third.tracer], ["blue", "BL", 2, "black"]);
  assert.equal(parseColor("blue").tracers, 0);
});

test("colours of other national orders are drawn as what they look like, and keep their own words", () => {
  assert.deepEqual([parseColor("Gray").base, parseColor("Gray").words], ["slate", "Gray"]);
  assert.deepEqual([parseColor("pink").base, parseColor("pink").code], ["rose", "PI"]);
  assert.equal(parseColor("natural").base, "other");
});
