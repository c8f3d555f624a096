/** Find: one box, reached from anywhere; and fields that are completed by its answers. */
export { FindBox } from "./find-box.js";
export { FindField } from "./find-field.js";
