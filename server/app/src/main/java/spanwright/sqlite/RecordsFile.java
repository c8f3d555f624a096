package spanwright.sqlite;

import java.nio.file.Path;

/** What is fixed about a records file, and the names of the files beside it. */
final class RecordsFile {

    /** Marks the SQLite file as one of ours: the letters SPWR. */
    static final int APPLICATION_ID = 0x53505752;

    /** The schema that this program writes: the number of the last migration. */
    static final int SCHEMA = 3;

    private RecordsFile() {}

    /** The image of the network, from which the file opens fast. */
    static Path network(Path file) {
        return beside(file, ".network");
    }

    /** Says which process writes. */
    static Path writing(Path file) {
        return beside(file, ".writing");
    }

    /** A new records file while it is being made. */
    static Path making(Path file) {
        return beside(file, ".making");
    }

    /** The file as it was before it was brought up to a schema. */
    static Path before(Path file, int schema) {
        return beside(file, ".before-V" + schema);
    }

    /** SQLite's own log of what is not yet in the file. */
    static Path log(Path file) {
        return beside(file, "-wal");
    }

    private static Path beside(Path file, String ending) {
        return file.resolveSibling(file.getFileName() + ending);
    }
}
