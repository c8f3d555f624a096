package spanwright.exchange;

/**
 * What refuses a records folder.
 *
 * @param file the file's name within the folder, such as {@code structures.csv}
 * @param line where the row begins, the header being line 1; 0 where the file as a whole is meant
 * @param text what is wrong and what would be right
 */
public record Fault(String file, int line, String text) {

    /** {@code file:line: text}, or {@code file: text} for the file as a whole. */
    @Override
    public String toString() {
        return line == 0 ? file + ": " + text : file + ":" + line + ": " + text;
    }
}
