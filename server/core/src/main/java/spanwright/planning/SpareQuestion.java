package spanwright.planning;

/**
 * Which spare fibers are sought.
 *
 * @param from identity of a structure
 * @param to identity of another
 * @param fibers how many, from 1
 * @param sameTube whether they must lie in one tube throughout each cable
 * @param avoided what they must not meet
 */
public record SpareQuestion(int from, int to, int fibers, boolean sameTube, Avoided avoided) {

    /** The most fibers that one question asks for. */
    public static final int MOST_FIBERS = 1000;

    /** Refuses a question that means nothing. */
    public SpareQuestion {
        if (from == to || fibers < 1 || fibers > MOST_FIBERS) {
            throw new IllegalArgumentException(fibers + " fibers from " + from + " to " + to);
        }
    }
}
