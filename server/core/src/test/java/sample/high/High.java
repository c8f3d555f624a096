package sample.high;

import sample.low.Low;

/** Rightly uses what stands below it. */
public final class High {

    /** Something to be used. */
    public Low low() {
        return new Low();
    }
}
