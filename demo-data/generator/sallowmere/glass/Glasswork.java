package sallowmere.glass;

import java.util.List;
import java.util.Random;
import sallowmere.folder.Figures;
import sallowmere.folder.Table;
import sallowmere.plant.Cable;
import sallowmere.plant.Structure;

/** Gathers the rows of everything in enclosures: passes, splices, panels, terminations, states, jumpers. */
public final class Glasswork {
    private final Table enclosures =
            new Table("enclosures.csv", "enclosure", "structure", "kind", "tray_glass_m", "state", "note");
    private final Table passes =
            new Table("enclosure_cables.csv", "enclosure", "cable", "seq", "opened", "tubes_opened");
    private final Table splitters = new Table("splitters.csv", "enclosure", "splitter", "inputs", "outputs", "loss_db");
    private final Table splices = new Table(
            "splices.csv",
            "enclosure",
            "tray",
            "a",
            "b",
            "method",
            "loss_db",
            "trust",
            "verified_on",
            "spliced_on",
            "spliced_by",
            "temporary_until",
            "job");
    private final Table panels = new Table("panels.csv", "enclosure", "panel", "ports", "connector");
    private final Table terminations = new Table(
            "terminations.csv",
            "enclosure",
            "panel",
            "ports",
            "end",
            "method",
            "loss_db",
            "trust",
            "verified_on",
            "job");
    private final Table endStates = new Table("end_states.csv", "enclosure", "end", "state", "trust", "verified_on");
    private final Table jumpers = new Table("jumpers.csv", "a", "b", "length_m");
    private final TrustDealer dealer;
    private final Random random;

    /** Starts empty. */
    public Glasswork(Random random) {
        this.random = random;
        this.dealer = new TrustDealer(random);
    }

    /** Adds an enclosure at a structure, with the metres of glass between sheath and joint. */
    public void enclosure(String code, Structure structure, String kind, double tray, String note) {
        enclosures.add(code, structure.code(), kind, Figures.decimal(tray, 2), "", note);
    }

    /** Puts a run row of a cable into an enclosure. */
    public void pass(String enclosure, Cable cable, int seq) {
        passes.add(enclosure, cable.code(), seq, "", "");
    }

    /** Puts a run row of a cable into an enclosure, tubes laid bare there. */
    public void pass(String enclosure, Cable cable, int seq, String tubes) {
        passes.add(enclosure, cable.code(), seq, "", tubes);
    }

    /** Adds a splitter 1 to 32. */
    public void splitter(String enclosure, String splitter) {
        splitters.add(enclosure, splitter, 1, 32, "");
    }

    /** Adds a panel. */
    public void panel(String enclosure, String panel, int ports, String connector) {
        panels.add(enclosure, panel, ports, connector);
    }

    /** Joins ends in a tray, with the trust that is due. */
    public void splice(String enclosure, int tray, Ends a, Ends b, String splicedOn) {
        splice(enclosure, tray, a, b, splicedOn, dealer.deal(a.count()));
    }

    /** Joins ends in a tray, with the trust that the story gives. */
    public void spliceTrusted(String enclosure, int tray, Ends a, Ends b, String splicedOn, Trust trust) {
        dealer.count(trust, a.count());
        splice(enclosure, tray, a, b, splicedOn, trust);
    }

    /** Joins ends in a tray, tested since; the draws are those of any other row, so that no other row changes. */
    public void spliceTested(String enclosure, int tray, Ends a, Ends b, String splicedOn, String testedOn) {
        dealer.deal(a.count());
        splice(enclosure, tray, a, b, splicedOn, Trust.VERIFIED, testedOn);
    }

    private void splice(String enclosure, int tray, Ends a, Ends b, String splicedOn, Trust trust) {
        splice(enclosure, tray, a, b, splicedOn, trust, verifiedOn(trust));
    }

    private void splice(String enclosure, int tray, Ends a, Ends b, String splicedOn, Trust trust, String verified) {
        boolean known = trust != Trust.UNKNOWN;
        splices.add(
                enclosure,
                tray,
                a.text(),
                b.text(),
                "",
                "",
                trust.word(),
                verified,
                known ? splicedOn : "",
                known && trust != Trust.REPORTED ? "crew " + (1 + random.nextInt(6)) : "",
                "",
                "");
    }

    /** Brings ends to the rears of ports by pigtails, with the trust that is due. */
    public void pigtails(String enclosure, String panel, int firstPort, Ends ends) {
        pigtails(enclosure, panel, firstPort, ends, dealer.deal(ends.count()));
    }

    /** Brings ends to the rears of ports by pigtails, with the trust that the story gives. */
    public void pigtailsTrusted(String enclosure, String panel, int firstPort, Ends ends, Trust trust) {
        dealer.count(trust, ends.count());
        pigtails(enclosure, panel, firstPort, ends, trust);
    }

    /** Brings ends to the rears of ports by pigtails, tested since; the draws are those of any other row. */
    public void pigtailsTested(String enclosure, String panel, int firstPort, Ends ends, String testedOn) {
        dealer.deal(ends.count());
        pigtails(enclosure, panel, firstPort, ends, Trust.VERIFIED, testedOn);
    }

    private void pigtails(String enclosure, String panel, int firstPort, Ends ends, Trust trust) {
        pigtails(enclosure, panel, firstPort, ends, trust, verifiedOn(trust));
    }

    private void pigtails(
            String enclosure, String panel, int firstPort, Ends ends, Trust trust, String verified) {
        String ports = Figures.range(firstPort, firstPort + ends.count() - 1);
        terminations.add(enclosure, panel, ports, ends.text(), "pigtail", "", trust.word(), verified, "");
    }

    /** Brings a splitter's own leads to the rears of ports. */
    public void leads(String enclosure, String panel, int firstPort, Ends ends) {
        String ports = Figures.range(firstPort, firstPort + ends.count() - 1);
        terminations.add(enclosure, panel, ports, ends.text(), "direct", "", "posted", "", "");
    }

    /** Notes a termination that a sheet reports and nobody has posted yet. */
    public void plannedPigtails(String enclosure, String panel, int firstPort, Ends ends, String job) {
        String ports = Figures.range(firstPort, firstPort + ends.count() - 1);
        terminations.add(enclosure, panel, ports, ends.text(), "pigtail", "", "planned", "", job);
    }

    /** Says what became of ends that no joint uses. */
    public void state(String enclosure, Ends ends, String state) {
        boolean known = !state.equals("unknown");
        endStates.add(enclosure, ends.text(), state, known ? "posted" : "unknown", "");
    }

    /** Patches one front to another of the same structure. */
    public void jumper(String a, String b, String metres) {
        jumpers.add(a, b, metres);
    }

    private String verifiedOn(Trust trust) {
        if (trust != Trust.VERIFIED) {
            return "";
        }
        return "202" + (4 + random.nextInt(3)) + Figures.code("-", 1 + random.nextInt(9), 2)
                + Figures.code("-", 1 + random.nextInt(28), 2);
    }

    /** The tables, to be written. */
    public List<Table> tables() {
        return List.of(enclosures, passes, splitters, splices, panels, terminations, endStates, jumpers);
    }
}
