import { keep, kept } from "./keeping.js";

/** @typedef {"light" | "dark" | "red"} Theme red: for eyes that are used to the dark */

/** What each theme is called, in the order in which the key goes through them. @type {ReadonlyArray<{ theme: Theme, word: string }>} */
const THEMES = Object.freeze([
  { theme: "light", word: "day" },
  { theme: "dark", word: "night" },
  { theme: "red", word: "red night" },
]);

/**
 * The theme in force: chosen here, else the system's.
 * @returns {Theme}
 */
export function themeNow() {
  return kept().theme ?? (matchMedia("(prefers-color-scheme: dark)").matches ? "dark" : "light");
}

/** Puts the theme on the page. */
export function applyTheme() {
  document.documentElement.dataset["theme"] = themeNow();
}

/**
 * @returns {string} what the theme in force is called
 */
export function themeInWords() {
  return THEMES.find(({ theme }) => theme === themeNow())?.word ?? "day";
}

/** Day to night, night to red night, red night to day. */
export function flipTheme() {
  const at = THEMES.findIndex(({ theme }) => theme === themeNow());
  keep({ theme: THEMES[(at + 1) % THEMES.length]?.theme ?? "light" });
  applyTheme();
}
