package spanwright.draft;

import java.util.List;
import spanwright.sheet.SheetHeader;

/**
 * What a person has written in a draft so far.
 *
 * @param lines the lines, none with a line break in it
 * @param header what is said of all joints at once
 * @param cursorLine the line of the cursor, from 1
 * @param cursorColumn its column, from 1
 * @param answers to warnings and prompts
 */
public record DraftText(
        List<String> lines, SheetHeader header, int cursorLine, int cursorColumn, List<Answer> answers) {

    /** Keeps its own copies; refuses a cursor that is nowhere. */
    public DraftText {
        lines = List.copyOf(lines);
        answers = List.copyOf(answers);
        if (cursorLine < 1 || cursorColumn < 1) {
            throw new IllegalArgumentException("lines and columns are counted from 1");
        }
    }

    /** Whether another says the same, wherever its cursor is. */
    boolean says(DraftText other) {
        return lines.equals(other.lines) && header.equals(other.header) && answers.equals(other.answers);
    }
}
