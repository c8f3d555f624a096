package sallowmere.check;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** All checks of a generated folder; each answer is a sentence on what is wrong. */
public final class Checks {
    private Checks() {}

    /** What is wrong with a folder; empty where nothing is. Prints the counts as it goes. */
    public static List<String> of(Path path) {
        RecordsFolder folder = new RecordsFolder(path);
        List<String> wrong = new ArrayList<>(RowRules.of(folder));
        if (!wrong.isEmpty()) {
            return wrong;
        }
        SpanLengths spans = new SpanLengths(folder);
        Glass glass = new Glass(folder);
        wrong.addAll(spans.wrong());
        wrong.addAll(glass.wrong());
        if (!wrong.isEmpty()) {
            return wrong;
        }
        Network network = new Network(folder, glass, spans);
        wrong.addAll(Totals.of(folder, spans, glass));
        wrong.addAll(PathRules.of(folder, glass, network));
        wrong.addAll(BackhoeRules.of(folder, network, spans));
        return wrong;
    }
}
