package spanwright.trace;

/** A walk over the network. */
final class Walk {

    private final int[] entered;
    private final Stop stop;

    Walk(int[] entered, Stop stop) {
        this.entered = entered;
        this.stop = stop;
    }

    /** Why a walk ends. */
    enum Stop {
        /** Nothing is joined where it would go on. */
        FREE,
        /** It stands at the end that was looked for. */
        FOUND,
        /** It stands before a splitter, at a choice. */
        CHOICE,
        /** It came back to the piece where it began. */
        CIRCLE,
        /** It came to a splitter's terminal that it has walked already. */
        CROSSED
    }

    /**
     * The ends by which it enters its pieces, in order; a splitter is crossed by entering a terminal's outer end and then
     * another terminal's inner end. Not to be changed.
     */
    int[] entered() {
        return entered;
    }

    /** Why it ends. */
    Stop stop() {
        return stop;
    }

    boolean loop() {
        return stop == Stop.CIRCLE || stop == Stop.CROSSED;
    }

    /** The end where it stands: where it would go on, or the splitter's end at which it stopped. */
    int last() {
        int entering = entered[entered.length - 1];
        return stop == Stop.CHOICE ? entering : entering ^ 1;
    }

    /** The ends by which the same pieces are entered the other way round, its first piece left out. */
    int[] turnedWithoutFirst() {
        int[] turned = new int[entered.length - 1];
        for (int index = 0; index < turned.length; index++) {
            turned[index] = entered[entered.length - 1 - index] ^ 1;
        }
        return turned;
    }
}
