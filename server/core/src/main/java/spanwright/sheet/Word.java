package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;

/**
 * A word of a line, and where it stands.
 *
 * @param text as written
 * @param place where
 */
record Word(String text, TextPlace place) {

    /** The words of a part of a line, parted by white space; quotes hold a text together and are doubled within. */
    static List<Word> list(String line, int number, int from, int to) {
        List<Word> words = new ArrayList<>();
        int at = from;
        while (at < to) {
            if (Character.isWhitespace(line.charAt(at))) {
                at++;
            } else {
                int end = end(line, at, to);
                words.add(new Word(line.substring(at, end), new TextPlace(number, at + 1, end - at)));
                at = end;
            }
        }
        return words;
    }

    private static int end(String line, int from, int to) {
        boolean quoted = false;
        int at = from;
        while (at < to && (quoted || !Character.isWhitespace(line.charAt(at)))) {
            quoted ^= line.charAt(at) == '"';
            at++;
        }
        return at;
    }

    boolean is(String other) {
        return text.equals(other);
    }
}
