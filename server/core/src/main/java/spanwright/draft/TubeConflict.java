package spanwright.draft;

import spanwright.sheet.TextPlace;

/**
 * A tube of which a sheet speaks, and which another posting changed since its author looked.
 *
 * @param place the first line that speaks of it
 * @param leg the leg, such as {@code F-1 ahead}; a splitter's or a panel's side where it is none of a cable
 * @param tube the tube, such as {@code tube 3 GR}, blank where there is none
 * @param numbers the fibers, outputs or ports that were changed
 * @param was what the first of them was, as its author saw it
 * @param is what it is now
 * @param said what the sheet says
 */
public record TubeConflict(
        TextPlace place, String leg, String tube, String numbers, String was, String is, String said) {}
