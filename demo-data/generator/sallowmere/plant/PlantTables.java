package sallowmere.plant;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.TreeSet;
import sallowmere.folder.Figures;
import sallowmere.folder.Table;
import sallowmere.geo.Frame;
import sallowmere.geo.Point;

/** The plant as the records tell it, with the faults that the demo plants in it. */
public final class PlantTables {
    /** A cable whose marks were read in metres and written down as feet. */
    public static final String METRES_AS_FEET = "DST-05B";

    /** A coil that the records hold and the handhole does not. */
    public static final String GONE_COIL = "HH-S056";

    /** A cable re-marked in yellow. */
    public static final String REMARKED = "FDR-N-3";

    // The white number of the re-marked cable is lower by this than the yellow one at the same place.
    private static final double WHITE_BELOW_YELLOW = 160;
    private static final int JOINT_USE_POLES = 1_500;
    private static final double UNKNOWN_SLACK = 0.06;

    private final Plant plant;
    private final Random random;

    private PlantTables(Plant plant, Random random) {
        this.plant = plant;
        this.random = random;
    }

    /**
     * All tables of the plant.
     *
     * @param mixed code of the structure where the white mark was written down as yellow
     */
    public static List<Table> of(Plant plant, String mixed, Random random) {
        PlantTables tables = new PlantTables(plant, random);
        return List.of(
                tables.structures(), tables.spans(), types(), tables.cables(), tables.runs(), tables.marks(mixed));
    }

    private Table structures() {
        Table table = new Table(
                "structures.csv",
                "structure",
                "kind",
                "lon",
                "lat",
                "accuracy_m",
                "address",
                "state",
                "shared_risk",
                "note");
        long poles =
                plant.structures().stream().filter(s -> s.kind().equals("pole")).count();
        int seen = 0;
        for (Structure structure : plant.structures()) {
            String note = structure.note();
            if (structure.kind().equals("pole")) {
                boolean joint = seen * JOINT_USE_POLES / poles != (seen + 1) * JOINT_USE_POLES / poles;
                seen++;
                note = joint ? "joint use" : "";
            }
            int draw = random.nextInt(10);
            table.add(
                    structure.code(),
                    structure.kind(),
                    Frame.degrees(Frame.lon(structure.at())),
                    Frame.degrees(Frame.lat(structure.at())),
                    draw < 5 ? "1" : draw < 8 ? "3" : draw < 9 ? "10" : "",
                    structure.address(),
                    "",
                    structure.risk(),
                    note);
        }
        return table;
    }

    private Table spans() {
        Table table = new Table(
                "spans.csv", "span", "from", "to", "placement", "length_m", "line", "state", "shared_risk", "note");
        for (Span span : plant.spans()) {
            table.add(
                    span.code(),
                    span.from().code(),
                    span.to().code(),
                    span.placement(),
                    "",
                    line(span),
                    "",
                    span.risk(),
                    "");
        }
        return table;
    }

    private static String line(Span span) {
        if (span.bends().isEmpty()) {
            return "";
        }
        List<String> places = new ArrayList<>(List.of(Frame.lonLat(span.from().at())));
        for (Point bend : span.bends()) {
            places.add(Frame.lonLat(bend));
        }
        places.add(Frame.lonLat(span.to().at()));
        return "LINESTRING (" + String.join(", ", places) + ")";
    }

    private static Table types() {
        Table table = new Table(
                "cable_types.csv",
                "cable_type",
                "fibers",
                "fibers_per_tube",
                "fiber_type",
                "overlength_pct",
                "ribbon",
                "fibers_per_ribbon",
                "colors");
        for (CableType type : CableType.values()) {
            table.add(
                    type.code(),
                    type.fibers(),
                    12,
                    "G.652.D",
                    Figures.decimal(type.overlength(), 2),
                    type.ribbon() ? "yes" : "no",
                    type.ribbon() ? "12" : "",
                    "TIA-598");
        }
        return table;
    }

