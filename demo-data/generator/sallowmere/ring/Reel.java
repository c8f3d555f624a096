package sallowmere.ring;

import sallowmere.plant.CableType;
import sallowmere.plant.Marking;

/**
 * How one reel of a trunk was made and laid.
 *
 * @param type its make
 * @param overlength its own excess length in per cent, null for the type's
 * @param installed the date
 * @param marking how its sheath is numbered
 * @param end code of the structure where it ends
 */
record Reel(CableType type, Double overlength, String installed, Marking marking, String end) {}
