package spanwright.paper;

import java.util.ArrayDeque;
import java.util.Deque;

/**
 * Writes HTML that is well-formed XML too, so that a browser and the PDF's renderer read the same. Every text and value
 * is escaped; what XML cannot hold, and what would turn the direction of a line, stands as U+FFFD.
 */
final class Html {

    private static final String REPLACED = "\uFFFD";

    private final StringBuilder out = new StringBuilder();
    private final Deque<String> open = new ArrayDeque<>();

    /** Begins an element. */
    Html open(String tag, String... attributes) {
        start(tag, attributes).append('>');
        open.push(tag);
        return this;
    }

    /** Ends the element begun last. */
    Html close() {
        out.append("</").append(open.pop()).append('>');
        return this;
    }

    /** An element that holds one text. */
    Html element(String tag, String text, String... attributes) {
        return open(tag, attributes).text(text).close();
    }

    /** An element that holds nothing. */
    Html empty(String tag, String... attributes) {
        start(tag, attributes).append("/>");
        return this;
    }

    private StringBuilder start(String tag, String... attributes) {
        out.append('<').append(tag);
        for (int index = 0; index < attributes.length; index += 2) {
            out.append(' ').append(attributes[index]).append("=\"");
            escape(attributes[index + 1]);
            out.append('"');
        }
        return out;
    }

    /** Text. */
    Html text(String text) {
        escape(text);
        return this;
    }

    private void escape(String text) {
        text.codePoints().forEach(letter -> {
            switch (letter) {
                case '<' -> out.append("&lt;");
                case '>' -> out.append("&gt;");
                case '&' -> out.append("&amp;");
                case '"' -> out.append("&quot;");
                case '\'' -> out.append("&#39;");
                default -> {
                    if (isWritten(letter)) {
                        out.appendCodePoint(letter);
                    } else {
                        out.append(REPLACED);
                    }
                }
            }
        });
    }

    private static boolean isWritten(int letter) {
        return switch (Character.getType(letter)) {
            case Character.CONTROL, Character.SURROGATE, Character.FORMAT, Character.UNASSIGNED -> false;
            default -> true;
        };
    }

    /** The document, all elements ended. */
    String document() {
        if (!open.isEmpty()) {
            throw new IllegalStateException("not ended: " + open);
        }
        return "<!DOCTYPE html>\n" + out + "\n";
    }
}
