/** Views of the plant: each thing of the records, opened and drawn. */
export { StructureView } from "./structure-view.js";
export { SpanView } from "./span-view.js";
export { EnclosureView } from "./enclosure-view.js";
export { CableView } from "./cable-view.js";
export { CircuitView } from "./circuit-view.js";
export { CircuitsView } from "./circuits-view.js";
export { FiberView } from "./fiber-view.js";
export { PortView } from "./port-view.js";
export { PostingsView, PostingView } from "./postings-view.js";
export { StartView } from "./start-view.js";
export { useSign } from "./uses.js";
