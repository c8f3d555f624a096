/**
 * @typedef {object} Inks the page's colours, as the style sheet has them at present
 * @property {string} paper
 * @property {string} ink
 * @property {string} lighter
 * @property {string} hair
 * @property {string} faint
 * @property {string} accent
 * @property {string} down
 * @property {string} suspect
 * @property {string} spare
 * @property {string} font
 */

/**
 * Reads the colours that the style sheet gives an element.
 * @param {Element} element
 * @returns {Inks}
 */
export function inksOf(element) {
  const style = getComputedStyle(element);
  const of = (/** @type {string} */ name) => style.getPropertyValue(name).trim();
  return {
    paper: of("--paper"),
    ink: of("--ink"),
    lighter: of("--ink-lighter"),
    hair: of("--hair-strong"),
    faint: of("--base"),
    accent: of("--accent"),
    down: of("--down"),
    suspect: of("--suspect"),
    spare: of("--spare"),
    font: style.fontFamily,
  };
}
