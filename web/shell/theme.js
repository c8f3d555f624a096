import { keep, kept } from "./keeping.js";

/** @typedef {"light" | "dark"} Theme */

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

/** Day to night, night to day. */
export function flipTheme() {
  keep({ theme: themeNow() === "dark" ? "light" : "dark" });
  applyTheme();
}
