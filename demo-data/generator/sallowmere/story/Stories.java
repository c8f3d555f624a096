package sallowmere.story;

import java.nio.file.Path;
import sallowmere.folder.Table;

/** Writes the stories. */
public final class Stories {
    private Stories() {}

    /** Writes the stories' files. */
    public static void write(Path records, Path stories, Table sheets) {
        sheets.write(stories);
    }
}
