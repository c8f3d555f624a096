package spanwright.answers;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.network.Network;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.CableValue;
import spanwright.plant.Enclosure;
import spanwright.plant.FiberValues;
import spanwright.plant.Pass;
import spanwright.plant.Position;
import spanwright.plant.RunRow;
import spanwright.plant.SheathPositions;
import spanwright.plant.Span;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.records.CableLay;
import spanwright.records.Relation;
import spanwright.splicing.FiberCount;
import spanwright.splicing.FiberFlag;

/** The document of a cable: its tubes, its run, its sections and what each fiber is used for. */
public final class CableDocument {

    private final View view;
    private final Changes changes;
    private final Cable cable;
    private final CableLay lay;
    private final SheathPositions positions;

    /** Of a cable as a view shows it. */
    public CableDocument(View view, Changes changes, Cable cable) {
        this.view = view;
        this.changes = changes;
        this.cable = cable;
        this.lay = view.lay(cable.id());
        this.positions = lay.positions();
    }

    /** Writes its members. */
    public void write(Json json) {
        CableType type = lay.type();
        Colors colors = new Colors(view, type);
        json.text("code", cable.code()).object("type", item -> type(item, type));
        json.text("part_of", cable.partOf()).text("marks_ink", cable.marksInk());
        json.number("overlength_pct", lay.overlengthPct());
        json.text("overlength_source", cable.overlengthPct() == null ? "Cable type " + type.code() : "This reel's own");
        json.text("reel", cable.reel()).date("installed_on", cable.installedOn());
        json.text("state", cable.state().word()).text("note", cable.note());
        json.metres("sheath_m", positions.length()).metres("route_m", lay.routeTo(lastRow()));
        json.metres("slack_m", coiled());
        json.text(
                "length_basis", positions.basis(Length.ZERO, positions.length()).word());
        json.list("tubes", IntStream.rangeClosed(1, type.tubes()).boxed().toList(), (item, tube) -> {
            int last = Math.min(tube * type.fibersPerTube(), type.fibers());
            item.whole("tube", tube).text("color", colors.tube(tube));
            item.text("fibers", Numbers.range((tube - 1) * type.fibersPerTube() + 1, last));
        });
        json.texts("fiber_colors", colors.places());
        json.list("rows", lay.rows(), this::row);
        json.list("line", item -> line().forEach(item::positionHere));
        json.list("sections", new SectionDocuments(view, lay)::write);
        json.list("values", values(), CableDocument::value);
        json.list("flags", flags(), this::flag);
        json.list("counts", counts(), CableDocument::count);
        changes.write(json, "changed", RecordKind.CABLE, cable.id());
        json.whole("posting", view.posting());
    }

    private int lastRow() {
        return lay.rows().size() - 1;
    }

    private Length coiled() {
        Length sum = Length.ZERO;
        for (int row = 0; row <= lastRow(); row++) {
            sum = sum.plus(positions.coil(row));
        }
        return sum;
    }

    private static void type(Json json, CableType type) {
        json.text("code", type.code()).whole("fibers", type.fibers()).whole("fibers_per_tube", type.fibersPerTube());
        json.text("fiber_type", type.fiberType()).number("overlength_pct", type.overlengthPct());
        json.flag("ribbon", type.ribbon()).whole("fibers_per_ribbon", type.fibersPerRibbon());
        json.text("colors", type.colors());
    }

    private void row(Json json, RunRow row) {
        int seq = row.seq();
        json.whole("seq", seq).text("structure", lay.structure(seq).code());
        json.text("kind", lay.structure(seq).type().word())
                .place(lay.structure(seq).position());
        Span span = row.span() == null ? null : view.records().spans().get(row.span());
        json.text("span", span == null ? null : span.code());
        json.text("placement", span == null ? null : span.placement().word());
        json.metres("route_m", lay.routeTo(seq));
        RunRowDocument.positions(json, lay, row);
        json.text(
                "position_basis",
                positions.basis(positions.in(seq), positions.out(seq)).word());
        RunRowDocument.slack(json, row);
        json.text("duct", row.duct());
        RunRowDocument.marks(json, view, row, cable.marksInk());
        json.text("enclosure", lay.findEnclosure(seq).map(Enclosure::code).orElse(null));
        json.text("opened", opened(row));
    }

