package spanwright.paper;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.text.PDFTextStripper;
import org.apache.pdfbox.text.TextPosition;

/** What stands on the pages of a PDF, each letter held to lie inside of its page. */
final class PdfText {

    /** The least margin that printers need, in points: 5 mm. */
    private static final float MARGIN = 14;

    private final List<String> pages = new ArrayList<>();

    private PdfText() {}

    static PdfText of(byte[] pdf, PaperSize size) {
        PdfText text = new PdfText();
        try (PDDocument document = Loader.loadPDF(pdf)) {
            for (int page = 1; page <= document.getNumberOfPages(); page++) {
                PDRectangle box = document.getPage(page - 1).getMediaBox();
                assertThat(List.of(Math.round(box.getWidth()), Math.round(box.getHeight())))
                        .isEqualTo(size == PaperSize.A4 ? List.of(595, 842) : List.of(612, 792));
                Held stripper = new Held(box);
                stripper.setSortByPosition(true);
                stripper.setStartPage(page);
                stripper.setEndPage(page);
                text.pages.add(stripper.getText(document));
            }
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
        return text;
    }

    /** The text of each page. */
    List<String> pages() {
        return pages;
    }

    /** Notices letters outside of the page. */
    private static final class Held extends PDFTextStripper {

        private final PDRectangle box;

        Held(PDRectangle box) {
            this.box = box;
        }

        @Override
        protected void processTextPosition(TextPosition letter) {
            assertThat(letter.getXDirAdj()).as("left of %s", letter).isGreaterThanOrEqualTo(MARGIN);
            assertThat(letter.getXDirAdj() + letter.getWidthDirAdj())
                    .as("right of %s", letter)
                    .isLessThanOrEqualTo(box.getWidth() - MARGIN);
            assertThat(letter.getYDirAdj()).as("top of %s", letter).isGreaterThanOrEqualTo(MARGIN);
            assertThat(letter.getYDirAdj()).as("bottom of %s", letter).isLessThanOrEqualTo(box.getHeight() - MARGIN);
            super.processTextPosition(letter);
        }
    }
}
