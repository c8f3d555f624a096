/** What the outage desk computes by itself: lists read, shots written, places worded, tubes ordered. */
import assert from "node:assert/strict";
import { readFileSync } from "node:fs";
import { test } from "node:test";
import { changesBetween, inBoth, nearestCode, readList, replaced, stemOf } from "../outage/lists.js";
import { askedOf, faultsOf, questionOf, shotOf } from "../outage/reading.js";
import { cutInWords, cutsOf, readCut, withCuts, writeCut } from "../outage/cuts.js";
import { tubesOf } from "../outage/sheath.js";
import { cautionsOf, placeLines, textOf } from "../outage/fault-words.js";
import { daysOn } from "../outage/times.js";
import { marksOf } from "../outage/marks.js";
import { units } from "../quantity/index.js";
import { formatAddress, parseAddress } from "../address/address.js";

const story = (/** @type {string} */ file) => readFileSync(new URL(`../../demo-data/stories/1-backhoe/${file}`, import.meta.url), "utf8");

test("a list is read however its codes are parted, each code once", () => {
  assert.deepEqual(readList(" GOV-01,GOV-02 ;GOV-03\r\n\tBIZ-01\n\"BIZ-02\" GOV-02, ,"), { codes: ["GOV-01", "GOV-02", "GOV-03", "BIZ-01", "BIZ-02"], twice: ["GOV-02"] });
  assert.deepEqual(readList(""), { codes: [], twice: [] });
});

test("the lists of the backhoe story hold what its facts say, and no circuit is in both", () => {
  const [down, up] = [readList(story("down.txt")), readList(story("up.txt"))];
  const facts = new Map(story("facts.csv").split("\n").map((line) => /** @type {[string, string]} */ (line.split(",").slice(0, 2))));
  assert.equal(down.codes.length, Number(facts.get("circuits down by alarm")));
  assert.deepEqual(inBoth(down, up), []);
  assert.deepEqual(inBoth(readList("A B C"), readList("C,A")), ["A", "C"]);
});

test("a code is mended where it stands as a whole, and nothing else of the list changes", () => {
  assert.equal(replaced("PON-1, PON-11\nPON-1", "PON-1", "PON-01"), "PON-01, PON-11\nPON-01");
  assert.equal(replaced("A,B,C", "B", ""), "A,,C");
  assert.deepEqual(readList(replaced("A,B,C", "B", "")).codes, ["A", "C"]);
});

// Expected values: the restricted edit distance worked by hand; kitten and sitting are the usual example of it.
test("changes between two words are letters changed, put in, left out, or changed over", () => {
  for (const [one, other, changes] of /** @type {Array<[string, string, number]>} */ ([["kitten", "sitting", 3], ["GOV-01", "GVO-01", 1], ["CA", "ABC", 3], ["", "ABC", 3], ["same", "same", 0]])) {
    assert.equal(changesBetween(one, other, 99), changes, `${one} ${other}`);
    assert.equal(changesBetween(other, one, 99), changes, `${other} ${one}`);
  }
});

test("the nearest known code is named, and none where nothing is like it", () => {
  const known = ["GOV-01", "GOV-02", "BIZ-01", "PON-09-001", "PON-09-010"];
  assert.equal(nearestCode("GOV-1", known), "GOV-01");
  assert.equal(nearestCode("pon-09-001", known), "PON-09-001");
  assert.equal(nearestCode("PON-09-O01", known), "PON-09-001");
  assert.equal(nearestCode("XYZZY", known), null);
  assert.equal(stemOf("PON-09-001"), "PON-09-");
  assert.equal(stemOf("RC-01P"), "RC-");
});

/** @type {import("../outage/reading.js").Shot} */
const SHOT = {
  port: "HE-1/FDR-S/72", to: "", unit: "m", distance: "7412", index: "", launch: "", wavelength: "1550",
  events: [{ enclosure: "C-S03", reading: "6038" }, { enclosure: "C-S04", reading: "8155" }], farPort: "", farDistance: "", farLaunch: "",
};

test("a shot that was put into an address comes out again", () => {
  for (const shot of [SHOT, { ...SHOT, unit: /** @type {const} */ ("ft"), distance: "24,318", launch: "150", index: "1.4682", farPort: "HUT-S/FDR-S/12", farDistance: "5334" }]) {
    const address = parseAddress(formatAddress({ ...parseAddress("#/outage/reading"), asked: askedOf(shot) }));
    assert.deepEqual(shotOf(address.asked), shot);
  }
});

test("the server is asked in metres, feet being 0.3048 m exactly", () => {
  assert.deepEqual(questionOf(SHOT).event, ["C-S03=6038", "C-S04=8155"]);
  const feet = questionOf({ ...SHOT, unit: "ft", distance: "24,317.6", launch: "100", events: [{ enclosure: "C-S03", reading: "1000" }] });
  assert.equal(feet["distance"], "7412.0045");
  assert.equal(feet["launch"], "30.48");
  assert.deepEqual(feet["event"], ["C-S03=304.8"]);
});

test("what is wrong with a shot is said beside its field, with what would be right", () => {
  assert.deepEqual(faultsOf(SHOT), {});
  const faults = faultsOf({ ...SHOT, port: "", distance: "far", events: [{ enclosure: "C-S03", reading: "" }], farPort: "HUT-S/FDR-S/12" });
  assert.deepEqual(Object.keys(faults).sort(), ["distance", "event", "far_distance", "port"]);
  assert.match(faults.distance ?? "", /such as 7412/);
});

