package spanwright.sqlite;

import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.time.temporal.ChronoUnit;

/** Times of postings: whole microseconds, written at one length so that they sort as text. */
final class PostingTime {

    private static final DateTimeFormatter FORMAT =
            DateTimeFormatter.ofPattern("uuuu-MM-dd'T'HH:mm:ss.SSSSSS'Z'").withZone(ZoneOffset.UTC);

    private PostingTime() {}

    /** The time of a posting made now: never before the one before it, though the clock may have been set back. */
    static Instant after(Instant before, Instant now) {
        Instant micros = now.truncatedTo(ChronoUnit.MICROS);
        return micros.isBefore(before) ? before : micros;
    }

    static String text(Instant at) {
        return FORMAT.format(at);
    }

    static Instant parse(String text) {
        return Instant.parse(text);
    }
}
