package spanwright.cli;

import java.net.URI;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;
import spanwright.answers.View;
import spanwright.journal.Posting;
import spanwright.network.Ledger;

/** What the commands ask of the rest of the program. What cannot be done for want of right input is a {@link WrongInput}. */
public interface Program {

    /** The version, such as {@code 0.1.0}. */
    String version();

    /**
     * Opens a records file that is there.
     *
     * @throws WrongInput where it is not, or is no records file
     */
    Ledger open(Path records);

    /**
     * Adds a records folder, or its zip, to a new or existing records file as one posting.
     *
     * @param progress hears now and then how far it is, in a few words
     * @throws WrongInput where the folder or the file cannot be read
     */
    LoadResult load(Path folder, Path records, String by, String reason, Consumer<String> progress);

    /**
     * Writes the records of a view for other programs.
     *
     * @param posting the view's last posting, or null where there is none
     * @param out a file or folder that is not there yet
     * @throws WrongInput where it is there, or cannot be written
     */
    void export(View view, @Nullable Posting posting, ExportFormat format, Path out);

    /**
     * Starts to serve a records file.
     *
     * @throws WrongInput where the file or the port cannot be had
     */
    Serving serve(ServeOrder order);

    /**
     * Loads the demo into a fresh records file and starts to serve it, to this machine only.
     *
     * @param records a file that is not there yet
     * @param port the port, 0 for any that is free; null for the usual one, or any where that is taken
     * @throws WrongInput where the file or the port cannot be had
     */
    Serving demo(Path records, @Nullable Integer port);

    /** Opens a page in the person's browser, if the machine has one. */
    void browse(URI page);

    /** What an export is written as. */
    enum ExportFormat {
        /** A records folder. */
        FOLDER,
        /** One GeoJSON file. */
        GEOJSON
    }

    /** What became of a load. */
    sealed interface LoadResult {

        /**
         * It is stored.
         *
         * @param posting its head
         * @param counts how many of each, as {@code 2,600 structures}
         */
        record Loaded(Posting posting, List<String> counts) implements LoadResult {

            /** Keeps its own copy. */
            public Loaded {
                counts = List.copyOf(counts);
            }
        }

        /**
         * Nothing is stored.
         *
         * @param lines every fault, {@code file:line: what is wrong and what would be right}
         */
        record Refused(List<String> lines) implements LoadResult {

            /** Keeps its own copy. */
            public Refused {
                lines = List.copyOf(lines);
            }
        }
    }

    /**
     * What to serve, and where.
     *
     * @param records the records file
     * @param host the address to listen at
     * @param port the port, 0 for any that is free
     * @param tileUrl tile address for the map, or null
     * @param tileAttribution whose tiles they are, or null
     */
    record ServeOrder(
            Path records,
            String host,
            int port,
            @Nullable String tileUrl,
            @Nullable String tileAttribution) {}

    /** A running server. */
    interface Serving extends AutoCloseable {

        /** Where its start page is. */
        URI address();

        /** Whether only this machine reaches it. */
        boolean loopback();

        /** Waits until it is stopped. */
        void await();

        @Override
        void close();
    }
}
