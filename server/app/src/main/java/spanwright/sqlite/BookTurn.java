package spanwright.sqlite;

import java.time.Clock;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.function.Function;
import java.util.function.Supplier;
import spanwright.records.Refusal;

/** How the books beside the records (incidents, drafts) are written: in turn with the postings. */
record BookTurn(Readers readers, PostingLine line, Store store, PostingDesk desk, Clock clock) {

    /** Whether the file is of a schema, or of a later one; an older file, opened to be read only, may not be. */
    boolean hasSchema(int schema) {
        return readers.ask(connection -> FileCheck.pragma(connection, "user_version") >= schema);
    }

    /** The time as the file keeps it, to the microsecond. */
    Instant now() {
        return clock.instant().truncatedTo(ChronoUnit.MICROS);
    }

    /** Nothing is written beside a posting, nor after a fault of the file: that is what the answer is refused for. */
    <T> T take(Supplier<T> writing, Function<Refusal, T> refused) {
        return line.inTurn(() -> {
            Refusal shut = desk.unwritable();
            if (shut != null) {
                return refused.apply(shut);
            }
            try {
                return writing.get();
            } catch (StorageFault fault) {
                return refused.apply(new Refusal(
                        "records-unwritable",
                        "The records file could not be written (" + fault.getMessage()
                                + "), so nothing of this was kept.",
                        null,
                        null,
                        null));
            }
        });
    }
}
