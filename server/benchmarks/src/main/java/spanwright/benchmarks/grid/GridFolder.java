package spanwright.benchmarks.grid;

import java.io.BufferedWriter;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Function;
import spanwright.circuits.Circuit;
import spanwright.circuits.PortRange;
import spanwright.journal.Recorded;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.Enclosure;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.records.Records;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** Writes a grid plant as two records folders: all but its joints, and its joints. */
public final class GridFolder {

    private final Records records;

    /** A writer of these records, which came from a {@link GridPlant}. */
    public GridFolder(Records records) {
        this.records = records;
    }

    /** Writes the plant and the circuits. */
    public void plant(Path folder) throws IOException {
        Files.createDirectories(folder);
        write(
                folder,
                "structures",
                "structure,kind,lon,lat",
                records.structures().list().toList(),
                GridFolder::row);
        write(
                folder,
                "spans",
                "span,from,to,placement,length_m",
                records.spans().list().toList(),
                this::row);
        write(
                folder,
                "cable_types",
                "cable_type,fibers,fibers_per_tube,fiber_type,overlength_pct",
                records.cableTypes().list().toList(),
                GridFolder::row);
        write(folder, "cables", "cable,cable_type", records.cables().list().toList(), this::row);
        write(
                folder,
                "cable_runs",
                "cable,seq,structure,span,slack_m",
                records.runRows().list().toList(),
                this::row);
        equipment(folder);
    }

    private void equipment(Path folder) throws IOException {
        write(
                folder,
                "enclosures",
                "enclosure,structure,kind,tray_glass_m",
                records.enclosures().list().toList(),
                this::row);
        write(
                folder,
                "enclosure_cables",
                "enclosure,cable",
                records.passes().list().toList(),
                this::row);
        write(
                folder,
                "splitters",
                "enclosure,splitter,outputs",
                records.splitters().list().toList(),
                this::row);
        write(folder, "panels", "enclosure,panel,ports", records.panels().list().toList(), this::row);
        write(folder, "circuits", "circuit,a,z", records.circuits().list().toList(), this::row);
    }

    /**
     * Writes the joints.
     *
     * @param single true for a row a joint, false for rows of ranges as crews write them
     */
    public void joints(Path folder, boolean single) throws IOException {
        Files.createDirectories(folder);
        try (BufferedWriter splices = Files.newBufferedWriter(folder.resolve("splices.csv"));
                BufferedWriter terminations = Files.newBufferedWriter(folder.resolve("terminations.csv"))) {
            splices.write("enclosure,tray,a,b\n");
            terminations.write("enclosure,panel,ports,end\n");
            for (Joint joint : (Iterable<Joint>) records.joints().list()::iterator) {
                for (int index = 0; index < (single ? joint.count() : 1); index++) {
                    write(joint, single ? index : -1, splices, terminations);
                }
            }
        }
    }

    private void write(Joint joint, int index, BufferedWriter splices, BufferedWriter terminations) throws IOException {
        String enclosure = enclosure(joint.enclosure());
        if (joint.type() == JointKind.SPLICE) {
            splices.write(enclosure + ",," + side(joint.a(), index) + "," + side(joint.b(), index) + "\n");
        } else {
            String direct = enclosure + ",P," + numbers(joint.a(), index) + "," + side(joint.b(), index) + "\n";
            terminations.write(direct);
        }
    }

    private static String numbers(EndRange side, int index) {
        return index < 0
                ? side.numbers().toString()
                : Integer.toString(side.numbers().at(index));
    }

    private String side(EndRange side, int index) {
        int owner = side.leg().owner();
        return switch (side.leg().kind()) {
            case BACK -> cable(owner) + " back " + numbers(side, index);
            case AHEAD -> cable(owner) + " ahead " + numbers(side, index);
            case IN -> records.splitters().get(owner).code() + " in";
            case OUT -> records.splitters().get(owner).code() + " out " + numbers(side, index);
            case REAR, FRONT -> throw new IllegalStateException("a port is no side of a splice");
        };
    }

    private String cable(int runRow) {
        return records.cables().get(records.runRows().get(runRow).cable()).code();
    }

    private static <T extends Recorded> void write(
            Path folder, String table, String header, List<T> list, Function<T, String> row) throws IOException {
        try (BufferedWriter file = Files.newBufferedWriter(folder.resolve(table + ".csv"))) {
            file.write(header + "\n");
            for (T one : list) {
                file.write(row.apply(one) + "\n");
            }
        }
    }

    private static String row(Structure one) {
        return one.code() + ",handhole," + one.position().lon() + ","
                + one.position().lat();
    }

    private String row(Span one) {
        return one.code() + "," + structure(one.from()) + "," + structure(one.to()) + ",duct,200";
    }

    private static String row(CableType one) {
        return one.code() + "," + one.fibers() + ",12,G.652.D,1";
    }

    private String row(Cable one) {
        return one.code() + "," + records.cableTypes().get(one.cableType()).code();
    }

    private String row(RunRow one) {
        Integer span = one.span();
        return records.cables().get(one.cable()).code() + "," + one.seq() + "," + structure(one.structure()) + ","
                + (span == null ? "" : records.spans().get(span).code()) + ",10";
    }

    private String row(Enclosure one) {
        return one.code() + "," + structure(one.structure()) + ",closure,1";
    }

    private String row(Pass one) {
        return enclosure(one.enclosure()) + ","
                + records.cables().get(one.cable()).code();
    }

    private String row(Splitter one) {
        return enclosure(one.enclosure()) + "," + one.code() + ",32";
    }

    private String row(Panel one) {
        return enclosure(one.enclosure()) + ",P," + one.ports();
    }

    private String row(Circuit one) {
        return one.code() + "," + port(one.a()) + "," + port(one.z());
    }

    private String port(PortRange ports) {
        return enclosure(records.panels().get(ports.panel()).enclosure()) + "/P/" + ports.ports();
    }

    private String structure(int id) {
        return records.structures().get(id).code();
    }

    private String enclosure(int id) {
        return records.enclosures().get(id).code();
    }
}
