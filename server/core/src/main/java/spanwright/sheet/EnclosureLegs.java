package spanwright.sheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.FiberColors;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.records.Catalogue;
import spanwright.records.RecordsView;
import spanwright.records.Relation;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Splitter;

/** The legs of an enclosure by cable, then back before ahead; of a ring the back that enters and the ahead that leaves. */
public final class EnclosureLegs {

    private static final String USUAL_COLORS = "TIA-598";

    private final RecordsView records;
    private final int enclosure;
    private final List<CableLeg> legs = new ArrayList<>();

    /**
     * The legs as the records have them.
     *
     * @param enclosure identity of the enclosure
     */
    public EnclosureLegs(RecordsView records, int enclosure) {
        this.records = records;
        this.enclosure = enclosure;
        records.passes().owned(Relation.ENCLOSURE_PASSES, enclosure).forEach(this::add);
        legs.sort(Comparator.comparing((CableLeg leg) -> leg.cable().code())
                .thenComparing(leg -> leg.leg().kind()));
    }

    private void add(Pass pass) {
        Cable cable = records.cables().get(pass.cable());
        CableType type = records.cableTypes().get(cable.cableType());
        Catalogue catalogue = new Catalogue(records);
        FiberColors colors = catalogue
                .findColors(type.colors())
                .or(() -> catalogue.findColors(USUAL_COLORS))
                .orElseThrow();
        List<RunRow> run = records.runOf(cable.id());
        RunRow row = records.runRows().get(pass.runRow());
        int at = run.indexOf(row);
        boolean middle = at > 0 && at < run.size() - 1;
        if (at > 0) {
            add(new Leg(LegKind.BACK, row.id()), cable, type, colors, row, run.get(at - 1), middle);
        }
        if (at < run.size() - 1) {
            add(new Leg(LegKind.AHEAD, row.id()), cable, type, colors, row, run.get(at + 1), middle);
        }
    }

    private void add(
            Leg leg, Cable cable, CableType type, FiberColors colors, RunRow row, RunRow next, boolean middle) {
        legs.add(
                new CableLeg(leg, cable, type, colors, row, records.structures().get(next.structure()), middle));
    }

    /** All of them. */
    public List<CableLeg> list() {
        return List.copyOf(legs);
    }

    /** The leg of a cable in one direction, if it is there. */
    public Optional<CableLeg> find(String cable, LegKind direction) {
        return legs.stream()
                .filter(leg ->
                        leg.leg().kind() == direction && leg.cable().code().equals(cable))
                .findFirst();
    }

    /** The leg whose ends these are, if it is a cable's and is here. */
    public Optional<CableLeg> find(Leg leg) {
        return legs.stream().filter(each -> each.leg().equals(leg)).findFirst();
    }

    /** The legs of one cable. */
    List<CableLeg> of(String cable) {
        return legs.stream().filter(leg -> leg.cable().code().equals(cable)).toList();
    }

    /** The splitter with a code, if it is here. */
    Optional<Splitter> findSplitter(String code) {
        return records.findSplitter(enclosure, code);
    }

    /** {@code F-1 back, toward HH-2; D-7 ahead, toward P-9}: what may be named here. */
    String words() {
        String cables = legs.stream().map(CableLeg::nameToward).collect(Collectors.joining("; "));
        String splitters = records.splitters()
                .owned(Relation.ENCLOSURE_SPLITTERS, enclosure)
                .map(splitter -> splitter.code() + " in, " + splitter.code() + " out")
                .collect(Collectors.joining("; "));
        String all = cables + (cables.isEmpty() || splitters.isEmpty() ? "" : "; ") + splitters;
        return all.isEmpty() ? "no cable and no splitter" : all;
    }

    /** The enclosure's code. */
    String code() {
        return records.enclosures().get(enclosure).code();
    }

    /** Its identity. */
    int enclosure() {
        return enclosure;
    }

    /** The records. */
    RecordsView records() {
        return records;
    }
}
