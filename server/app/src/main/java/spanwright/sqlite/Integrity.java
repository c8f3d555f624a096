package spanwright.sqlite;

import java.util.List;

/**
 * What a check of the whole file found.
 *
 * @param findings what is wrong, as SQLite says it; none where the file is sound
 */
public record Integrity(List<String> findings) {

    /** Keeps its own copy of the list. */
    public Integrity {
        findings = List.copyOf(findings);
    }

    /** Whether nothing was found. */
    public boolean sound() {
        return findings.isEmpty();
    }
}
