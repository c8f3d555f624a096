package spanwright.exchange;

import org.jspecify.annotations.Nullable;

/** Keeps texts and facts that repeat from row to row once each; forgets what is in its way, so it stays small. */
final class Interned {

    private static final int SLOTS = 1 << 10;

    private final @Nullable Object[] kept = new Object[SLOTS];

    /** The text of a slice. */
    String text(char[] chars, int from, int to) {
        int hash = 0;
        for (int index = from; index < to; index++) {
            hash = 31 * hash + chars[index];
        }
        int slot = slot(hash);
        if (kept[slot] instanceof String text && Texts.same(text, chars, from, to)) {
            return text;
        }
        String text = new String(chars, from, to - from);
        kept[slot] = text;
        return text;
    }

    /** A value equal to the one given, perhaps an earlier one. */
    @SuppressWarnings("unchecked")
    <T> T same(T value) {
        int slot = slot(value.hashCode());
        Object earlier = kept[slot];
        if (value.equals(earlier)) {
            return (T) earlier;
        }
        kept[slot] = value;
        return value;
    }

    private static int slot(int hash) {
        int spread = hash * 0x9E3779B9;
        return spread >>> 22;
    }
}
