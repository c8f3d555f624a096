package spanwright.exchange;

import java.time.LocalDate;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.FiberRange;
import spanwright.plant.Trust;
import spanwright.quantity.Loss;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.SpliceMethod;

/** Rows of {@code terminations.csv}; a pigtail is one splice more, a direct termination none. */
final class TerminationRows extends Rows<Joint> {

    private static final int ENCLOSURE = Table.TERMINATIONS.column("enclosure");
    private static final int PANEL = Table.TERMINATIONS.column("panel");
    private static final int PORTS = Table.TERMINATIONS.column("ports");
    private static final int END = Table.TERMINATIONS.column("end");
    private static final int METHOD = Table.TERMINATIONS.column("method");
    private static final int LOSS = Table.TERMINATIONS.column("loss_db");
    private static final int TRUST = Table.TERMINATIONS.column("trust");
    private static final int VERIFIED_ON = Table.TERMINATIONS.column("verified_on");
    private static final int JOB = Table.TERMINATIONS.column("job");
    private static final int TEMPORARY_UNTIL = Table.TERMINATIONS.column("temporary_until");

    /** How an end comes to a port. */
    private enum Way {
        PIGTAIL("pigtail"),
        DIRECT("direct");

        private final String word;

        Way(String word) {
            this.word = word;
        }

        String word() {
            return word;
        }
    }

    private final Ends ends;
    private final Ports ports;
    private final Interned interned = new Interned();

    TerminationRows(References refs, Ends ends, Ports ports) {
        super(Table.TERMINATIONS, RecordKind.JOINT, refs);
        this.ends = ends;
        this.ports = ports;
    }

    @Override
    @Nullable
    Joint read(Row row, int id) {
        int enclosure = refs.enclosures.find(row, ENCLOSURE);
        EndRange rears = rears(row, enclosure);
        EndRange end = ends.find(row, END, enclosure);
        JointFacts facts = facts(row, end);
        if (rears == null || end == null || !SpliceRows.sameCount(row, PORTS, rears, END, end)) {
            return null;
        }
        return new Joint(id, JointKind.TERMINATION, enclosure, rears, end, facts);
    }

    private @Nullable EndRange rears(Row row, int enclosure) {
        Panel panel = enclosure == 0 || row.blank(PANEL)
                ? null
                : ports.panel(row, PANEL, enclosure, row.from(PANEL), row.to(PANEL));
        int most = panel == null ? Integer.MAX_VALUE : panel.ports();
        FiberRange numbers = row.range(PORTS, most, "ports of panel " + row.text(PANEL));
        return panel == null || numbers == null ? null : new EndRange(new Leg(LegKind.REAR, panel.id()), numbers);
    }

    private JointFacts facts(Row row, @Nullable EndRange end) {
        Way way = row.word(METHOD, Way.values(), Way::word);
        if (way == null) {
            way = end == null || ofCable(end) ? Way.PIGTAIL : Way.DIRECT;
        }
        Loss loss = SpliceRows.meanLoss(row, LOSS);
        if (way == Way.DIRECT && !row.blank(LOSS)) {
            loss = null;
            row.fault(
                    LOSS,
                    row.named(LOSS) + " on a direct termination, which has no splice; leave it blank, or make"
                            + " the method pigtail");
        }
        Trust trust = row.word(TRUST, Trust.values(), Trust::word);
        LocalDate verifiedOn = row.date(VERIFIED_ON, refs.zone());
        return interned.same(new JointFacts(
                null,
                way == Way.PIGTAIL ? SpliceMethod.FUSION : null,
                loss,
                Objects.requireNonNullElse(trust, Trust.POSTED),
                verifiedOn,
                null,
                null,
                row.date(TEMPORARY_UNTIL, refs.zone()),
                row.free(JOB),
                null));
    }

    private static boolean ofCable(EndRange end) {
        return end.leg().kind() == LegKind.BACK || end.leg().kind() == LegKind.AHEAD;
    }

    @Override
    void write(Joint joint, Cells cells) {
        JointFacts facts = joint.facts();
        cells.put(ENCLOSURE, refs.enclosure(joint.enclosure()));
        cells.put(PANEL, refs.panel(joint.a().leg().owner()));
        cells.put(PORTS, joint.a().numbers());
        cells.put(END, ends.text(joint.b()));
        cells.put(METHOD, (facts.method() == null ? Way.DIRECT : Way.PIGTAIL).word());
        cells.put(LOSS, facts.loss());
        cells.put(TRUST, facts.trust().word());
        cells.put(VERIFIED_ON, facts.verifiedOn());
        cells.put(JOB, facts.job());
        cells.put(TEMPORARY_UNTIL, facts.temporaryUntil());
    }
}
