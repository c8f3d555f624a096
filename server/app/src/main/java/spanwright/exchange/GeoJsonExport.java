package spanwright.exchange;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Iterator;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Stream;
import spanwright.journal.Recorded;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.Position;
import spanwright.plant.Structure;
import spanwright.records.Records;

/**
 * Writes the plant as GeoJSON (RFC 7946): structures and enclosures as points, spans as lines, cables as lines along
 * their runs; WGS 84, longitude first. A foreign member {@code note} says what the positions are not.
 */
public final class GeoJsonExport {

    /** What every map of the records says. */
    static final String NOTE = "Positions are records, not a locate. Call before you dig; treat every fiber as live"
            + " until proven dark; local codes and licensed practice prevail.";

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
     * @param path the file, which does not exist yet
     * @throws FileAlreadyExistsException where something is there already
     * @throws IOException where it cannot be written
     */
    public static void write(Records records, Path path) throws IOException {
        if (Files.exists(path)) {
            throw new FileAlreadyExistsException(path.toString(), null, "name a file that is not there yet");
        }
        Path part = path.resolveSibling(path.getFileName() + ".part");
        try (OutputStream bytes = new BufferedOutputStream(Files.newOutputStream(part), 1 << 16)) {
            write(records, bytes);
        }
        Files.move(part, path, StandardCopyOption.ATOMIC_MOVE);
    }

    /** Writes to a stream, which is closed. */
    static void write(Records records, OutputStream bytes) throws IOException {
        try (GeoJsonWriter writer = new GeoJsonWriter(bytes)) {
            writer.begin();
            writer.member("note", NOTE);
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
            writer.geometry(place.apply(record));
        }
    }
}
