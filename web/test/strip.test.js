/** The strip's window and its labels. */
import assert from "node:assert/strict";
import { test } from "node:test";
import { fieldOf, yOf } from "../strip/curve-field.js";
import { Window, moved, showing, withoutOverlap, zoomed } from "../strip/window.js";

test("glass lies to scale between the two sides", () => {
  const window = new Window(100, 300, 50, 450);
  assert.equal(window.x(100), 50);
  assert.equal(window.x(200), 250);
  assert.equal(window.glass(350), 250);
  assert.equal(window.glass(9999), 300);
  assert.ok(window.holds(300) && !window.holds(301) && window.holds(301, 2));
});

test("coming closer keeps the place where it is, and never leaves the path", () => {
  const closer = zoomed({ from: 0, to: 1000 }, 400, 0.5, 1000);
  assert.deepEqual(closer, { from: 200, to: 700 });
  assert.deepEqual(zoomed(closer, 400, 100, 1000), { from: 0, to: 1000 });
  const least = zoomed({ from: 0, to: 1000 }, 990, 0.0001, 1000);
  assert.ok(Math.abs(least.to - least.from - 20) < 1e-9 && least.to <= 1000);
  assert.deepEqual(zoomed({ from: 0, to: 5 }, 2, 0.1, 5), { from: 0, to: 5 }, "a path shorter than the least is shown whole");
});

test("moving along stops at the path's ends", () => {
  assert.deepEqual(moved({ from: 200, to: 400 }, -500, 1000), { from: 0, to: 200 });
  assert.deepEqual(moved({ from: 200, to: 400 }, 5000, 1000), { from: 800, to: 1000 });
});

test("a place that is out of sight is brought in, one in sight moves nothing", () => {
  const stretch = { from: 200, to: 400 };
  assert.equal(showing(stretch, 300, 1000), stretch);
  const brought = showing(stretch, 900, 1000);
  assert.ok(brought.from <= 900 && brought.to >= 900);
});

test("labels give way to heavier ones and stay inside", () => {
  const label = (/** @type {string} */ item, /** @type {number} */ middle, /** @type {number} */ weight) => ({ item, middle, width: 40, weight });
  const placed = withoutOverlap([label("a", 10, 1), label("b", 50, 5), label("c", 60, 9), label("d", 200, 1)], 0, 210);
  assert.deepEqual(placed.map((each) => each.item), ["a", "c", "d"].filter((each) => placed.some((one) => one.item === each)));
  assert.ok(placed.some((each) => each.item === "c") && !placed.some((each) => each.item === "b"));
  for (const each of placed) assert.ok(each.middle >= 20 && each.middle <= 190);
});

/** @returns {any} a curve that steps 0.6 dB at its start and slopes to 2.6 dB, with a budget of 5 dB */
const curve = () => ({ path: { budget: { max_db: 5, margin_db: 1 } }, curve: [[0, 0], [0, 0.6], [1000, 2.6]] });

test("the whole curve is drawn from 0 dB on, down to the budget where it is not far", () => {
  const field = fieldOf([curve()], new Window(0, 1000, 0, 500), true, 0, 100);
  assert.equal(field.least, 0);
  assert.ok(field.most > 4 && field.most < 4.5);
  assert.equal(yOf(field, 0), 0);
  assert.equal(yOf(field, field.most), 100);
});

test("a part of the curve fills the paper", () => {
  const field = fieldOf([curve()], new Window(500, 600, 0, 500), false, 0, 100);
  assert.ok(field.least > 1.5 && field.least < 1.6 && field.most > 1.8 && field.most < 1.9, JSON.stringify(field));
});
