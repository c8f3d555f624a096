package spanwright.paper;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.fontbox.ttf.CmapLookup;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;

/**
 * How wide text is in the typeface of the sheets, Liberation Sans; its letters are as wide as those of Arial, which a
 * browser may take in its place. Immutable; any thread's.
 */
final class Typeface {

    /** The name under which style sheets call it. */
    static final String FAMILY = "Liberation Sans";

    /** The upright weight. */
    static final Typeface REGULAR = new Typeface("/liberation/LiberationSans-Regular.ttf");

    /** The bold weight. */
    static final Typeface BOLD = new Typeface("/liberation/LiberationSans-Bold.ttf");

    private static final int LETTERS = 0x10000;
    private static final String CUT_SHORT = "\u2026";
    private static final String BREAKS_AFTER = " /-:";

    private final String resource;
    /** Width of each letter of the basic plane, in parts of the em; 0 for one that the typeface lacks. */
    private final short[] widths = new short[LETTERS];

    private final int em;

    private Typeface(String resource) {
        this.resource = resource;
        try (TrueTypeFont font = font()) {
            em = font.getUnitsPerEm();
            CmapLookup letters = font.getUnicodeCmapLookup();
            for (int letter = 0; letter < LETTERS; letter++) {
                int glyph = letters.getGlyphId(letter);
                widths[letter] = glyph == 0 ? 0 : (short) font.getAdvanceWidth(glyph);
            }
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }

    /** The file, to be closed by the caller. */
    InputStream open() {
        InputStream in = Typeface.class.getResourceAsStream(resource);
        if (in == null) {
            throw new IllegalStateException("the program was packed without " + resource);
        }
        return in;
    }

    /** The typeface with its outlines, to be closed by the caller. */
    TrueTypeFont font() {
        try (InputStream in = open()) {
            return new TTFParser().parse(new RandomAccessReadBuffer(in.readAllBytes()));
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }

    /** The width of a text in points, at a size in points; a letter that the typeface lacks counts as one em. */
    double width(String text, double size) {
        return text.codePoints().mapToDouble(this::width).sum() * size / em;
    }

    private int width(int letter) {
        int width = letter < LETTERS ? widths[letter] & 0xFFFF : 0;
        return width == 0 ? em : width;
    }

    /**
     * A text set in lines.
     *
     * @param room the width of a line, in points
     * @param size in points
     * @param most lines at most, 1 or more; what does not fit is cut short with an ellipsis
     */
    List<String> lines(String text, double room, double size, int most) {
        List<String> lines = new ArrayList<>();
        String rest = text.strip().replaceAll("\\s+", " ");
        while (lines.size() < most - 1 && width(rest, size) > room) {
            int end = breakAt(rest, room, size);
            lines.add(rest.substring(0, end).strip());
            rest = rest.substring(end).strip();
        }
        if (!rest.isEmpty()) {
            lines.add(fitted(rest, room, size));
        }
        return lines;
    }

    /** Where a line too long for its room ends: after the last word that fits, else within the first. */
    private int breakAt(String text, double room, double size) {
        int fits = fitting(text, room, size);
        for (int end = fits; end > fits / 3; end--) {
            if (BREAKS_AFTER.indexOf(text.charAt(end - 1)) >= 0) {
                return end;
            }
        }
        return Math.max(fits, text.offsetByCodePoints(0, 1));
    }

    private String fitted(String text, double room, double size) {
        return width(text, size) <= room
                ? text
                : text.substring(0, fitting(text, room - width(CUT_SHORT, size), size))
                                .strip()
                        + CUT_SHORT;
    }

    /** How much of a text fits, never within a letter of two chars. */
    private int fitting(String text, double room, double size) {
        double used = 0;
        int end = 0;
        while (end < text.length()) {
            int letter = text.codePointAt(end);
            used += width(letter) * size / em;
            if (used > room) {
                break;
            }
            end += Character.charCount(letter);
        }
        return end;
    }
}
