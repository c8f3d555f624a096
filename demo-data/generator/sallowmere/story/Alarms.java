package sallowmere.story;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import sallowmere.folder.Table;

/** Who is down and who is up: as a table, and as two lists for the command line. */
final class Alarms {
    private final Table table = new Table("alarms.csv", "time", "circuit", "state", "note");
    private final List<String> down = new ArrayList<>();
    private final List<String> up = new ArrayList<>();
    private final String time;

    Alarms(String time) {
        this.time = time;
    }

    void down(String circuit) {
        table.add(time, circuit, "down", "");
        down.add(circuit);
    }

    void up(String circuit, String note) {
        table.add(time, circuit, "up", note);
        up.add(circuit);
    }

    int downCount() {
        return down.size();
    }

    void write(Path folder) {
        table.write(folder);
        try {
            Files.writeString(folder.resolve("down.txt"), String.join(",", down) + "\n");
            Files.writeString(folder.resolve("up.txt"), String.join(",", up) + "\n");
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
