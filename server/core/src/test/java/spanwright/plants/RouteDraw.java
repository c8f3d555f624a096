package spanwright.plants;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import spanwright.journal.RecordKind;
import spanwright.plant.BaseFeature;
import spanwright.plant.Line;
import spanwright.plant.Placement;
import spanwright.plant.PlantState;
import spanwright.plant.Position;
import spanwright.plant.Setting;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.plant.StructureKind;

/** Draws structures and the spans between them: a tree, more spans across it, twins of spans, and loops at a place. */
final class RouteDraw {

    private final PlantDraft draft;
    private final Chance chance;

    RouteDraw(PlantDraft draft, Chance chance) {
        this.draft = draft;
        this.chance = chance;
    }

    void draw(int structures) {
        settings();
        for (int index = 0; index < structures; index++) {
            structure();
        }
        for (int index = 1; index < structures; index++) {
            span(draft.structures.get(chance.between(0, index - 1)), draft.structures.get(index));
        }
        for (int index = 0; index < structures; index++) {
            across();
        }
        baseMap();
    }

    private void settings() {
        setting("time_zone", chance.of("America/Chicago", "UTC", "Europe/Oslo"));
        setting("unit", chance.of("ft", "m"));
        if (chance.in(50)) {
            setting("owner", "Lowland \"Fiber\", Inc.");
        }
    }

    private void setting(String name, String value) {
        draft.add(new Setting(draft.next(RecordKind.SETTING), name, value));
    }

    private void structure() {
        int id = draft.next(RecordKind.STRUCTURE);
        draft.add(new Structure(
                id,
                "H-" + id,
                chance.of(StructureKind.values()),
                new Position(chance.degrees(-93.3, -93.2), chance.degrees(44.8, 44.9)),
                chance.perhaps(50, () -> chance.metres(0.01, 5)),
                chance.perhaps(30, () -> id + " Mill Road, \"back\" lot"),
                state(6),
                risks(),
                chance.perhaps(20, () -> "gate code\nat the desk; Ærø, Zürich")));
    }

    private PlantState state(int outOfHundred) {
        return chance.in(outOfHundred) ? chance.of(PlantState.PLANNED, PlantState.ABANDONED) : PlantState.IN_SERVICE;
    }

    private List<String> risks() {
        return Stream.of("bridge-1", "feed-2").filter(risk -> chance.in(10)).toList();
    }

    private void across() {
        Structure from = chance.of(draft.structures);
        Structure to = chance.of(draft.structures);
        span(from, to);
        if (chance.in(15)) {
            span(to, from);
        }
    }

    private void span(Structure from, Structure to) {
        int id = draft.next(RecordKind.SPAN);
        boolean loop = from.id() == to.id();
        draft.add(new Span(
                id,
                "P-" + id,
                from.id(),
                to.id(),
                chance.of(Placement.values()),
                loop || chance.in(30) ? chance.metres(5, 900) : null,
                loop || chance.in(50) ? null : line(from, to),
                state(4),
                risks(),
                chance.perhaps(10, () -> "shallow")));
    }

    private Line line(Structure from, Structure to) {
        List<Position> positions = new ArrayList<>();
        positions.add(from.position());
        for (int more = chance.between(0, 3); more > 0; more--) {
            positions.add(new Position(chance.degrees(-93.3, -93.2), chance.degrees(44.8, 44.9)));
        }
        positions.add(to.position());
        return new Line(positions);
    }

    private void baseMap() {
        GeometryFactory shapes = new GeometryFactory();
        draft.add(new BaseFeature(
                draft.next(RecordKind.BASE_FEATURE), "street", "Mill Road", shapes.createLineString(new Coordinate[] {
                    new Coordinate(-93.3, 44.8), new Coordinate(-93.2, 44.85)
                })));
        draft.add(new BaseFeature(
                draft.next(RecordKind.BASE_FEATURE), "place", null, shapes.createPoint(new Coordinate(-93.25, 44.85))));
    }
}
