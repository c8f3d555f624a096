package spanwright.atlas;

import java.nio.charset.StandardCharsets;
import java.text.Normalizer;
import java.util.Locale;
import java.util.regex.Pattern;

/** Names as they are compared: upper and lower case alike, accents left out, white space single. */
final class KeyText {

    private static final Pattern ACCENTS = Pattern.compile("\\p{M}+");
    private static final Pattern SPACES = Pattern.compile("[\\s\\p{Z}\\p{Cntrl}]+");

    private KeyText() {}

    static String plain(String name) {
        String lower = isPlainAscii(name)
                ? name.toLowerCase(Locale.ROOT)
                : ACCENTS.matcher(Normalizer.normalize(name, Normalizer.Form.NFD))
                        .replaceAll("")
                        .toLowerCase(Locale.ROOT);
        return lower.indexOf(' ') < 0 && isPlainAscii(lower)
                ? lower
                : SPACES.matcher(lower).replaceAll(" ").strip();
    }

    static byte[] bytes(String plain) {
        return plain.getBytes(StandardCharsets.UTF_8);
    }

    private static boolean isPlainAscii(String text) {
        for (int i = 0; i < text.length(); i++) {
            if (text.charAt(i) < ' ' || text.charAt(i) > '~') {
                return false;
            }
        }
        return true;
    }
}
