package spanwright.exchange;

import java.io.Closeable;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Locale;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.records.Records;

/**
 * Writes the records as a records folder or, where the name ends in {@code .zip}, a zip of one. Loaded into a fresh
 * file it gives equal records; equal records, entered in the same order, give equal files.
 */
public final class FolderExport {

    private FolderExport() {}

    /**
     * Writes a folder or a zip. Only files that have rows are written, but for the structures'. What is written appears under its name when
     * it is whole.
     *
     * @param records what is written
     * @param path the folder, which does not exist yet or is empty, or the zip, which does not exist yet
     * @throws FileAlreadyExistsException where something is there already
     * @throws IOException where it cannot be written
     */
    public static void write(Records records, Path path) throws IOException {
        boolean zip = path.toString().toLowerCase(Locale.ROOT).endsWith(".zip");
        refuseExisting(path, zip);
        Unfinished.write(path, part -> {
            if (zip) {
                try (Sink sink = Sink.zip(part)) {
                    write(records, sink);
                }
            } else {
                Files.createDirectory(part);
                write(records, Sink.folder(part));
            }
        });
    }

    private static void refuseExisting(Path path, boolean zip) throws IOException {
        if (!Files.exists(path)) {
            return;
        }
        if (!zip && Files.isDirectory(path)) {
            try (Stream<Path> files = Files.list(path)) {
                if (files.findAny().isEmpty()) {
                    return;
                }
            }
        }
        throw new FileAlreadyExistsException(path.toString(), null, "name a folder or file that is not there yet");
    }

    private static void write(Records records, Sink sink) throws IOException {
        RecordRows rows = new RecordRows(records);
        if (records.structures().count() == 0) {
            // A folder without any file would be none.
            new TableFile(Table.STRUCTURES, sink).empty();
        }
        for (Table table : Table.values()) {
            try (TableFile file = new TableFile(table, sink)) {
                rows.each(table, file);
            }
        }
        if (records.baseFeatures().count() > 0) {
            try (OutputStream bytes = sink.create(BaseMapLoad.FILE)) {
                new GeoJsonWriter(bytes).baseMap(records.baseFeatures().list());
            }
        }
    }

    /** The file of one table, begun with its first row. */
    private static final class TableFile implements RecordRows.Taker, Closeable {

        private final Table table;
        private final Sink sink;
        private @Nullable CsvWriter writer;

        TableFile(Table table, Sink sink) {
            this.table = table;
            this.sink = sink;
        }

        @Override
        public void take(String[] cells) throws IOException {
            CsvWriter begun = writer == null ? begin() : writer;
            begun.row(Arrays.asList(cells));
        }

        private CsvWriter begin() throws IOException {
            CsvWriter begun = new CsvWriter(sink.create(table.file()));
            writer = begun;
            begun.row(table.columns());
            return begun;
        }

        /** Writes the file without rows. */
        void empty() throws IOException {
            begin().close();
        }

        @Override
        public void close() throws IOException {
            if (writer != null) {
                writer.close();
            }
        }
    }
}
