package spanwright.paper;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** A size of paper, upright. */
public enum PaperSize {
    /** ISO 216 A4, 210 x 297 mm. */
    A4("a4", "A4"),
    /** ANSI A, 8.5 x 11 in. */
    LETTER("letter", "Letter");

    private final String word;
    private final String title;

    PaperSize(String word, String title) {
        this.word = word;
        this.title = title;
    }

    /** How a question writes it. */
    public String word() {
        return word;
    }

    /** How people write it. */
    String title() {
        return title;
    }

    /** The one written so, if any. */
    public static Optional<PaperSize> find(String word) {
        return Arrays.stream(values()).filter(size -> size.word.equals(word)).findFirst();
    }

    /** All words. */
    public static List<String> words() {
        return Arrays.stream(values()).map(PaperSize::word).toList();
    }
}
