/** Numbers as people read them. */
import assert from "node:assert/strict";
import { test } from "node:test";
import { count, dayInWords, decimal, inWords, length, loss, timeInWords, wind } from "../quantity/format.js";
import { formatRange, parseRange, rangeHolds, rangeSize } from "../quantity/ranges.js";
import { roundStep, roundValues } from "../quantity/scale.js";
import { METRES_PER_FOOT, units } from "../quantity/units.js";

test("a length reads in metres to a tenth and in whole feet, short ones to a tenth of a foot", () => {
  assert.equal(inWords(length(1212.505, "m")), "1,212.5 m");
  assert.equal(inWords(length(30.48, "ft")), "100 ft");
  assert.equal(inWords(length(1.5, "ft")), "4.9 ft");
  assert.equal(inWords(length(0, "ft")), "0.0 ft");
});

// The story of the demo: 4,436 ft past C-S03 are 1,352.2 m of sheath.
test("feet are the international ones, 0.3048 m exactly", () => {
  assert.equal(METRES_PER_FOOT, 0.3048);
  assert.equal(length(1352.2, "ft").number, "4,436");
});

test("a loss reads to a hundredth of a decibel, with a true minus sign, and never as minus nothing", () => {
  assert.equal(inWords(loss(16.9)), "16.90 dB");
  assert.equal(inWords(loss(-0.05)), "\u22120.05 dB");
  assert.equal(inWords(loss(-0.001)), "0.00 dB");
  assert.equal(decimal(-1234.5, 1), "\u22121,234.5");
  assert.equal(inWords(count(1651)), "1,651");
});

test("times are read in the zone of the records, days as they stand", () => {
  assert.equal(timeInWords("2026-03-31T19:05:00Z", "America/Chicago"), "31 Mar 2026, 14:05");
  assert.equal(timeInWords("2026-03-31", "America/Chicago"), "31 Mar 2026");
  assert.equal(dayInWords("2025-09-30"), "30 Sept 2025");
  assert.equal(timeInWords("last spring", "UTC"), "last spring");
});

test("a bearing is said as the nearest of eight winds", () => {
  assert.equal(wind(0), "north");
  assert.equal(wind(359), "north");
  assert.equal(wind(-45), "north-west");
  assert.equal(wind(112), "east");
  assert.equal(wind(113), "south-east");
});

test("the unit flips for everyone, and tells them once", () => {
  let told = 0;
  const listen = () => told++;
  units.addEventListener("change", listen);
  units.choose("ft");
  units.choose("ft");
  assert.equal(told, 1);
  units.flip();
  assert.equal(units.unit, "m");
  assert.equal(told, 2);
  units.removeEventListener("change", listen);
});

test("axes stand at 1, 2 or 5 times a power of ten, and never at more steps than asked", () => {
  assert.equal(roundStep(100, 10), 10);
  assert.equal(roundStep(11, 10), 2);
  assert.equal(roundStep(0.021, 10), 0.005);
  assert.deepEqual(roundValues(0, 20, 4), [0, 5, 10, 15, 20]);
  assert.deepEqual(roundValues(3, 9, 3), [4, 6, 8]);
  assert.deepEqual(roundValues(5, 5, 3), []);
  for (let most = 1; most < 30; most++) {
    const step = roundStep(12345.6, most);
    assert.ok(12345.6 / step <= most + 1e-9, `${most} steps at most`);
  }
});

test("ranges rise and fall and hold their ends", () => {
  assert.deepEqual(parseRange("12-1"), { first: 12, last: 1 });
  assert.equal(rangeSize(parseRange("12-1")), 12);
  assert.equal(rangeSize(parseRange("7")), 1);
  assert.ok(rangeHolds(parseRange("12-1"), 12) && rangeHolds(parseRange("12-1"), 1) && !rangeHolds(parseRange("12-1"), 13));
  for (const text of ["7", "1-12", "12-1"]) assert.equal(formatRange(parseRange(text)), text);
});
