package spanwright.paper;

import com.openhtmltopdf.css.parser.FSRGBColor;
import com.openhtmltopdf.css.sheet.FontFaceRule;
import com.openhtmltopdf.css.style.CssContext;
import com.openhtmltopdf.extend.OutputDevice;
import com.openhtmltopdf.extend.SVGDrawer;
import com.openhtmltopdf.layout.SharedContext;
import com.openhtmltopdf.outputdevice.helper.BaseRendererBuilder.FontStyle;
import com.openhtmltopdf.render.Box;
import com.openhtmltopdf.render.RenderingContext;
import java.awt.BasicStroke;
import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.GeneralPath;
import java.awt.geom.Rectangle2D;
import java.io.File;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.fontbox.ttf.GlyphData;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.w3c.dom.Element;
import org.w3c.dom.Node;

/**
 * Draws into a PDF what {@link PlaceMap} and {@link SquareCode} write, and no other SVG: paths of straight lines, and
 * lines of bold text as the outlines of its letters. One unit is 0.1 mm.
 */
final class PlainDrawing implements SVGDrawer {

    private static final Pattern STEP = Pattern.compile("([ML])(-?[0-9.]+) (-?[0-9.]+)|Z");
    private static final Pattern BOUNDS = Pattern.compile("0 0 ([0-9]+) ([0-9]+)");
    private static final double MM_PER_UNIT = 0.1;

    private final TrueTypeFont letters = Typeface.BOLD.font();

    @Override
    public void importFontFaceRules(List<FontFaceRule> rules, SharedContext context) {}

    @Override
    public void addFontFile(File file, String family, Integer weight, FontStyle style) {}

    @Override
    public SVGImage buildSVGImage(
            Element svg, Box box, CssContext context, double cssWidth, double cssHeight, double dotsPerPixel) {
        Matcher bounds = BOUNDS.matcher(svg.getAttribute("viewBox"));
        if (!bounds.matches()) {
            throw new IllegalArgumentException("not a drawing of ours: " + svg.getAttribute("viewBox"));
        }
        double dotsPerUnit = MM_PER_UNIT / context.getMmPerDot();
        return new Drawing(svg, Double.parseDouble(bounds.group(1)), Double.parseDouble(bounds.group(2)), dotsPerUnit);
    }

    @Override
    public void close() throws IOException {
        letters.close();
    }

    /** One drawing, at its size on paper. */
    private final class Drawing implements SVGImage {

        private final Element svg;
        private final double width;
        private final double height;
        private final double scale;

        Drawing(Element svg, double width, double height, double scale) {
            this.svg = svg;
            this.width = width;
            this.height = height;
            this.scale = scale;
        }

        @Override
        public int getIntrinsicWidth() {
            return (int) Math.round(width * scale);
        }

        @Override
        public int getIntrinsicHeight() {
            return (int) Math.round(height * scale);
        }

        @Override
        public void drawSVG(OutputDevice device, RenderingContext context, double x, double y) {
            AffineTransform paper = AffineTransform.getTranslateInstance(x, y);
            paper.scale(scale, scale);
            device.pushClip(paper.createTransformedShape(new Rectangle2D.Double(0, 0, width, height)));
            for (Node child = svg.getFirstChild(); child != null; child = child.getNextSibling()) {
                if (child instanceof Element element) {
                    draw(device, element, paper);
                }
            }
            device.popClip();
        }

        private void draw(OutputDevice device, Element element, AffineTransform paper) {
            boolean text = element.getTagName().equals("text");
            Shape shape = paper.createTransformedShape(text ? outlines(element) : path(element.getAttribute("d")));
            String fill = text ? "#000" : element.getAttribute("fill");
            if (!fill.equals("none")) {
                device.setColor(color(fill));
                device.fill(shape);
            }
            String stroke = text ? "none" : element.getAttribute("stroke");
            if (!stroke.equals("none")) {
                device.setColor(color(stroke));
                float wide = (float) (Double.parseDouble(element.getAttribute("stroke-width")) * scale);
                device.setStroke(new BasicStroke(wide, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER));
                device.draw(shape);
            }
        }
    }

    private static FSRGBColor color(String written) {
        int[] parts = written.substring(1)
                .chars()
                .map(digit -> Character.digit(digit, 16) * 0x11)
                .toArray();
        return parts.length == 3
                ? new FSRGBColor(parts[0], parts[1], parts[2])
                : new FSRGBColor(Integer.parseInt(written.substring(1), 16));
    }

    private static GeneralPath path(String d) {
        GeneralPath path = new GeneralPath();
        Matcher step = STEP.matcher(d);
        while (step.find()) {
            if (step.group(1) == null) {
                path.closePath();
            } else if (step.group(1).equals("M")) {
                path.moveTo(Double.parseDouble(step.group(2)), Double.parseDouble(step.group(3)));
            } else {
                path.lineTo(Double.parseDouble(step.group(2)), Double.parseDouble(step.group(3)));
            }
        }
        return path;
    }

    private GeneralPath outlines(Element text) {
        GeneralPath all = new GeneralPath();
        double size = Double.parseDouble(text.getAttribute("font-size"));
        try {
            AffineTransform at = AffineTransform.getTranslateInstance(
                    Double.parseDouble(text.getAttribute("x")), Double.parseDouble(text.getAttribute("y")));
            at.scale(size / letters.getUnitsPerEm(), -size / letters.getUnitsPerEm());
            for (int letter : text.getTextContent().codePoints().toArray()) {
                int glyph = letters.getUnicodeCmapLookup().getGlyphId(letter);
                GlyphData data = letters.getGlyph().getGlyph(glyph);
                if (data != null) {
                    all.append(at.createTransformedShape(data.getPath()), false);
                }
                at.translate(letters.getAdvanceWidth(glyph), 0);
            }
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
        return all;
    }
}
