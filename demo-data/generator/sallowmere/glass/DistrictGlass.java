package sallowmere.glass;

import java.util.List;
import java.util.Map;
import sallowmere.plant.Cable;
import sallowmere.town.District;
import sallowmere.town.TerminalSite;

/** What lies in a district's tap closure, its cabinet and its terminals. */
public final class DistrictGlass {
    /** Closures of the taps, by number of the cabinet. */
    private static final Map<Integer, String> TAPS = Map.ofEntries(
            Map.entry(1, "C-N01"),
            Map.entry(2, "C-N03"),
            Map.entry(3, "C-N04"),
            Map.entry(4, "C-N06"),
            Map.entry(5, "C-N08"),
            Map.entry(6, "C-N10"),
            Map.entry(7, "C-S01"),
            Map.entry(8, "C-S02"),
            Map.entry(9, "C-S04"),
            Map.entry(10, "C-S05"),
            Map.entry(11, "C-S06"),
            Map.entry(12, "C-S07"));

    private static final int CROSSED_CABINET = 3;

    private final District district;
    private final Glasswork glass;
    private final String cabinet;

    private DistrictGlass(District district, Glasswork glass) {
        this.district = district;
        this.glass = glass;
        this.cabinet = district.cabinet().code();
    }

    /** Fills the enclosures of a district. */
    public static void fill(District district, TakeUp takeUp, Glasswork glass) {
        DistrictGlass filler = new DistrictGlass(district, glass);
        filler.tap();
        filler.lateralInCabinet();
        filler.splitters();
        filler.distribution();
        district.terminals().forEach(terminal -> filler.terminal(terminal, takeUp.usedPorts(terminal)));
        takeUp.subscriptions().forEach(filler::patch);
    }

    /** The closure in which a cabinet's lateral leaves the feeder. */
    public static String tapOf(District district) {
        return TAPS.get(district.plan().cabinet());
    }

    /** The port of the outputs' panel on which an output of a splitter lies, as the records have it. */
    public static int portOf(District district, int splitter, int output) {
        int start = (splitter - 1) * 32;
        if (district.plan().cabinet() == CROSSED_CABINET && splitter == 2) {
            return start
                    + (output >= 9 && output <= 16 ? output + 8 : output >= 17 && output <= 24 ? output - 8 : output);
        }
        return start + output;
    }

    /** The port of the distribution panel on which a fiber of a distribution cable lies. */
    public static int portOf(District district, Cable cable, int fiber) {
        return district.distribution().indexOf(cable) * 96 + fiber;
    }

    /** The feeder's tube is cut: its glass from the headend goes to the lateral, the rest of it is capped. */
    private void tap() {
        String closure = tapOf(district);
        Cable feeder = district.trunk().reelAt(district.tap());
        Cable lateral = district.lateral();
        int first = district.tube() * 12 - 11;
        glass.enclosure(closure, district.tap(), "closure", 1.5, "ring-cut tap of " + cabinet);
        glass.pass(closure, feeder, feeder.seqAt(district.tap()));
        glass.pass(closure, lateral, 0);
        feeder.readAt(feeder.seqAt(district.tap()));
        glass.splice(closure, 1, Ends.back(feeder, first, first + 11), Ends.ahead(lateral, 1, 12), lateral.installed());
        glass.state(closure, Ends.ahead(feeder, first, first + 11), "capped");
        glass.state(closure, Ends.ahead(lateral, 13, 24), "capped");
    }

    private void lateralInCabinet() {
        Cable lateral = district.lateral();
        int splitters = district.splitters();
        glass.enclosure(cabinet, district.cabinet(), "cabinet", 1.5, "");
        glass.pass(cabinet, lateral, lateral.rows().size() - 1);
        glass.panel(cabinet, "FP", 12, "SC/APC");
        for (int i = 1; i <= splitters; i++) {
            String splitter = "S" + i;
            glass.splitter(cabinet, splitter);
            glass.splice(cabinet, 1, Ends.back(lateral, i, i), Ends.input(splitter), lateral.installed());
        }
        glass.pigtails(cabinet, "FP", splitters + 1, Ends.back(lateral, splitters + 1, 12));
        glass.state(cabinet, Ends.back(lateral, 13, 24), "stored");
    }

    private void splitters() {
        glass.panel(cabinet, "SO", district.splitters() * 32, "SC/APC");
        for (int i = 1; i <= district.splitters(); i++) {
            int port = (i - 1) * 32 + 1;
            if (portOf(district, i, 9) == port + 8) {
                glass.leads(cabinet, "SO", port, Ends.outputs("S" + i, 1, 32));
                continue;
            }
            glass.leads(cabinet, "SO", port, Ends.outputs("S" + i, 1, 8));
            glass.leads(cabinet, "SO", port + 8, Ends.outputs("S" + i, 17, 24));
            glass.leads(cabinet, "SO", port + 16, Ends.outputs("S" + i, 9, 16));
            glass.leads(cabinet, "SO", port + 24, Ends.outputs("S" + i, 25, 32));
        }
    }

    private void distribution() {
        glass.panel(cabinet, "DP", 240, "SC/APC");
        for (Cable cable : district.distribution()) {
            glass.pass(cabinet, cable, 0);
            for (int first = 1; first <= cable.type().fibers(); first += 12) {
                int port = portOf(district, cable, first);
                glass.pigtails(cabinet, "DP", port, Ends.ahead(cable, first, first + 11));
            }
        }
    }

    /** A terminal: fibers of subscribers cut and brought to ports, what goes on of them capped, the others uncut. */
    private void terminal(TerminalSite site, List<Integer> used) {
        Cable cable = site.cable();
        boolean last = site.seq() == cable.rows().size() - 1;
        int tubes = (site.firstFiber() + 11) / 12;
        String bare = site.ports() == 12 ? "" + tubes : tubes + "-" + (tubes + 1);
        glass.enclosure(site.code(), cable.rows().get(site.seq()).structure(), "terminal", 0.5, "");
        glass.pass(site.code(), cable, site.seq(), last ? "" : bare);
        glass.panel(site.code(), "D", site.ports(), "SC/APC");
        for (int[] run : Runs.of(used)) {
            int first = site.firstFiber() + run[0] - 1;
            int end = site.firstFiber() + run[1] - 1;
            glass.pigtails(site.code(), "D", run[0], Ends.back(cable, first, end));
            if (!last) {
                glass.state(site.code(), Ends.ahead(cable, first, end), "capped");
            }
        }
        for (int[] run : Runs.missing(used, site.ports())) {
            int first = site.firstFiber() + run[0] - 1;
            int end = site.firstFiber() + run[1] - 1;
            glass.state(site.code(), Ends.back(cable, first, end), last ? "stored" : "through");
            if (!last) {
                glass.state(site.code(), Ends.ahead(cable, first, end), "through");
            }
        }
        if (last && site.firstFiber() > 1) {
            glass.state(site.code(), Ends.back(cable, 1, site.firstFiber() - 1), "stored");
        }
    }

    private void patch(Subscription subscription) {
        TerminalSite site = subscription.terminal();
        int fiber = site.firstFiber() + subscription.port() - 1;
        glass.jumper(
                cabinet + "/SO/" + portOf(district, subscription.splitter(), subscription.output()),
                cabinet + "/DP/" + portOf(district, site.cable(), fiber),
                "");
    }
}
