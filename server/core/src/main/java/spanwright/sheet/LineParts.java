package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;

/**
 * A line taken apart: what is said, and what stands behind each semicolon; what follows a {@code #} is a remark.
 *
 * @param place the whole of it, remark apart
 * @param said the words before the first semicolon
 * @param behind the words behind each semicolon, empty ones left out
 */
record LineParts(TextPlace place, List<Word> said, List<List<Word>> behind) {

    static LineParts of(int number, String line) {
        List<List<Word>> parts = new ArrayList<>();
        int end = line.length();
        int from = 0;
        boolean quoted = false;
        for (int at = 0; at < end; at++) {
            char letter = line.charAt(at);
            quoted ^= letter == '"';
            if (!quoted && letter == ';') {
                parts.add(Word.list(line, number, from, at));
                from = at + 1;
            } else if (!quoted && letter == '#' && (at == 0 || Character.isWhitespace(line.charAt(at - 1)))) {
                end = at;
            }
        }
        parts.add(Word.list(line, number, from, end));
        List<List<Word>> behind =
                parts.stream().skip(1).filter(part -> !part.isEmpty()).toList();
        return new LineParts(whole(number, line, end), parts.get(0), behind);
    }

    private static TextPlace whole(int number, String line, int end) {
        String text = line.substring(0, end);
        String stripped = text.strip();
        return new TextPlace(number, stripped.isEmpty() ? 1 : text.indexOf(stripped) + 1, stripped.length());
    }

    boolean blank() {
        return said.isEmpty() && behind.isEmpty();
    }
}
