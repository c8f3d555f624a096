package spanwright.exchange;

import java.util.Collection;
import org.jspecify.annotations.Nullable;

/** Finds what someone may have meant: the nearest of the words there are, by edits of one character. */
final class Near {

    private static final int MOST_EDITS = 2;
    private static final int MOST_LENGTH = 64;

    private Near() {}

    /** {@code ; did you mean 'pole'?}, or nothing where no word is near. */
    static String hint(String text, Collection<String> words) {
        String nearest = find(text, words);
        return nearest == null ? "" : "; did you mean '" + nearest + "'?";
    }

    /** The nearest word by two edits at most (one where it is short), or null. */
    static @Nullable String find(String text, Iterable<String> words) {
        if (text.isEmpty() || text.length() > MOST_LENGTH) {
            return null;
        }
        String nearest = null;
        int fewest = (text.length() < 4 ? 1 : MOST_EDITS) + 1;
        for (String word : words) {
            if (Math.abs(word.length() - text.length()) < fewest) {
                int edits = word.equalsIgnoreCase(text) ? 0 : edits(text, word, fewest);
                if (edits < fewest) {
                    fewest = edits;
                    nearest = word;
                }
            }
        }
        return nearest;
    }

    /** Edits (insert, delete, replace, swap of neighbours) from one to the other, or the bound where as many. */
    private static int edits(String one, String other, int bound) {
        int[] beforeLast = new int[other.length() + 1];
        int[] last = new int[other.length() + 1];
        int[] current = new int[other.length() + 1];
        for (int column = 0; column <= other.length(); column++) {
            last[column] = column;
        }
        for (int line = 1; line <= one.length(); line++) {
            current[0] = line;
            int least = line;
            for (int column = 1; column <= other.length(); column++) {
                int same = one.charAt(line - 1) == other.charAt(column - 1) ? 0 : 1;
                int edits = Math.min(Math.min(last[column], current[column - 1]) + 1, last[column - 1] + same);
                if (line > 1
                        && column > 1
                        && one.charAt(line - 1) == other.charAt(column - 2)
                        && one.charAt(line - 2) == other.charAt(column - 1)) {
                    edits = Math.min(edits, beforeLast[column - 2] + 1);
                }
                current[column] = edits;
                least = Math.min(least, edits);
            }
            if (least >= bound) {
                return bound;
            }
            int[] spare = beforeLast;
            beforeLast = last;
            last = current;
            current = spare;
        }
        return Math.min(last[other.length()], bound);
    }
}
