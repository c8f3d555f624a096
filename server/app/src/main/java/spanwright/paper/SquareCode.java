package spanwright.paper;

import com.google.zxing.WriterException;
import com.google.zxing.qrcode.decoder.ErrorCorrectionLevel;
import com.google.zxing.qrcode.encoder.ByteMatrix;
import com.google.zxing.qrcode.encoder.Encoder;
import java.util.Locale;
import spanwright.plant.Position;

/** A QR code (ISO/IEC 18004) that holds nothing but where a place is, as a geo URI (RFC 5870). */
final class SquareCode {

    private static final int MODULE = 9;
    private static final int QUIET = 4;

    private SquareCode() {}

    /** What the code says. */
    static String content(Position position) {
        return String.format(Locale.ROOT, "geo:%.6f,%.6f", position.lat(), position.lon());
    }

    /** Writes the drawing of a place. */
    static void write(Html html, Position position) {
        ByteMatrix code = matrix(content(position));
        int side = (code.getWidth() + 2 * QUIET) * MODULE;
        html.open(
                "svg",
                "xmlns",
                "http://www.w3.org/2000/svg",
                "class",
                "square",
                "viewBox",
                "0 0 " + side + " " + side,
                "role",
                "img",
                "aria-label",
                "QR code of the position");
        for (int row = 0; row < code.getHeight(); row++) {
            for (int column = 0; column < code.getWidth(); column++) {
                if (code.get(column, row) == 1) {
                    module(html, (column + QUIET) * MODULE, (row + QUIET) * MODULE);
                }
            }
        }
        html.close();
    }

    private static void module(Html html, int x, int y) {
        String d = "M" + x + " " + y + "L" + (x + MODULE) + " " + y + "L" + (x + MODULE) + " " + (y + MODULE) + "L" + x
                + " " + (y + MODULE) + "Z";
        html.empty("path", "d", d, "fill", "#000", "stroke", "none");
    }

    private static ByteMatrix matrix(String content) {
        try {
            return Encoder.encode(content, ErrorCorrectionLevel.M).getMatrix();
        } catch (WriterException never) {
            throw new IllegalStateException("a geo URI fits every code", never);
        }
    }
}
