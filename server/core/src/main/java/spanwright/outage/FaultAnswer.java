package spanwright.outage;

/** What comes of placing a reading: the places, or why there is none. */
public sealed interface FaultAnswer permits FaultPlaces, NotPlaced {}
