package spanwright.outage;

import java.util.Comparator;

/** The order of codes. */
public final class CodeOrder {

    /** By code point; Java's own order of strings differs beyond the basic plane. */
    public static final Comparator<String> BY_CODE_POINT = CodeOrder::compare;

    private CodeOrder() {}

    private static int compare(String one, String other) {
        int at = 0;
        while (at < one.length() && at < other.length()) {
            int difference = Integer.compare(one.codePointAt(at), other.codePointAt(at));
            if (difference != 0) {
                return difference;
            }
            at += Character.charCount(one.codePointAt(at));
        }
        return Integer.compare(one.length(), other.length());
    }
}
