package spanwright.journal;

/** Something the records keep. Implementations are immutable records with equality by value. */
public interface Recorded {

    /** The lasting identity within its kind, 1 or above; codes and the like are attributes and may change. */
    int id();

    /** What kind of record it is. */
    RecordKind kind();
}
