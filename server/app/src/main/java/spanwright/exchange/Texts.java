package spanwright.exchange;

/** How texts are compared with slices and shown in a fault. */
final class Texts {

    private static final int MOST_SHOWN = 60;

    private Texts() {}

    /** A text short enough for a sentence, on one line. */
    static String shown(String text) {
        StringBuilder line = new StringBuilder(Math.min(text.length(), MOST_SHOWN));
        text.chars().limit(MOST_SHOWN).forEach(c -> line.append(Character.isISOControl(c) ? ' ' : (char) c));
        return text.length() <= MOST_SHOWN
                ? line.toString()
                : line.append("...").toString();
    }

    /** Whether a text equals a slice. */
    static boolean same(String text, char[] chars, int from, int to) {
        if (text.length() != to - from) {
            return false;
        }
        for (int index = 0; index < text.length(); index++) {
            if (text.charAt(index) != chars[from + index]) {
                return false;
            }
        }
        return true;
    }

    /** Whether a file of the folder can hold a text: no control characters, no halves of characters. */
    static boolean canBeWritten(String text) {
        for (int index = 0; index < text.length(); ) {
            int c = text.codePointAt(index);
            boolean half = c >= Character.MIN_SURROGATE && c <= Character.MAX_SURROGATE;
            boolean control = (c < ' ' && c != '\t' && c != '\n' && c != '\r') || c == 127;
            if (half || control) {
                return false;
            }
            index += Character.charCount(c);
        }
        return text.length() <= CsvReader.MOST_FIELD_CHARS;
    }

    /** Whether a code may not hold a character. */
    static boolean forbiddenInCode(char c) {
        return c == ',' || c == '/' || c == ':' || c <= ' ' || c == 127 || (c >= 128 && spaceBeyondAscii(c));
    }

    private static boolean spaceBeyondAscii(char c) {
        return Character.isWhitespace(c) || Character.isSpaceChar(c) || Character.isISOControl(c) || c == '\uFEFF';
    }

    /** A character in words. */
    static String name(char c) {
        return c == ' ' ? "a space" : forbiddenInCode(c) && c > ' ' && c < 127 ? "'" + c + "'" : "white space";
    }
}