    /** The fibers cut at a row, whatever says so; null where the cable enters nothing there. */
    private @Nullable String opened(RunRow row) {
        Pass pass = view.records().findPassAt(row.id()).orElse(null);
        if (pass == null) {
            return null;
        }
        Network network = view.network();
        var section = network.sectionBack(row.id());
        int side = section.isPresent() ? 1 : 0;
        var found = section.or(() -> network.sectionAhead(row.id()));
        if (found.isEmpty() || lay.findEnclosure(row.seq()).isEmpty()) {
            return Numbers.ranges(pass.opened());
        }
        List<Integer> cut = IntStream.rangeClosed(1, found.get().count())
                .filter(fiber -> {
                    int end = 2 * found.get().piece(fiber) + side;
                    return network.joint(end) != 0 || network.peer(end) == Network.NONE;
                })
                .boxed()
                .toList();
        return Numbers.list(cut);
    }

    private List<Position> line() {
        List<Position> line = new ArrayList<>();
        line.add(lay.structure(0).position());
        for (int row = 1; row <= lastRow(); row++) {
            List<Position> part = lay.route(row).line().positions();
            line.addAll(part.subList(1, part.size()));
        }
        return line;
    }

    /** The type's values by wavelength, the reel's own in their place. */
    private List<Value> values() {
        String typeSource = "Fiber type " + lay.type().fiberType();
        Map<Wavelength, Value> values = new TreeMap<>();
        view.catalogue().findFiberType(lay.type().fiberType()).ifPresent(type -> {
            for (FiberValues each : type.values()) {
                values.put(
                        each.wavelength(),
                        new Value(each.wavelength(), each.groupIndex(), each.lossPerKm(), typeSource));
            }
        });
        view.records()
                .cableValues()
                .owned(Relation.CABLE_VALUES, cable.id())
                .forEach(own -> values.merge(
                        own.wavelength(),
                        new Value(own.wavelength(), own.groupIndex(), own.lossPerKm(), source(own)),
                        CableDocument::over));
        return List.copyOf(values.values());
    }

    private static String source(CableValue own) {
        return own.source() == null ? "Reel sheet" : "Reel sheet: " + own.source();
    }

    private static Value over(Value below, Value own) {
        return new Value(
                own.wavelength,
                own.groupIndex == null ? below.groupIndex : own.groupIndex,
                own.lossPerKm == null ? below.lossPerKm : own.lossPerKm,
                own.groupIndex == null || own.lossPerKm == null ? own.source + "; " + below.source : own.source);
    }

    private static void value(Json json, Value value) {
        json.number("wavelength_nm", value.wavelength.exactNanometres()).number("group_index", value.groupIndex);
        json.decibels("loss_db_per_km", value.lossPerKm).text("source", value.source);
    }

    private List<FiberFlag> flags() {
        return view.records()
                .fiberFlags()
                .owned(Relation.CABLE_FLAGS, cable.id())
                .sorted(Comparator.comparingInt(
                                (FiberFlag flag) -> flag.fibers().first())
                        .thenComparing(FiberFlag::id))
                .toList();
    }

    private void flag(Json json, FiberFlag flag) {
        json.text("fibers", flag.fibers().toString()).text("flag", flag.flag().word());
        json.text("from", flag.from() == null ? null : view.enclosure(flag.from()));
        json.text("to", flag.to() == null ? null : view.enclosure(flag.to()));
        json.text("owner", flag.owner()).text("reason", flag.reason()).date("until", flag.until());
    }

    private List<FiberCount> counts() {
        return view.records()
                .fiberCounts()
                .owned(Relation.CABLE_COUNTS, cable.id())
                .toList();
    }

    private static void count(Json json, FiberCount count) {
        json.text("fibers", count.fibers().toString()).text("name", count.name());
        json.text("numbers", count.numbers().toString());
    }

    /** What the glass is reckoned at, at one wavelength. */
    private record Value(
            Wavelength wavelength,
            @Nullable Double groupIndex,
            @Nullable Loss lossPerKm,
            String source) {}
}
