/** How do you know? Every number opens its basis. */
export { figure, openBasis } from "./figure.js";
export { BasisNote } from "./note.js";
