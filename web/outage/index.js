/** The outage desk: alarms, a reading, who is down. */
export { OutageDesk } from "./desk-view.js";
export { AlarmLists } from "./alarms-part.js";
export { ReadingForm } from "./reading-part.js";
export { WhoIsDown } from "./down-part.js";
export { TemporaryPaths } from "./light-part.js";
export { IncidentPart } from "./incident-part.js";
export { PARTS, hrefToPart } from "./parts.js";
