package spanwright.plants;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.Enclosure;
import spanwright.plant.EnclosureKind;
import spanwright.plant.FiberRange;
import spanwright.plant.Line;
import spanwright.plant.Pass;
import spanwright.plant.Placement;
import spanwright.plant.PlantState;
import spanwright.plant.Position;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.plant.StructureKind;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.quantity.LengthUnit;

/** Draws structures, spans, cables and enclosures. */
final class DrawnRoutes {

    private final Board board;

    DrawnRoutes(Board board) {
        this.board = board;
    }

    void structure(Words words) {
        structure(words.next(), new Position(words.number(), words.number()));
    }

    private Structure structure(String code, Position position) {
        return board.add(new Structure(
                board.next(RecordKind.STRUCTURE),
                code,
                StructureKind.HANDHOLE,
                position,
                null,
                null,
                PlantState.IN_SERVICE,
                List.of(),
                null));
    }

    /** Structures not drawn stand side by side along the equator, a hundredth of a degree apart. */
    private Structure structure(String code) {
        return board.view
                .structures()
                .find(code)
                .orElseGet(() ->
                        structure(code, new Position(board.view.structures().count() / 100.0, 0)));
    }

    void span(Words words) {
        Structure from = structure(words.next());
        Structure to = structure(words.next());
        List<Double> numbers = new ArrayList<>();
        while (words.more()) {
            numbers.add(words.number());
        }
        Length length = numbers.size() % 2 == 1 ? Length.ofMetres(numbers.remove(0)) : null;
        List<Position> positions = new ArrayList<>(List.of(from.position()));
        for (int index = 0; index < numbers.size(); index += 2) {
            positions.add(new Position(numbers.get(index), numbers.get(index + 1)));
        }
        positions.add(to.position());
        span(from, to, length, numbers.isEmpty() ? null : new Line(positions));
    }

    private Span span(Structure from, Structure to, @Nullable Length length, @Nullable Line line) {
        return board.add(new Span(
                board.next(RecordKind.SPAN),
                from.code() + "-" + to.code(),
                from.id(),
                to.id(),
                Placement.AERIAL,
                length,
                line,
                PlantState.IN_SERVICE,
                List.of(),
                null));
    }

    private Span span(Structure from, Structure to, @Nullable Length length) {
        return board.view
                .spans()
                .find(from.code() + "-" + to.code())
                .or(() -> board.view.spans().find(to.code() + "-" + from.code()))
                .orElseGet(() -> span(from, to, length, null));
    }

    void cable(Words words) {
        String code = words.next();
        int fibers = (int) words.number();
        Map<String, String> options = words.options(":");
        CableType type = board.add(new CableType(
                board.next(RecordKind.CABLE_TYPE),
                "T-" + code,
                fibers,
                Integer.parseInt(options.getOrDefault("tube", "12")),
                options.getOrDefault("type", "G.652.D"),
                Double.parseDouble(options.getOrDefault("over", "0")),
                false,
                null,
                "TIA-598"));
        PlantState state = options.containsKey("planned") ? PlantState.PLANNED : PlantState.IN_SERVICE;
        String ink = options.getOrDefault("ink", "white");
        Double own = options.containsKey("own") ? Double.valueOf(options.get("own")) : null;
        Cable cable = board.add(
                new Cable(board.next(RecordKind.CABLE), code, type.id(), null, ink, own, null, null, state, null));
        Structure before = null;
        Length length = null;
        for (int seq = 0; words.more(); seq++) {
            Structure here = structure(words.next());
            Length slack = Length.ofMetres(new BigDecimal(words.optional("+").orElse("0")));
            Integer span = before == null
                    ? null
                    : Integer.valueOf(span(before, here, length).id());
            board.add(new RunRow(
                    board.next(RecordKind.RUN_ROW), cable.id(), seq, here.id(), span, slack, Trust.POSTED, null, null));
            before = here;
            length = words.more() ? words.length() : null;
        }
    }

    void mark(Words words) {
        RunRow row = board.view.runOf(board.cableOf(words.next()).id()).get((int) words.number());
        BigDecimal in = words.decimalOrDash();
        BigDecimal out = words.more() ? words.decimalOrDash() : null;
        LengthUnit unit = words.more() ? LengthUnit.find(words.next()).orElseThrow() : LengthUnit.METRE;
        String ink = words.more() ? words.next() : "white";
        board.add(new SheathMark(board.next(RecordKind.SHEATH_MARK), row.id(), ink, unit, in, out, null, Trust.POSTED));
    }

    void enclosure(Words words) {
        String code = words.next();
        Structure structure = structure(words.next());
        Map<String, String> options = words.options(":");
        Enclosure enclosure = board.add(new Enclosure(
                board.next(RecordKind.ENCLOSURE),
                code,
                structure.id(),
                EnclosureKind.CLOSURE,
                Length.ofMetres(new BigDecimal(options.getOrDefault("tray", "0"))),
                options.containsKey("planned") ? PlantState.PLANNED : PlantState.IN_SERVICE,
                null));
        while (words.more()) {
            pass(enclosure, words.next());
        }
    }

    private void pass(Enclosure enclosure, String text) {
        String[] parts = text.replace(")", "").split("[/(]", -1);
        Cable cable = board.cableOf(parts[0]);
        boolean row = text.contains("/");
        List<FiberRange> opened = text.contains("(") ? Words.ranges(parts[parts.length - 1]) : List.of();
        RunRow at = board.view.runOf(cable.id()).stream()
                .filter(each ->
                        row ? each.seq() == Integer.parseInt(parts[1]) : each.structure() == enclosure.structure())
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException(text));
        board.add(new Pass(board.next(RecordKind.PASS), enclosure.id(), cable.id(), at.id(), opened, List.of()));
    }
}
