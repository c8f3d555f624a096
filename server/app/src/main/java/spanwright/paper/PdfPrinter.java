package spanwright.paper;

import com.openhtmltopdf.extend.FSStream;
import com.openhtmltopdf.outputdevice.helper.BaseRendererBuilder.FontStyle;
import com.openhtmltopdf.outputdevice.helper.ExternalResourceControlPriority;
import com.openhtmltopdf.pdfboxout.PdfRendererBuilder;
import com.openhtmltopdf.util.XRLog;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.Reader;
import java.io.StringReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import org.apache.pdfbox.pdmodel.font.FontMappers;
import org.jspecify.annotations.Nullable;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * Makes a PDF of a paper's own HTML: the same style sheets, the typeface embedded, nothing read that is not in the jar.
 * Any thread's.
 */
public final class PdfPrinter {

    private static final Logger LOG = LoggerFactory.getLogger("spanwright.paper");
    private static final String JAR = "jar-of-spanwright";
    private static final String BASE = JAR + ":";
    private static final String STYLES = BASE + "/style/";

    static {
        // What it has to say is told paper by paper instead, below.
        XRLog.setLoggingEnabled(false);
        FontMappers.set(new OwnFonts());
    }

    private PdfPrinter() {}

    /** The bytes of a PDF. */
    public static byte[] print(String html) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try (PlainDrawing drawing = new PlainDrawing()) {
            new PdfRendererBuilder()
                    .useSVGDrawer(drawing)
                    .useFastMode()
                    .useFont(Typeface.REGULAR::open, Typeface.FAMILY, 400, FontStyle.NORMAL, true)
                    .useFont(Typeface.BOLD::open, Typeface.FAMILY, 700, FontStyle.NORMAL, true)
                    .useUriResolver(PdfPrinter::packed)
                    .useProtocolsStreamImplementation(Packed::of, JAR)
                    .useExternalResourceAccessControl(
                            (uri, type) -> uri.startsWith(STYLES),
                            ExternalResourceControlPriority.RUN_AFTER_RESOLVING_URI)
                    .withDiagnosticConsumer(
                            said -> LOG.debug("{} {}", said.getLogMessageId(), said.getFormattedMessage()))
                    .usePdfUaAccessibility(true)
                    .withProducer("Spanwright")
                    .withHtmlContent(html, BASE + "/")
                    .toStream(out)
                    .run();
        } catch (IOException failed) {
            throw new UncheckedIOException(failed);
        }
        return out.toByteArray();
    }

    /** The address of a style sheet within the jar, which the renderer resolves twice; nothing for anything else. */
    private static @Nullable String packed(String base, String uri) {
        String within = uri.startsWith("/style/") ? BASE + uri : uri;
        return within.startsWith(STYLES) ? within : null;
    }

    /** A style sheet out of the jar. */
    private record Packed(String text) implements FSStream {

        static FSStream of(String uri) {
            String resource = "/web" + uri.substring(BASE.length());
            try (InputStream in = PdfPrinter.class.getResourceAsStream(resource)) {
                if (in == null) {
                    throw new IllegalStateException("the program was packed without " + resource);
                }
                return new Packed(new String(in.readAllBytes(), StandardCharsets.UTF_8));
            } catch (IOException unreadable) {
                throw new UncheckedIOException(unreadable);
            }
        }

        @Override
        public InputStream getStream() {
            return new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8));
        }

        @Override
        public Reader getReader() {
            return new StringReader(text);
        }
    }
}
