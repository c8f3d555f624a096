package spanwright.records;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.journal.Recorded;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.ColorCode;
import spanwright.plant.Enclosure;
import spanwright.plant.FiberType;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** A record that others refer to is not removed; the refusal names them. Joints are for the network to know of. */
final class RemovalRules {

    private RemovalRules() {}

    /** Asks about the removal of a record. */
    static void ask(RecordsView view, Recorded record, Refusals refusals) {
        List<String> users = users(view, record);
        if (!users.isEmpty()) {
            refusals.add(
                    "in-use",
                    Names.codeColumn(record.kind()),
                    Names.of(view, record) + " is referred to by " + String.join("; by ", users)
                            + "; remove or change those first");
        }
    }

    /** What refers to a record, in words; nothing where nothing does. */
    static List<String> users(RecordsView view, Recorded record) {
        List<String> users = new ArrayList<>();
        switch (record.kind()) {
            case STRUCTURE -> usersOf(view, (Structure) record, users);
            case SPAN ->
                add(users, "the run of cable", cablesOf(view, view.owned(Relation.SPAN_RUN_ROWS, record.id())));
            case FIBER_TYPE -> {
                String code = ((FiberType) record).code();
                add(
                        users,
                        "cable type",
                        typesWhere(view, type -> type.fiberType().equals(code)));
            }
            case COLOR_CODE -> {
                String code = ((ColorCode) record).code();
                add(users, "cable type", typesWhere(view, type -> type.colors().equals(code)));
            }
            case CABLE_TYPE ->
                add(
                        users,
                        "cable",
                        view.cables()
                                .owned(Relation.CABLE_TYPE_CABLES, record.id())
                                .map(Cable::code));
            case CABLE -> usersOf(view, (Cable) record, users);
            case RUN_ROW -> usersOf(view, (RunRow) record, users);
            case ENCLOSURE -> usersOf(view, (Enclosure) record, users);
            case PASS -> usersOf(view, (Pass) record, users);
            case SPLITTER -> usersOf(view, (Splitter) record, users);
            case PANEL -> usersOf(view, (Panel) record, users);
            default -> {
                // Nothing refers to the other kinds, but for joints' ends, which the network knows.
            }
        }
        add(users, "the measurement of", Measured.list(view, record));
        return users;
    }

    private static void add(List<String> users, String what, Stream<String> names) {
        String list = Names.list(names.distinct());
        if (!list.isEmpty()) {
            users.add(what + " " + list);
        }
    }

    private static Stream<String> cablesOf(RecordsView view, int[] runRows) {
        return IntStream.of(runRows)
                .mapToObj(id -> Names.cable(view, view.runRows().get(id).cable()));
    }

    private static Stream<String> typesWhere(RecordsView view, Predicate<CableType> uses) {
        return view.cableTypes().list().filter(uses).map(CableType::code);
    }

    private static void usersOf(RecordsView view, Structure structure, List<String> users) {
        int id = structure.id();
        add(users, "span", view.spans().owned(Relation.STRUCTURE_SPANS, id).map(Span::code));
        add(users, "the run of cable", cablesOf(view, view.owned(Relation.STRUCTURE_RUN_ROWS, id)));
        add(
                users,
                "enclosure",
                view.enclosures().owned(Relation.STRUCTURE_ENCLOSURES, id).map(Enclosure::code));
    }

    private static void usersOf(RecordsView view, Cable cable, List<String> users) {
        int id = cable.id();
        add(users, "its run row", view.runOf(id).stream().map(row -> Integer.toString(row.seq())));
        add(
                users,
                "its value at",
                view.cableValues().owned(Relation.CABLE_VALUES, id).map(value -> value.wavelength() + ""));
        add(
                users,
                "its flag on",
                view.fiberFlags().owned(Relation.CABLE_FLAGS, id).map(flag -> flag.fibers() + ""));
        add(
                users,
                "its count",
                view.fiberCounts().owned(Relation.CABLE_COUNTS, id).map(count -> count.name()));
    }

    private static void usersOf(RecordsView view, RunRow row, List<String> users) {
        add(
                users,
                "its marks in",
                view.sheathMarks().owned(Relation.RUN_ROW_MARKS, row.id()).map(mark -> mark.ink()));
        add(
                users,
                "the cable's place in enclosure",
                view.passes()
                        .owned(Relation.RUN_ROW_PASSES, row.id())
                        .map(pass -> Names.enclosure(view, pass.enclosure())));
    }

    private static void usersOf(RecordsView view, Enclosure enclosure, List<String> users) {
        int id = enclosure.id();
        add(
                users,
                "the place in it of cable",
                view.passes().owned(Relation.ENCLOSURE_PASSES, id).map(pass -> Names.cable(view, pass.cable())));
        add(
                users,
                "splitter",
                view.splitters().owned(Relation.ENCLOSURE_SPLITTERS, id).map(Splitter::code));
        add(users, "panel", view.panels().owned(Relation.ENCLOSURE_PANELS, id).map(Panel::code));
    }

    private static void usersOf(RecordsView view, Pass pass, List<String> users) {
        String cable = Names.cable(view, pass.cable());
        addStates(
                view,
                pass.enclosure(),
                users,
                (kind, owner) -> owner == pass.runRow() && (kind == LegKind.BACK || kind == LegKind.AHEAD));
        add(
                users,
                "the flag on",
                view.fiberFlags()
                        .owned(Relation.CABLE_FLAGS, pass.cable())
                        .filter(flag -> isThere(pass, flag.from()) || isThere(pass, flag.to()))
                        .map(flag -> cable + " " + flag.fibers()));
    }

    private static boolean isThere(Pass pass, @Nullable Integer enclosure) {
        return enclosure != null && enclosure == pass.enclosure();
    }

    private static void usersOf(RecordsView view, Splitter splitter, List<String> users) {
        addStates(
                view,
                splitter.enclosure(),
                users,
                (kind, owner) -> owner == splitter.id() && (kind == LegKind.IN || kind == LegKind.OUT));
    }

    private static void usersOf(RecordsView view, Panel panel, List<String> users) {
        add(
                users,
                "circuit",
                view.circuits().owned(Relation.PANEL_CIRCUITS, panel.id()).map(Circuit::code));
    }

    /** Says whether a leg is meant. */
    private interface LegTest {
        boolean test(LegKind kind, int owner);
    }

    private static void addStates(RecordsView view, int enclosure, List<String> users, LegTest test) {
        add(
                users,
                "the state of ends",
                view.endStates()
                        .owned(Relation.ENCLOSURE_END_STATES, enclosure)
                        .filter(state -> test.test(
                                state.ends().leg().kind(), state.ends().leg().owner()))
                        .map(state -> state.ends().numbers() + ""));
    }
}
