package spanwright.records;

import spanwright.plant.FiberRange;
import spanwright.plant.RunRow;
import spanwright.splicing.EndKey;
import spanwright.splicing.EndRange;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** Writes ends, ports and fibers in the notation of the records folder. */
public final class EndNames {

    private final RecordsView records;

    /** Names by the codes of these records. */
    public EndNames(RecordsView records) {
        this.records = records;
    }

    /**
     * An end within its enclosure: {@code F-1 ahead 3}, {@code S1 in}, {@code S1 in 2}, {@code S1 out 5}; a port by
     * either side: {@code E1/P/1}.
     */
    public String end(long key) {
        return ends(new Leg(EndKey.kind(key), EndKey.owner(key)), Integer.toString(EndKey.number(key)));
    }

    /** Ends within their enclosure: {@code F-1 ahead 1-12}, {@code S1 out 1-8}, {@code E1/P/1-12}. */
    public String ends(EndRange range) {
        return ends(range.leg(), range.numbers().toString());
    }

    private String ends(Leg leg, String numbers) {
        return switch (leg.kind()) {
            case BACK, AHEAD -> legName(leg) + " " + numbers;
            case IN -> legName(leg) + (numbers.equals("1") ? "" : " " + numbers);
            case OUT -> legName(leg) + " " + numbers;
            case REAR, FRONT -> legName(leg) + "/" + numbers;
        };
    }

    private String legName(Leg leg) {
        return switch (leg.kind()) {
            case BACK -> cable(leg.owner()) + " back";
            case AHEAD -> cable(leg.owner()) + " ahead";
            case IN -> records.splitters().get(leg.owner()).code() + " in";
            case OUT -> records.splitters().get(leg.owner()).code() + " out";
            case REAR, FRONT -> panel(leg.owner());
        };
    }

    private String cable(int runRow) {
        return records.cables().get(records.runRows().get(runRow).cable()).code();
    }

    private String panel(int id) {
        Panel panel = records.panels().get(id);
        return enclosure(panel.enclosure()) + "/" + panel.code();
    }

    private String enclosure(int id) {
        return records.enclosures().get(id).code();
    }

    /**
     * An end wherever it is: {@code F-1 ahead 3 @ E4}, {@code S1 out 5 @ E6}, {@code E9/P/4 rear}, {@code E9/P/4}; a
     * fiber where its cable enters no enclosure: {@code F-1 start 3}, {@code F-1 end 3}.
     */
    public String anywhere(long key) {
        int owner = EndKey.owner(key);
        return switch (EndKey.kind(key)) {
            case BACK, AHEAD ->
                records.findPassAt(owner)
                        .map(pass -> end(key) + " @ " + enclosure(pass.enclosure()))
                        .orElseGet(() -> bare(key));
            case IN, OUT -> {
                Splitter splitter = records.splitters().get(owner);
                yield end(key) + " @ " + enclosure(splitter.enclosure());
            }
            case REAR -> end(key) + " rear";
            case FRONT -> end(key);
        };
    }

    /** The bare end of a cable: {@code F-1 start 3} on its first row, else {@code F-1 end 3}. */
    public String bare(long key) {
        RunRow row = records.runRows().get(EndKey.owner(key));
        String side = EndKey.kind(key) == LegKind.AHEAD ? " start " : " end ";
        return records.cables().get(row.cable()).code() + side + EndKey.number(key);
    }

    /** A port: {@code E1/P/1}. */
    public String port(int panel, int number) {
        return panel(panel) + "/" + number;
    }

    /** Ports: {@code E1/P/1-12}. */
    public String ports(int panel, FiberRange numbers) {
        return panel(panel) + "/" + numbers;
    }

    /** A fiber: {@code F-1:3}. */
    public String fiber(int cable, int number) {
        return records.cables().get(cable).code() + ":" + number;
    }
}
