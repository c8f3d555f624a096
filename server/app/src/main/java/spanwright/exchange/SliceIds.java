package spanwright.exchange;

import org.jspecify.annotations.Nullable;

/** Numbers by text, looked up by a slice of characters without making a string; grows by doubling. */
final class SliceIds {

    private @Nullable String[] keys = new String[256];
    private int[] scopes = new int[256];
    private int[] values = new int[256];
    private int size;

    /** The number kept for a scope and a slice, or 0. */
    int find(int scope, char[] chars, int from, int to) {
        int mask = keys.length - 1;
        for (int slot = hash(scope, chars, from, to) & mask; ; slot = slot + 1 & mask) {
            String key = keys[slot];
            if (key == null) {
                return 0;
            }
            if (scopes[slot] == scope && Texts.same(key, chars, from, to)) {
                return values[slot];
            }
        }
    }

    /** Keeps a number, not 0, for a scope and a text that has none. */
    void put(int scope, String text, int value) {
        if (2 * (size + 1) > keys.length) {
            grow();
        }
        place(scope, text, value);
        size++;
    }

    private void place(int scope, String text, int value) {
        int mask = keys.length - 1;
        int slot = hash(scope, text.toCharArray(), 0, text.length()) & mask;
        while (keys[slot] != null) {
            slot = slot + 1 & mask;
        }
        keys[slot] = text;
        scopes[slot] = scope;
        values[slot] = value;
    }

    private void grow() {
        @Nullable String[] oldKeys = keys;
        int[] oldScopes = scopes;
        int[] oldValues = values;
        keys = new String[2 * oldKeys.length];
        scopes = new int[keys.length];
        values = new int[keys.length];
        for (int slot = 0; slot < oldKeys.length; slot++) {
            String key = oldKeys[slot];
            if (key != null) {
                place(oldScopes[slot], key, oldValues[slot]);
            }
        }
    }

    private static int hash(int scope, char[] chars, int from, int to) {
        int hash = scope;
        for (int index = from; index < to; index++) {
            hash = 31 * hash + chars[index];
        }
        hash *= 0x9E3779B9;
        return hash ^ hash >>> 15;
    }
}
