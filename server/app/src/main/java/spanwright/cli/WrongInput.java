package spanwright.cli;

import java.io.Serial;

/** Input that a command cannot work with: a file that is not there, a port that is taken. Says what would be right. */
public final class WrongInput extends RuntimeException {

    @Serial
    private static final long serialVersionUID = 1;

    /** With the sentence that a person reads. */
    public WrongInput(String sentence) {
        super(sentence, null, false, false);
    }
}
