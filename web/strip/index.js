/** The distance strip: a path to scale of its glass. */
export { StripView } from "./strip-view.js";
