package spanwright.fault;

/** What comes of placing a reading: the places, or why there is none. */
public sealed interface FaultAnswer permits FaultPlaces, NotPlaced {}
