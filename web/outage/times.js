/** Times of day as people type them, in the zone of the records. */

/**
 * How far a zone is from UTC at a moment.
 * @param {number} at milliseconds
 * @param {string} zone IANA name
 * @returns {number} minutes, east above 0
 */
function offsetAt(at, zone) {
  const parts = new Intl.DateTimeFormat("en-US", { timeZone: zone, hourCycle: "h23", year: "numeric", month: "numeric", day: "numeric", hour: "numeric", minute: "numeric", second: "numeric" }).formatToParts(at);
  const of = (/** @type {string} */ type) => Number(parts.find((part) => part.type === type)?.value ?? 0);
  return Math.round((Date.UTC(of("year"), of("month") - 1, of("day"), of("hour"), of("minute"), of("second")) - Math.floor(at / 1000) * 1000) / 60000);
}

/**
 * A time of the zone with its offset, as the server wants it. An hour that the clock skips is taken as if it had not;
 * of an hour that it shows twice, the first.
 * @param {string} local as a field of the browser gives it: 2026-12-01T10:42
 * @param {string} zone IANA name
 * @returns {string} 2026-12-01T10:42:00-08:00; empty where it is no time
 */
export function withOffset(local, zone) {
  if (!/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}(:\d{2})?$/.test(local)) return "";
  const read = Date.parse(`${local}Z`);
  const before = offsetAt(read - 86_400_000, zone);
  const candidate = read - before * 60000;
  const minutes = offsetAt(candidate, zone) === before ? before : offsetAt(read - offsetAt(read + 86_400_000, zone) * 60000, zone);
  const [hours, rest] = [Math.floor(Math.abs(minutes) / 60), Math.abs(minutes) % 60];
  const two = (/** @type {number} */ value) => String(value).padStart(2, "0");
  return `${local.length === 16 ? `${local}:00` : local}${minutes < 0 ? "-" : "+"}${two(hours)}:${two(rest)}`;
}

/**
 * A moment as a field of the browser holds it, in the zone.
 * @param {number} at milliseconds
 * @param {string} zone IANA name
 * @returns {string} 2026-12-01T10:42
 */
export function localTime(at, zone) {
  return new Date(at + offsetAt(at, zone) * 60000).toISOString().slice(0, 16);
}

/**
 * A day from now, by the clock of this browser.
 * @param {number} at milliseconds
 * @param {number} days
 * @returns {string} 2026-12-08
 */
export function daysOn(at, days) {
  const day = new Date(at);
  day.setDate(day.getDate() + days);
  return new Date(Date.UTC(day.getFullYear(), day.getMonth(), day.getDate())).toISOString().slice(0, 10);
}

/**
 * A stretch of time as people say it.
 * @param {number} minutes
 * @returns {string} e.g. 42 min, 3 h 05 min, 4 days 2 h
 */
export function minutesInWords(minutes) {
  const whole = Math.round(Math.abs(minutes));
  const sign = minutes < 0 && whole > 0 ? "\u2212" : "";
  if (whole < 60) return `${sign}${whole} min`;
  if (whole < 2880) return `${sign}${Math.floor(whole / 60)} h ${String(whole % 60).padStart(2, "0")} min`;
  return `${sign}${Math.floor(whole / 1440)} days ${Math.floor((whole % 1440) / 60)} h`;
}