    private Table cables() {
        Table table = new Table(
                "cables.csv",
                "cable",
                "cable_type",
                "part_of",
                "marks_ink",
                "overlength_pct",
                "reel",
                "installed_on",
                "state",
                "note");
        int reel = 40_113;
        for (Cable cable : plant.cables()) {
            reel += 17;
            String own = cable.overlength() == null ? "" : Figures.decimal(cable.overlength(), 2);
            table.add(
                    cable.code(),
                    cable.type().code(),
                    cable.partOf(),
                    cable.marking().ink(),
                    own,
                    "R-" + reel,
                    cable.installed(),
                    "",
                    cable.code().equals(REMARKED) ? "re-marked in yellow by its maker" : "");
        }
        return table;
    }

    private Table runs() {
        Table table = new Table(
                "cable_runs.csv", "cable", "seq", "structure", "span", "slack_m", "slack_trust", "slack_on", "duct");
        int coils = 0;
        for (Cable cable : plant.cables()) {
            for (int seq = 0; seq < cable.rows().size(); seq++) {
                Row row = cable.rows().get(seq);
                boolean gone = row.structure().code().equals(GONE_COIL);
                double slack = gone ? 30.48 : row.slack();
                String trust = "";
                if (slack > 0) {
                    boolean unknown = (int) (coils * UNKNOWN_SLACK) != (int) ((coils + 1) * UNKNOWN_SLACK);
                    trust = gone ? "reported" : unknown ? "unknown" : "posted";
                    coils++;
                }
                table.add(
                        cable.code(),
                        seq,
                        row.structure().code(),
                        row.span() == null ? "" : row.span().code(),
                        Figures.decimalOrBlank(slack, 3),
                        trust,
                        slack > 0 && !trust.equals("unknown") ? cable.installed() : "",
                        row.span() != null && row.span().placement().equals("duct") ? "D1" : "");
            }
        }
        return table;
    }

    private Table marks(String mixed) {
        Table table =
                new Table("sheath_marks.csv", "cable", "seq", "ink", "unit", "mark_in", "mark_out", "read_on", "trust");
        for (Cable cable : plant.cables()) {
            TreeSet<Integer> rows = new TreeSet<>(cable.reads());
            rows.add(cable.rows().size() - 1);
            if (!cable.partOf().isEmpty()) {
                addNeighbours(cable, mixed, rows);
            }
            for (int seq : rows) {
                boolean wrong = cable.code().equals(REMARKED)
                        && cable.rows().get(seq).structure().code().equals(mixed);
                Marking governing = cable.marking();
                Marking numbers = wrong ? below(governing) : governing;
                if (cable.code().equals(METRES_AS_FEET)) {
                    numbers = new Marking(governing.ink(), "m", governing.first(), governing.rising());
                }
                mark(table, cable, seq, numbers, governing.ink(), governing.unit());
                if (cable.code().equals(REMARKED) && seq % 31 == 0) {
                    mark(table, cable, seq, below(governing), "white", governing.unit());
                }
            }
        }
        return table;
    }

    /** The coils of a trunk, and the poles either side of the mixed-up mark. */
    private static void addNeighbours(Cable cable, String mixed, TreeSet<Integer> rows) {
        for (int seq = 0; seq < cable.rows().size(); seq++) {
            Row row = cable.rows().get(seq);
            if (row.slack() > 0) {
                rows.add(seq);
            }
            if (cable.code().equals(REMARKED) && row.structure().code().equals(mixed)) {
                rows.addAll(List.of(seq - 1, seq + 1));
            }
        }
    }

    private static Marking below(Marking yellow) {
        return new Marking("white", yellow.unit(), yellow.first() - WHITE_BELOW_YELLOW, yellow.rising());
    }

    private static void mark(Table table, Cable cable, int seq, Marking numbers, String ink, String unit) {
        Row row = cable.rows().get(seq);
        boolean last = seq == cable.rows().size() - 1;
        String in = Figures.decimal(numbers.at(row.arrive()), 1);
        String out = Figures.decimal(numbers.at(row.leave()), 1);
        table.add(cable.code(), seq, ink, unit, in, last && row.slack() == 0 ? "" : out, cable.installed(), "posted");
    }
}
