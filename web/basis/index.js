/** How do you know? Every number opens its basis. */
export { figure, openBasis, readingOf } from "./figure.js";
export { BasisNote } from "./note.js";
