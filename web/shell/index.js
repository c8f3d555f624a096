/** The page's entry: every part of it, and the shell that holds them. */
import "../basis/index.js";
import "../find/index.js";
import "../map/index.js";
import "../outage/index.js";
import "../plant/index.js";
import "../strip/index.js";
import "./as-of.js";
export { ShellView } from "./shell-view.js";
