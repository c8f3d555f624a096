package spanwright.sheet;

import java.io.Serial;

/** Carries a mistake from where a line cannot be read on to the one place that gathers mistakes. */
final class MistakeFound extends Exception {

    @Serial
    private static final long serialVersionUID = 1;

    private final transient Mistake mistake;

    MistakeFound(TextPlace place, String code, String text, String mend) {
        super(text, null, false, false);
        this.mistake = new Mistake(place, code, text, mend);
    }

    Mistake mistake() {
        return mistake;
    }
}
