/** @typedef {"m" | "ft"} Unit */

/** Metres in a foot, exactly (the international foot of 1959). */
export const METRES_PER_FOOT = 0.3048;

/**
 * The unit that lengths are read in, one for the whole page.
 */
class UnitChoice extends EventTarget {
  /** @type {Unit} */
  unit = "m";

  /** @param {Unit} unit */
  choose(unit) {
    if (unit === this.unit) return;
    this.unit = unit;
    this.dispatchEvent(new Event("change"));
  }

  /** Feet to metres, metres to feet. */
  flip() {
    this.choose(this.unit === "m" ? "ft" : "m");
  }
}

/** The choice of everyone on this page. */
export const units = new UnitChoice();

/** Draws its host again when the unit flips. */
export class UnitController {
  /** @param {import("lit").ReactiveControllerHost} host */
  constructor(host) {
    this.redraw = () => host.requestUpdate();
    host.addController(this);
  }

  hostConnected() {
    units.addEventListener("change", this.redraw);
  }

  hostDisconnected() {
    units.removeEventListener("change", this.redraw);
  }
}
