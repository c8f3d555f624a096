/** Tube and fiber colours: their words read, their chips drawn. */
export { parseColor } from "./names.js";
export { chip, drawnChip, patch, patchShapes, CHIP_WIDTH } from "./chips.js";
