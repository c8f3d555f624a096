package spanwright.benchmarks.outage;

/**
 * How far the records and the readings of a drawn plant are off, one standard deviation each. Stated are those of
 * {@code docs/FAULT-PLACE.md}, typed off by hand.
 *
 * @param name for a person
 * @param breakCursor m, where the break is read
 * @param eventCursor m, where a joint is read
 * @param index share of the glass
 * @param ratio share of the glass, of a whole reel
 * @param ratioBySpan share of the glass, from span to span of one reel
 * @param mark m, one mark read
 * @param unmarked share of the sheath of a span against its line on the map
 * @param coil m, a coil against its record
 * @param map m, a structure against its record, along the route
 */
record Spread(
        String name,
        double breakCursor,
        double eventCursor,
        double index,
        double ratio,
        double ratioBySpan,
        double mark,
        double unmarked,
        double coil,
        double map) {

    static final Spread STATED = new Spread("as stated", 1.5, 0.75, 0.00034, 0.004, 0.0015, 0.3, 0.01, 1.2, 3);

    /** A quarter worse in everything. */
    static final Spread WORSE =
            new Spread("a quarter worse", 1.875, 0.94, 0.000425, 0.005, 0.0019, 0.375, 0.0125, 1.5, 3.75);
}
