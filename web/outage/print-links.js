import { html } from "lit";

/** Sizes of paper. @type {ReadonlyArray<{ size: string, word: string }>} */
const SIZES = Object.freeze([{ size: "letter", word: "Letter" }, { size: "a4", word: "A4" }]);

/**
 * The address of a paper.
 * @param {string} paper such as cut-list
 * @param {Array<[string, string]>} asked what it is of
 * @param {string} size
 * @param {string} ending empty for a page to print, else .pdf
 * @returns {string}
 */
export function paperAddress(paper, asked, size, ending) {
  return `/paper/${paper}${ending}?${new URLSearchParams([...asked, ["paper", size]])}`;
}

/**
 * Links to print a paper and to its PDF, in both sizes.
 * @param {string} title what is printed
 * @param {string} paper
 * @param {Array<[string, string]>} asked
 * @returns {unknown}
 */
export function printLinks(title, paper, asked) {
  const link = (/** @type {string} */ size, /** @type {string} */ ending, /** @type {string} */ word) => html`<a href=${paperAddress(paper, asked, size, ending)} target="_blank" rel="noopener">${word}</a>`;
  return html`<p class="act print-links">${title} on paper: ${SIZES.map(({ size, word }, index) => html`${index > 0 ? "; " : ""}${link(size, "", `print ${word}`)}, ${link(size, ".pdf", `PDF ${word}`)}`)}</p>`;
}
