package spanwright.network;

import spanwright.plant.RunRow;
import spanwright.records.RecordsView;
import spanwright.splicing.EndKey;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** Names ends as a records folder and an answer do: {@code F-1 ahead 3 @ E4}, {@code S1 out 5 @ E6}, {@code E9/P/4}. */
public final class EndNames {

    private final RecordsView records;

    /** Names by the codes of these records. */
    public EndNames(RecordsView records) {
        this.records = records;
    }

    /** The name of an end; a port's rear and front have the same. */
    public String of(long key) {
        int owner = EndKey.owner(key);
        int number = EndKey.number(key);
        return switch (EndKey.kind(key)) {
            case BACK -> fiber(owner, "back", "end", number);
            case AHEAD -> fiber(owner, "ahead", "start", number);
            case IN -> terminal(owner, number == 1 ? "in" : "in " + number);
            case OUT -> terminal(owner, "out " + number);
            case REAR, FRONT -> port(owner, number);
        };
    }

    private String fiber(int runRow, String side, String bare, int number) {
        RunRow row = records.runRows().get(runRow);
        String cable = records.cables().get(row.cable()).code();
        return records.findPassAt(runRow)
                .map(pass -> cable + " " + side + " " + number + " @ " + enclosure(pass.enclosure()))
                .orElse(cable + " " + bare + " " + number);
    }

    private String terminal(int splitter, String side) {
        Splitter found = records.splitters().get(splitter);
        return found.code() + " " + side + " @ " + enclosure(found.enclosure());
    }

    private String port(int panel, int number) {
        Panel found = records.panels().get(panel);
        return enclosure(found.enclosure()) + "/" + found.code() + "/" + number;
    }

    private String enclosure(int id) {
        return records.enclosures().get(id).code();
    }
}
