package spanwright.atlas;

import java.util.Arrays;
import java.util.function.Predicate;
import spanwright.atlas.Match.Closeness;

/**
 * All names of one kind, one after another in one array of bytes, read from end to end at each question: some
 * nanoseconds a name, so some ten milliseconds for a million. A match may stand anywhere in a name.
 *
 * <p>Lost to this: a sorted array (finds beginnings only); an index of three-letter groups (many times the memory,
 * and every posting must change it).
 */
final class NameText {

    private static final byte END = 0;

    private final Named named;
    private byte[] text = new byte[1 << 12];
    private int length;
    /** Where each name begins; one more for the end. */
    private int[] starts = new int[1 << 8];

    private int[] ids = new int[1 << 8];
    private int count;

    NameText(Named named) {
        this.named = named;
    }

    void add(int id, String name) {
        byte[] bytes = KeyText.bytes(KeyText.plain(name));
        if (count + 1 >= starts.length) {
            starts = Arrays.copyOf(starts, count * 2 + 2);
            ids = Arrays.copyOf(ids, count * 2 + 2);
        }
        if (length + bytes.length + 1 > text.length) {
            text = Arrays.copyOf(text, Math.max(length + bytes.length + 1, text.length * 2));
        }
        System.arraycopy(bytes, 0, text, length, bytes.length);
        ids[count++] = id;
        length += bytes.length;
        text[length++] = END;
        starts[count] = length;
    }

    /** Lays the arrays down at their size; nothing is added after it. */
    NameText trimmed() {
        text = Arrays.copyOf(text, length);
        starts = Arrays.copyOf(starts, count + 1);
        ids = Arrays.copyOf(ids, count);
        return this;
    }

    /** Offers every match that is not left out to the best. */
    void search(byte[] wanted, Predicate<Integer> leftOut, Best best) {
        int name = 0;
        int at = 0;
        int last = length - wanted.length;
        byte first = wanted[0];
        while (at <= last) {
            if (text[at] != first || !matches(wanted, at)) {
                at++;
                continue;
            }
            while (starts[name + 1] <= at) {
                name++;
            }
            Match match = match(name, at, wanted.length);
            if (best.wants(match) && !leftOut.test(ids[name])) {
                best.offer(match);
            }
            // A later place in the same name may be the beginning of a word.
            at = match.closeness() == Closeness.WITHIN ? at + 1 : starts[name + 1];
        }
    }

    private boolean matches(byte[] wanted, int at) {
        for (int i = 1; i < wanted.length; i++) {
            if (text[at + i] != wanted[i]) {
                return false;
            }
        }
        return true;
    }

    private Match match(int name, int at, int wanted) {
        int size = starts[name + 1] - starts[name] - 1;
        return new Match(named, ids[name], closeness(text, starts[name], size, at, wanted), size);
    }

    private static Closeness closeness(byte[] text, int start, int size, int at, int wanted) {
        if (at == start) {
            return size == wanted ? Closeness.WHOLE : Closeness.BEGINNING;
        }
        byte before = text[at - 1];
        boolean inWord = (before >= 'a' && before <= 'z') || (before >= '0' && before <= '9') || before < 0;
        return inWord ? Closeness.WITHIN : Closeness.WORD;
    }
}
