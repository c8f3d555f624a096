package spanwright.exchange;

/** Enters the rows of one table. */
interface TableLoad {

    /** Enters a row that is well formed; required cells that are blank have been reported. */
    void enter(Row row);

    /** All rows have been entered. */
    default void end() {}
}
