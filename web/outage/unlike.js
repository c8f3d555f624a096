/**
 * Whether two values of a property differ in what they hold: a list made anew with the same things in it is no change.
 * @param {unknown} one
 * @param {unknown} other
 * @returns {boolean}
 */
export function unlike(one, other) {
  return JSON.stringify(one) !== JSON.stringify(other);
}
