package sallowmere.plant;

/**
 * One visit of a cable to a structure, as laid.
 *
 * @param structure the structure
 * @param span the span travelled to reach it, null on the first row
 * @param arrive metres of sheath from the start to where it arrives here
 * @param slack metres of sheath coiled here
 * @param route metres of route from the start of the cable's run
 */
public record Row(Structure structure, Span span, double arrive, double slack, double route) {

    /** Metres of sheath from the start to where it leaves for the next. */
    public double leave() {
        return arrive + slack;
    }
}
