package spanwright.answers;

import java.io.Serial;
import org.jspecify.annotations.Nullable;

/**
 * A question that has no answer, with what would be right. It leaves the question's reading at any depth; each
 * adapter turns it into its own refusal in one place.
 */
public final class Unanswerable extends RuntimeException {

    @Serial
    private static final long serialVersionUID = 1;

    /** What is wrong with the question. */
    public enum Kind {
        /** It is not written as a question can be. */
        BAD_REQUEST,
        /** It names something that is not in the records. */
        BAD_REFERENCE,
        /** What it asks for itself is not in the records. */
        NOT_FOUND,
        /** A fiber on the path has no value at the wavelength. */
        WAVELENGTH_OUT_OF_RANGE,
        /** It took longer than the server allows. */
        TOO_SLOW
    }

    private final Kind kind;
    private final @Nullable String parameter;

    /** A question wrong as a whole. */
    public Unanswerable(Kind kind, String sentence) {
        this(kind, sentence, null);
    }

    /**
     * A question wrong in one parameter.
     *
     * @param sentence what is wrong and what would be right
     * @param parameter its name as in the HTTP interface, or null
     */
    public Unanswerable(Kind kind, String sentence, @Nullable String parameter) {
        super(sentence, null, false, false);
        this.kind = kind;
        this.parameter = parameter;
    }

    /** What kind of wrong. */
    public Kind kind() {
        return kind;
    }

    /** The parameter that is wrong, or null. */
    public @Nullable String parameter() {
        return parameter;
    }

    /** What is wrong and what would be right. */
    public String sentence() {
        return String.valueOf(getMessage());
    }
}
