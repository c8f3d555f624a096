package spanwright.exchange;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import spanwright.network.SnapshotEditor;

/** Reads a records folder, or a .zip of one, into an editor of the records. */
public final class FolderLoad {

    /** Hears how far the reading has come. */
    @FunctionalInterface
    public interface Progress {

        /** Hears nothing. */
        Progress NONE = (table, rows, done) -> {};

        /**
         * So many rows of a table have been read.
         *
         * @param table the table, such as {@code splices}
         * @param rows how many rows so far, the header not counted
         * @param done whether that is all of them
         */
        void read(String table, long rows, boolean done);
    }

    private static final int ROWS_BETWEEN = 100_000;
    /** Tables that refer to a later one are read after it. */
    private static final List<Table> ORDER = order();

    private final Entering entering;
    private final Faults faults;
    private final Progress progress;

    private FolderLoad(SnapshotEditor editor, Progress progress) {
        this.faults = new Faults();
        this.entering = new Entering(editor, faults);
        this.progress = progress;
    }

    private static List<Table> order() {
        List<Table> order = new ArrayList<>(List.of(Table.values()));
        order.remove(Table.COLOR_CODES);
        order.add(order.indexOf(Table.CABLE_TYPES), Table.COLOR_CODES);
        return List.copyOf(order);
    }

    /**
     * Reads a folder into an editor. Where anything is wrong, the editor holds only part of it and must be
     * thrown away.
     *
     * @param path a folder, or a zip file of one
     * @param editor the records to which the folder is added
     * @param progress told every now and then, and at the end of each file
     * @return every fault, in order of the tables and their lines; nothing where all of it is entered
     */
    public static List<Fault> load(Path path, SnapshotEditor editor, Progress progress) {
        FolderLoad load = new FolderLoad(editor, progress);
        String name = String.valueOf(path.getFileName());
        try (Source source = Files.isDirectory(path) ? Source.folder(path) : ZipSource.open(path)) {
            load.read(source, name);
        } catch (IOException e) {
            load.faults.add(
                    name, 1, "cannot be read (" + e.getMessage() + "); name a records folder, or a .zip of one");
        }
        return load.faults.list();
    }

    /** Reads a folder whose files come from anywhere. */
    static List<Fault> load(Source source, SnapshotEditor editor) {
        FolderLoad load = new FolderLoad(editor, Progress.NONE);
        load.read(source, "folder");
        return load.faults.list();
    }

    private void read(Source source, String name) {
        List<String> names = source.names();
        boolean any = false;
        for (String file : names) {
            if (file.toLowerCase(Locale.ROOT).endsWith(".csv")) {
                any = true;
                askName(file);
            }
        }
        if (!any && !names.contains(BaseMapLoad.FILE)) {
            faults.add(name, 1, "holds no file of a records folder; it needs files such as structures.csv");
            return;
        }
        Tables tables = new Tables(entering);
        for (Table table : ORDER) {
            if (names.contains(table.file())) {
                readFile(source, table, tables.load(table));
            }
        }
        if (names.contains(BaseMapLoad.FILE)) {
            readBaseMap(source);
        }
        entering.finish();
    }

    private void readBaseMap(Source source) {
        try (InputStream bytes = source.open(BaseMapLoad.FILE)) {
            new BaseMapLoad(entering, progress).read(bytes);
        } catch (IOException e) {
            faults.add(BaseMapLoad.FILE, 1, "cannot be read: " + e.getMessage());
        }
    }

    private void askName(String file) {
        String word = file.substring(0, file.length() - ".csv".length());
        if (!file.endsWith(".csv") || Table.find(word).isEmpty()) {
            List<String> files = new ArrayList<>();
            for (Table table : Table.values()) {
                files.add(table.file());
            }
            faults.add(
                    file,
                    1,
                    "is no file of a records folder; take it out, or name it as one of " + String.join(", ", files)
                            + Near.hint(file, files));
        }
    }

    private void readFile(Source source, Table table, TableLoad load) {
        int[] line = {1};
        try (InputStream bytes = source.open(table.file())) {
            CsvReader reader = new CsvReader(bytes, (at, text) -> faults.add(table, at, text));
            readRows(reader, table, load, line);
        } catch (IOException e) {
            faults.add(table, line[0], "cannot be read on from here: " + e.getMessage());
            entering.doubts().open(table);
        }
        load.end();
    }

    private void readRows(CsvReader reader, Table table, TableLoad load, int[] line) throws IOException {
        long rows = 0;
        int[] fieldOf = header(reader, table);
        if (fieldOf != null) {
            int fields = reader.fields();
            Row row = entering.row(table);
            while (reader.next()) {
                line[0] = reader.line();
                if (reader.fields() != fields) {
                    faults.add(table, reader.line(), fieldCount(reader, fields));
                    entering.doubts().open(table);
                } else {
                    row.take(reader, fieldOf);
                    row.askRequired();
                    load.enter(row);
                }
                if (++rows % ROWS_BETWEEN == 0) {
                    progress.read(table.word(), rows, false);
                }
            }
        }
        if (fieldOf == null || reader.damaged()) {
            entering.doubts().open(table);
        }
        progress.read(table.word(), rows, true);
    }

    private int @Nullable [] header(CsvReader reader, Table table) throws IOException {
        if (!reader.first()) {
            if (!reader.damaged()) {
                faults.add(
                        table,
                        1,
                        "has no header row; the first row names the columns, such as "
                                + String.join(",", table.columns()));
            }
            return null;
        }
        return Header.read(reader, table, faults);
    }

    private static String fieldCount(CsvReader reader, int fields) {
        if (reader.fields() == 1 && reader.start(0) == reader.end(0)) {
            return "the row is empty; take it out";
        }
        return "the row has " + reader.fields() + " fields where the header has " + fields
                + "; write one field a column, and put a field that holds a comma in quotes";
    }
}
