/** The server: questions, answers, and what is shown while an answer is awaited. */
export { ask, askAnytime, send, answerFrom, pathTo, Problem } from "./client.js";
export { Asking } from "./asking.js";
export { waiting } from "./waiting.js";
