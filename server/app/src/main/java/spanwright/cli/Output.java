package spanwright.cli;

import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;

/** Ways to write for a program and for a person. */
final class Output {

    private Output() {}

    /** One JSON document. */
    static void document(PrintWriter out, byte[] json) {
        out.print(new String(json, StandardCharsets.UTF_8));
        out.flush();
    }

    /** A sentence over as many lines as it needs, each indented; a word longer than a line stands alone. */
    static void wrapped(PrintWriter out, String text, String indent, int width) {
        StringBuilder line = new StringBuilder(indent);
        for (String word : text.strip().split("\\s+", -1)) {
            if (line.length() > indent.length() && line.length() + 1 + word.length() > width) {
                out.println(line);
                line.setLength(indent.length());
            }
            if (line.length() > indent.length()) {
                line.append(' ');
            }
            line.append(word);
        }
        out.println(line);
    }

    /** A text no longer than a width, the rest given up for three dots. */
    static String cut(String text, int width) {
        return text.length() <= width ? text : text.substring(0, width - 3) + "...";
    }
}
