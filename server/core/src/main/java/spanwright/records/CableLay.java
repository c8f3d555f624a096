package spanwright.records;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.Enclosure;
import spanwright.plant.LengthBasis;
import spanwright.plant.PlantState;
import spanwright.plant.RouteLength;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;
import spanwright.plant.SheathPositions;
import spanwright.plant.SheathTie;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.quantity.Length;

/**
 * How one cable lies: its run, the spans it travels in the direction of the run, and its sheath positions. Rows are
 * named by their index from 0, which is their seq. Immutable; made once and read often.
 */
public final class CableLay {

    private final Cable cable;
    private final CableType type;
    private final List<RunRow> rows;
    private final List<Structure> structures;
    /** The span that leads to each row but row 0, at index row - 1, in the direction of the run. */
    private final List<RouteLength> routes;

    private final List<@Nullable Enclosure> enclosures;
    private final SheathPositions positions;
    private final long[] routeTo;
    private final Map<Integer, Integer> indexOfRow = new HashMap<>();

    private CableLay(RecordsView records, Cable cable) {
        this.cable = cable;
        this.type = records.cableTypes().get(cable.cableType());
        this.rows = List.copyOf(records.runOf(cable.id()));
        this.structures = rows.stream()
                .map(row -> records.structures().get(row.structure()))
                .toList();
        this.enclosures = rows.stream().map(row -> inService(records, row)).toList();
        this.routes = routes(records);
        this.routeTo = new long[rows.size()];
        for (int row = 1; row < rows.size(); row++) {
            routeTo[row] = routeTo[row - 1] + routes.get(row - 1).length().micrometres();
        }
        for (int row = 0; row < rows.size(); row++) {
            indexOfRow.put(rows.get(row).id(), row);
        }
        this.positions = SheathPositions.of(
                rows.stream().map(RunRow::slack).toList(),
                routes.stream().map(RouteLength::length).toList(),
                ties(records));
    }

    /**
     * The lay of a cable that has a run.
     *
     * @param cable identity of the cable
     */
    public static CableLay of(RecordsView records, int cable) {
        return new CableLay(records, records.cables().get(cable));
    }

    private static @Nullable Enclosure inService(RecordsView records, RunRow row) {
        return records.findPassAt(row.id())
                .map(pass -> records.enclosures().get(pass.enclosure()))
                .filter(enclosure -> enclosure.state() == PlantState.IN_SERVICE)
                .orElse(null);
    }

    private List<RouteLength> routes(RecordsView records) {
        List<RouteLength> list = new ArrayList<>();
        for (int row = 1; row < rows.size(); row++) {
            Integer id = rows.get(row).span();
            if (id == null) {
                throw new IllegalStateException("no span leads to row " + row + " of " + cable.code());
            }
            Span span = records.spans().get(id);
            RouteLength route = RouteLength.of(
                    span,
                    records.structures().get(span.from()).position(),
                    records.structures().get(span.to()).position());
            list.add(span.to() == rows.get(row).structure() ? route : route.reversed());
        }
        return List.copyOf(list);
    }

    private List<SheathTie> ties(RecordsView records) {
        List<SheathTie> ties = new ArrayList<>();
        for (int row = 0; row < rows.size(); row++) {
            int index = row;
            records.sheathMarks()
                    .owned(Relation.RUN_ROW_MARKS, rows.get(row).id())
                    .filter(mark -> mark.ink().equals(cable.marksInk()))
                    .forEach(mark -> addTies(ties, index, mark));
        }
        return ties;
    }

    private static void addTies(List<SheathTie> ties, int row, SheathMark mark) {
        if (mark.markIn() != null) {
            ties.add(new SheathTie(row, false, mark.markIn(), mark.unit(), mark.readOn()));
        }
        if (mark.markOut() != null) {
            ties.add(new SheathTie(row, true, mark.markOut(), mark.unit(), mark.readOn()));
        }
    }

    /** The cable. */
    public Cable cable() {
        return cable;
    }

    /** Its type. */
    public CableType type() {
        return type;
    }

    /** Its run, row 0 first. */
    public List<RunRow> rows() {
        return rows;
    }

    /** The index of a run row by its identity; a row of another cable is a bug. */
    public int index(int runRow) {
        Integer index = indexOfRow.get(runRow);
        if (index == null) {
            throw new IllegalArgumentException("not a run row of " + cable.code() + ": " + runRow);
        }
        return index;
    }

    /** The structure at a row. */
    public Structure structure(int row) {
        return structures.get(row);
    }

    /** The enclosure in service that the cable enters at a row, if any. */
    public Optional<Enclosure> findEnclosure(int row) {
        return Optional.ofNullable(enclosures.get(row));
    }

    /** The span that leads to a row from the one before, in the direction of the run; of row 0 there is none. */
    public RouteLength route(int row) {
        return routes.get(row - 1);
    }

    /** Route length from row 0 to a row, coils apart. */
    public Length routeTo(int row) {
        return new Length(routeTo[row]);
    }

    /** Its sheath positions. */
    public SheathPositions positions() {
        return positions;
    }

    /** What the sheath between the enclosures' places at two rows, either way round, rests on. */
    public LengthBasis basis(int oneRow, int otherRow) {
        return positions.basis(
                positions.enclosure(Math.min(oneRow, otherRow)), positions.enclosure(Math.max(oneRow, otherRow)));
    }

    /** Where that length comes from, for a person: {@code White marks 24220 ft and 20281 ft, read 2025-09-30}. */
    public String source(int oneRow, int otherRow) {
        Optional<SheathTie> from = positions.findTieBefore(positions.enclosure(Math.min(oneRow, otherRow)));
        Optional<SheathTie> to = positions.findTieAfter(positions.enclosure(Math.max(oneRow, otherRow)));
        if (from.isEmpty() || to.isEmpty() || basis(oneRow, otherRow) != LengthBasis.MARKS) {
            return "Route lengths and coils; no sheath marks on both sides";
        }
        String read = Stream.of(from.get(), to.get())
                .map(SheathTie::readOn)
                .filter(Objects::nonNull)
                .distinct()
                .map(LocalDate::toString)
                .collect(Collectors.joining(" and "));
        String ink = cable.marksInk();
        return ink.substring(0, 1).toUpperCase(Locale.ROOT) + ink.substring(1) + " marks " + printed(from.get())
                + " and " + printed(to.get()) + (read.isEmpty() ? "" : ", read " + read);
    }

    private static String printed(SheathTie tie) {
        return tie.number().toPlainString() + " " + tie.unit().symbol();
    }

    /** Excess length in per cent: this reel's own, else its type's. */
    public double overlengthPct() {
        Double own = cable.overlengthPct();
        return own == null ? type.overlengthPct() : own;
    }

    /** The glass in a length of sheath, tray glass apart; rounded half-even to the micrometre. */
    public Length glass(Length sheath) {
        BigDecimal factor = BigDecimal.valueOf(overlengthPct()).movePointLeft(2).add(BigDecimal.ONE);
        return Length.ofMetres(sheath.exactMetres().multiply(factor));
    }
}
