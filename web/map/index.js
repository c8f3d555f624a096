/** The map: base map and plant drawn from the records, and what is at hand. */
export { MapView } from "./map-view.js";
