/** Quantities as people read them: units, numbers, ranges, axes. */
export { units, UnitController, METRES_PER_FOOT } from "./units.js";
export { decimal, length, loss, count, inWords, wind, timeInWords, dayInWords } from "./format.js";
export { roundStep, roundValues } from "./scale.js";
export { parseRange, formatRange, rangeSize, rangeHolds } from "./ranges.js";
