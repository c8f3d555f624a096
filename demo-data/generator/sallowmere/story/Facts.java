package sallowmere.story;

import java.nio.file.Path;
import sallowmere.folder.Figures;
import sallowmere.folder.Table;

/** Figures of one story, reckoned from the records by the generator's own arithmetic. */
final class Facts {
    private final Table table = new Table("facts.csv", "fact", "value", "unit");

    void add(String fact, double value, String unit) {
        table.add(fact, Figures.decimal(value, 2), unit);
    }

    void add(String fact, String value) {
        table.add(fact, value, "");
    }

    void write(Path folder) {
        table.write(folder);
    }
}
