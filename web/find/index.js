/** Find: one box, reached from anywhere. */
export { FindBox } from "./find-box.js";
