package spanwright.sheet;

import java.util.List;

/**
 * What a sheet was understood to say.
 *
 * @param statements in the order of their lines
 * @param mistakes in the order of their places; where there is one, the line it stands in says nothing
 */
public record SheetRead(List<Statement> statements, List<Mistake> mistakes) {

    /** Keeps its own copies. */
    public SheetRead {
        statements = List.copyOf(statements);
        mistakes = List.copyOf(mistakes);
    }
}
