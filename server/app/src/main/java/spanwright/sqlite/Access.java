package spanwright.sqlite;

/** What a records file is opened for. */
public enum Access {
    /** To be read, beside whoever writes it; it must be there. The state is the one at the time of opening. */
    READ,
    /** To be read and posted to, by this process alone; it is made by the first posting if it is not there. */
    WRITE
}
