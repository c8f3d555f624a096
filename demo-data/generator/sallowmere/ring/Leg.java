package sallowmere.ring;

import sallowmere.plant.Span;
import sallowmere.plant.Structure;

/**
 * A step of a trunk's route.
 *
 * @param to the structure reached
 * @param span the span travelled
 * @param sheath metres of sheath along it
 * @param coil metres of sheath coiled where it arrives
 */
record Leg(Structure to, Span span, double sheath, double coil) {}
