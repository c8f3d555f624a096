/** The path at hand: where its glass lies, what it meets, what it loses. */
export { trackLength, placeAt, glassAt, nearestOn } from "./track.js";
export { powerCurve, lossAt, glassOf } from "./curve.js";
export { sectionsOf, stopsOf, stopBasis, elementAt } from "./sections.js";
