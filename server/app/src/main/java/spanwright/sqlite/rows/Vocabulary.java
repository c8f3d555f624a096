package spanwright.sqlite.rows;

import java.util.Arrays;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;

/**
 * The words by which the values of an enum are written.
 *
 * @param <E> the enum
 */
final class Vocabulary<E extends Enum<E>> {

    private final Map<String, E> byWord;

    private Vocabulary(Map<String, E> byWord) {
        this.byWord = byWord;
    }

    static <E extends Enum<E>> Vocabulary<E> of(E[] values, Function<E, String> word) {
        Map<String, E> byWord = Arrays.stream(values).collect(Collectors.toMap(word, Function.identity()));
        return new Vocabulary<>(byWord);
    }

    /** The value of a word; any other word is a fault in the file. */
    E value(String word) {
        E value = byWord.get(word);
        if (value == null) {
            throw new IllegalArgumentException("no such word: '" + word + "', known are " + byWord.keySet());
        }
        return value;
    }
}
