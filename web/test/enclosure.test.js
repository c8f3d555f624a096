/** The enclosure's diagram: bands, gates and bars. */
import assert from "node:assert/strict";
import { test } from "node:test";
import { bandsOf, restsOf } from "../plant/enclosure-bands.js";
import { DRAWING, layOut, onOutline, rangesText, throughRanges, wayRound } from "../plant/enclosure-layout.js";
import { placeLabels } from "../plant/labels.js";
import { tubeOf } from "../plant/ends.js";

/** @param {string} cable @param {string} side @param {string} numbers @returns {any} */
const leg = (cable, side, numbers) => ({ kind: "leg", of: cable, side, numbers, enclosure: "E", text: `${cable} ${side} ${numbers}` });

/** @param {any} a @param {any} b @param {object} [more] @returns {any} */
const joint = (a, b, more = {}) => ({ kind: "splice", a, b, count: stretch(a.numbers), tray: "1", trust: "posted", ...more });

/** @param {string} numbers @returns {number} how many */
function stretch(numbers) {
  const [first = 0, last = first] = numbers.split("-").map(Number);
  return Math.abs(last - first) + 1;
}

/** @param {any[]} joints @param {any[]} [legs] @param {object} [more] @returns {any} */
const enclosure = (joints, legs = [], more = {}) => ({ joints, legs, panels: [], splitters: [], ...more });

/** @param {string} cable @param {string} side @param {number} bearing @param {any[]} ends @returns {any} */
const legOf = (cable, side, bearing, ends) => ({ cable, side, bearing_deg: bearing, ends, fibers: 24, fibers_per_tube: 12, tube_colors: ["blue", "orange"], fiber_colors: [] });

test("tubes joined straight on are one band", () => {
  const bands = bandsOf(enclosure([joint(leg("F", "back", "1-12"), leg("G", "ahead", "1-12")), joint(leg("F", "back", "13-24"), leg("G", "ahead", "13-24"), { tray: "2" })]));
  assert.deepEqual(bands.map((each) => [each.a.numbers, each.b.numbers, each.count, each.trays.join()]), [["1-24", "1-24", 24, "1,2"]]);
});

test("tubes exchanged stand out as bands of their own", () => {
  const straight = (/** @type {number} */ tube) => `${tube * 12 - 11}-${tube * 12}`;
  const to = (/** @type {number} */ tube) => (tube === 7 ? 19 : tube === 19 ? 7 : tube);
  const joints = Array.from({ length: 24 }, (_, index) => joint(leg("F", "back", straight(index + 1)), leg("G", "ahead", straight(to(index + 1)))));
  const bands = bandsOf(enclosure(joints));
  assert.deepEqual(bands.map((each) => `${each.a.numbers} = ${each.b.numbers}`), ["1-72 = 1-72", "73-84 = 217-228", "85-216 = 85-216", "217-228 = 73-84", "229-288 = 229-288"]);
});

test("a range that falls goes on downwards only, and one of unknown trust is another band", () => {
  const flipped = bandsOf(enclosure([joint(leg("F", "back", "1-12"), leg("G", "ahead", "12-1")), joint(leg("F", "back", "13-24"), leg("G", "ahead", "13-24"))]));
  assert.equal(flipped.length, 2);
  const doubtful = bandsOf(enclosure([joint(leg("F", "back", "1-12"), leg("G", "ahead", "1-12")), joint(leg("F", "back", "13-24"), leg("G", "ahead", "13-24"), { trust: "unknown" })]));
  assert.deepEqual(doubtful.map((each) => each.trust), ["known", "unknown"]);
  const verified = bandsOf(enclosure([joint(leg("F", "back", "1-12"), leg("G", "ahead", "1-12")), joint(leg("F", "back", "13-24"), leg("G", "ahead", "13-24"), { trust: "verified" })]));
  assert.equal(verified.length, 1);
});

test("jumpers are not drawn within the outline", () => {
  const front = { kind: "port_front", of: "P", enclosure: "E", side: null, numbers: "1", text: "E/P/1" };
  assert.deepEqual(bandsOf(enclosure([joint(front, { ...front, numbers: "2" }, { kind: "jumper" })])), []);
});