test("a cut is written as the server reads it, and said in words", () => {
  for (const [text, words] of [["span:S-1", "span S-1"], ["tube:F-1/3", "tube 3 of F-1"], ["place:F-1@1352.2", "F-1 at the fault place"]]) {
    const cut = readCut(text ?? "");
    assert.ok(cut);
    assert.equal(writeCut(cut), text);
    assert.equal(cutInWords(cut), words);
  }
  assert.equal(readCut("S-1"), null);
  assert.deepEqual(cutsOf(withCuts([["port", "E/P/1"], ["cut", "span:S-9"]], [{ kind: "span", code: "S-1" }])), [{ kind: "span", code: "S-1" }]);
});

test("tubes are spliced in the order of what they hold first, the one with more down before its equal", () => {
  const fiber = (/** @type {number} */ number, /** @type {number} */ tube, /** @type {string} */ state, /** @type {number | null} */ priority, /** @type {string[]} */ carries) =>
    ({ fiber: number, tube, tube_color: "blue", fiber_color: "blue", state, priority, carries });
  const fibers = [fiber(1, 1, "single", 1, ["RC-01"]), fiber(13, 2, "down", 1, ["GOV-01"]), fiber(25, 3, "down", 2, ["BIZ-01"]), fiber(61, 6, "down", 4, ["P-1", "P-2"]), fiber(73, 7, "down", 4, ["P-3", "P-4", "P-5"]), fiber(109, 10, "dark", null, [])];
  const tubes = tubesOf(/** @type {any} */ ({ cable: "F-1", from: "C-1", to: "C-2", fibers }));
  assert.deepEqual(tubes.map((each) => each.tube), [2, 1, 3, 7, 6, 10]);
  assert.deepEqual(tubes.map((each) => each.first), [true, false, false, false, false, false]);
});

/** The place of the backhoe story, as the worked example of its reading has it: mark 19,784 ft, 136 ft past HH-S044 of 510 ft. */
const PLACE = /** @type {any} */ ({
  lon: -123.04, lat: -48.03, structure_before: "HH-S044", structure_after: "HH-S045", beyond_before_m: 41.54, short_of_after_m: 113.91, span: "HH-S044_HH-S045",
  cable: "FDR-S-2", fiber: 72, sheath_position_m: 1352.18, mark: { value: 19783.7, unit: "ft", ink: "white" }, in_slack_at: null, lies_in: "span", glass_m: 7412,
  within_m: 8.0, within: { cursor: 1.6, index: 0, ratio: 1.1, marks: 0.6, coils: 1.7, map: 3 }, window: [], past_end: false, path_end: "CAB-09/FP/12",
});

/** @param {object} change @returns {string} the place in one sentence, in feet */
function worded(change) {
  units.choose("ft");
  return placeLines({ ...PLACE, ...change }, "").map(textOf).join(", ");
}

test("a place is worded so that it can be read out over a telephone", () => {
  assert.equal(worded({}), "between HH-S044 and HH-S045, 136 ft past HH-S044, within 26 ft, mark 19,784 ft white");
  assert.equal(worded({ in_slack_at: "HH-S044", structure_after: "HH-S044", span: null, beyond_before_m: 12.2 }), "in the coil at HH-S044, 40 ft into the coil, within 26 ft, mark 19,784 ft white");
  assert.equal(worded({ lies_in: "jumper", structure_after: "HH-S044", span: null, cable: null, mark: null }), "in a jumper at HH-S044, within 26 ft");
  assert.equal(worded({ past_end: true, over_m: 5020.2, path_end: "CAB-04/FP/8" }), "past the end of the path, CAB-04/FP/8, 16,470 ft beyond it by the records");
  assert.match(worded({ mark: null }), /FDR-S-2 has no two marks read/);
});

test("a coil that the window touches is warned of, and light that goes too far is no cut", () => {
  assert.deepEqual(cautionsOf(PLACE), []);
  assert.match(cautionsOf({ ...PLACE, may_be_in_slack_at: "HH-S044" })[0] ?? "", /inside the coil at HH-S044/);
  assert.match(cautionsOf({ ...PLACE, past_end: true, over_m: 5020.2 })[0] ?? "", /a cut does not/);
});

test("a day from now is a day of the calendar, over months and leap days", () => {
  const noon = (/** @type {number} */ year, /** @type {number} */ month, /** @type {number} */ day) => new Date(year, month - 1, day, 12).getTime();
  assert.equal(daysOn(noon(2026, 12, 28), 7), "2027-01-04");
  assert.equal(daysOn(noon(2028, 2, 28), 1), "2028-02-29");
});

test("a temporary path is drawn while that part of the desk is open, and what is cut stays drawn beside it", () => {
  const way = { lines: [[[0, 0], [1, 1]]], places: [[1, 1]] };
  const hand = { suspects: null, chosen: 0, fault: null, place: 0, cut: { lines: [[[0, 0], [0, 1]]], places: [] }, way };
  const drawn = marksOf({ ...hand, part: "light" });
  assert.deepEqual(drawn.stretches.map(({ kind, sign }) => [kind, sign]), [["down", "CUT"], ["spare", "LIGHT"]]);
  assert.deepEqual(drawn.focus, [[0, 0], [1, 1], [1, 1]]);
  assert.deepEqual(marksOf({ ...hand, part: "down" }).stretches.map(({ kind }) => kind), ["down"]);
});
