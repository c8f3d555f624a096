package spanwright.exchange;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.math.RoundingMode;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Iterator;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Recorded;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.Position;
import spanwright.plant.RouteLength;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.quantity.Length;
import spanwright.records.CableLay;
import spanwright.records.Records;

/**
 * Writes the plant as GeoJSON (RFC 7946): structures and enclosures as points, spans as lines, cables as lines along
 * their runs; WGS 84, longitude first. Foreign members say what the positions are not, and of which posting they are;
 * every feature says the former too, as many programs drop the collection's own members.
 */
public final class GeoJsonExport {

    /** What every map of the records says. */
    static final String NOTE = "Positions are records, not a locate. Call before you dig; treat every fiber as live"
            + " until proven dark; local codes and licensed practice prevail.";

    /** What every feature says, for programs that drop the collection's own members. */
    static final String CAUTION = "records, not a locate: call before you dig";

    private static final Set<String> NUMBERS = Set.of("accuracy_m", "length_m", "tray_glass_m", "overlength_pct");
    private static final Set<String> PLACES = Set.of("lon", "lat", "line");

    private final Records records;
    private final Formats formats;
    private final GeoJsonWriter writer;
    private final MapLines lines;

    private GeoJsonExport(Records records, GeoJsonWriter writer) {
        this.records = records;
        this.formats = new Formats(new References(records, new Doubts()));
        this.writer = writer;
        this.lines = new MapLines(records);
    }

    /**
     * Writes a file; it appears under its name when it is whole.
     *
     * @param records what is written
     * @param time when their last posting was made, in the records' own zone; null where there is none
     * @param path the file, which does not exist yet
     * @throws FileAlreadyExistsException where something is there already
     * @throws IOException where it cannot be written
     */
    public static void write(Records records, @Nullable String time, Path path) throws IOException {
        if (Files.exists(path)) {
            throw new FileAlreadyExistsException(path.toString(), null, "name a file that is not there yet");
        }
        Unfinished.write(path, part -> {
            try (OutputStream bytes = new BufferedOutputStream(Files.newOutputStream(part), 1 << 16)) {
                write(records, time, bytes);
            }
        });
    }

    /** Writes to a stream, which is closed. */
    static void write(Records records, @Nullable String time, OutputStream bytes) throws IOException {
        try (GeoJsonWriter writer = new GeoJsonWriter(bytes)) {
            writer.begin();
            writer.member("note", NOTE);
            writer.member("posting", records.posting());
            writer.member("posted_at", time);
            writer.features();
            new GeoJsonExport(records, writer).plant();
        }
    }

    private void plant() throws IOException {
        features(
                Table.STRUCTURES,
                new StructureRows(formats.refs()),
                records.structures().list(),
                this::place);
        features(Table.SPANS, new SpanRows(formats.refs()), records.spans().list(), lines::of);
        features(
                Table.CABLES, new CableRows(formats.refs()), records.cables().list(), (Cable cable) -> lines.of(cable));
        features(
                Table.ENCLOSURES,
                new EnclosureRows(formats.refs()),
                records.enclosures().list(),
                this::place);
    }

    private List<List<Position>> place(Structure structure) {
        return List.of(List.of(structure.position()));
    }

    private List<List<Position>> place(Enclosure enclosure) {
        return place(records.structures().get(enclosure.structure()));
    }

    private <T extends Recorded> void features(
            Table table, Rows<T> rows, Stream<T> all, Function<T, List<List<Position>>> place) throws IOException {
        Cells cells = new Cells(table);
        for (Iterator<T> each = all.iterator(); each.hasNext(); ) {
            T record = each.next();
            rows.write(record, cells);
            writer.feature(table.word() + "/" + cells.texts()[0]);
            writer.property("table", table.word());
            for (var cell : cells.byColumn().entrySet()) {
                if (NUMBERS.contains(cell.getKey())) {
                    writer.number(cell.getKey(), cell.getValue());
                } else if (!PLACES.contains(cell.getKey())) {
                    writer.property(cell.getKey(), cell.getValue());
                }
            }
            Length reckoned = reckoned(record);
            if (reckoned != null) {
                writer.number(record instanceof Cable ? "sheath_m" : "route_m", rounded(reckoned));
            }
            writer.property("caution", CAUTION);
            writer.geometry(place.apply(record));
        }
    }

    /** The length of a span along its route, of a cable from its start to its end; null for others. */
    private @Nullable Length reckoned(Recorded record) {
        if (record instanceof Span span) {
            Position from = records.structures().get(span.from()).position();
            return RouteLength.of(
                            span, from, records.structures().get(span.to()).position())
                    .length();
        }
        return record instanceof Cable cable && !records.runOf(cable.id()).isEmpty()
                ? CableLay.of(records, cable.id()).positions().length()
                : null;
    }

    private static String rounded(Length length) {
        return length.exactMetres().setScale(3, RoundingMode.HALF_EVEN).toPlainString();
    }
}
