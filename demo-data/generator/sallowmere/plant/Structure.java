package sallowmere.plant;

import sallowmere.geo.Point;

/**
 * Where plant sits.
 *
 * @param code its tag
 * @param kind pole, handhole, manhole, vault, cabinet, hut, building or point
 * @param at where it stands
 * @param address street or place, may be blank
 * @param risk codes of shared risks, parted by spaces, may be blank
 * @param note free text, may be blank
 */
public record Structure(String code, String kind, Point at, String address, String risk, String note) {}