test("ends without a joint are gathered by what became of them", () => {
  const rests = restsOf(legOf("F", "back", 0, [{ fibers: "1-12", state: "spliced" }, { fibers: "13-18", state: "capped" }, { fibers: "19", state: "unknown" }, { fibers: "20-24", state: "capped" }]));
  assert.deepEqual(rests.map((each) => [each.state, each.ranges.join(), each.count]), [["capped", "13-18,20-24", 11], ["unknown", "19", 1]]);
});

test("through fibers are read as ranges, neighbours joined, or counted where they are many", () => {
  const ranges = throughRanges(legOf("F", "ahead", 0, [{ fibers: "1-4", state: "spliced" }, { fibers: "5-12", state: "through" }, { fibers: "13-20", state: "unrecorded" }, { fibers: "22", state: "through" }]));
  assert.deepEqual(ranges, ["5-20", "22"]);
  assert.equal(rangesText(["5-20", "22"]), "5-20, 22");
  assert.equal(rangesText(["1-36", "49-288", "290"]), "277 fibers");
});

test("a leg leaves where it truly leaves", () => {
  const north = onOutline(0);
  assert.deepEqual([north.x, north.y], [DRAWING.cx, DRAWING.cy - DRAWING.ry]);
  const east = onOutline(Math.PI / 2);
  assert.ok(Math.abs(east.x - (DRAWING.cx + DRAWING.rx)) < 1e-9 && Math.abs(east.y - DRAWING.cy) < 1e-9);
  const all = [{ fibers: "1-24", state: "spliced" }];
  const { gates } = layOut(enclosure([joint(leg("F", "back", "1-24"), leg("G", "ahead", "1-24"))], [legOf("F", "back", 270, all), legOf("G", "ahead", 80, all)]));
  assert.deepEqual(gates.map((gate) => [gate.id, Math.round((gate.at * 180) / Math.PI)]), [["G ahead", 80], ["F back", 270]]);
});

test("legs that leave the same way are set side by side, their bearing kept", () => {
  const all = [{ fibers: "1-24", state: "capped" }];
  const legs = [legOf("F", "back", 90, all), legOf("G", "back", 90, all), legOf("H", "back", 91, all)];
  const { gates } = layOut(enclosure([], legs));
  for (let index = 1; index < gates.length; index++) {
    assert.ok((gates[index]?.at ?? 0) - (gates[index - 1]?.at ?? 0) > 0.3, "apart");
  }
  assert.ok(gates.every((gate) => Math.abs((gate.bearing * 180) / Math.PI - 90) <= 1));
});

test("the bar of what goes through passes as few legs as may be", () => {
  const gate = (/** @type {number} */ at) => /** @type {any} */ ({ at });
  const [back, ahead, tap] = [gate(4), gate(0.8), gate(6.1)];
  assert.ok(wayRound(back, ahead, [back, ahead, tap]) < 0, "the side without the tap");
  assert.ok(wayRound(back, ahead, [back, ahead]) > 0, "the shorter side");
});

test("a tube's chip is drawn where a range lies in one tube", () => {
  assert.equal(tubeOf(legOf("F", "back", 0, []), "13-24"), 2);
  assert.equal(tubeOf(legOf("F", "back", 0, []), "12-13"), null);
});

test("labels keep clear of one another and of boxes", () => {
  const wanted = (/** @type {string} */ text, /** @type {number} */ x) => ({ text, more: "", weight: 1, along: (/** @type {number} */ t) => ({ x, y: t * 100 }) });
  const placed = placeLabels([wanted("1-12 = 1-12", 100), wanted("13-24 = 13-24", 104)], [{ id: "P", label: "P", x: 100, y: 50, width: 90, height: 10 }]);
  assert.equal(placed.length, 2);
  assert.ok(placed.every((each) => Math.abs(each.y - 50) >= 11));
  assert.ok(Math.abs((placed[0]?.y ?? 0) - (placed[1]?.y ?? 0)) >= 13);
});
