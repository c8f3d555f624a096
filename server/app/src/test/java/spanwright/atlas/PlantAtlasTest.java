package spanwright.atlas;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.journal.RecordKind;
import spanwright.plant.Position;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.records.Records;
import spanwright.records.RecordsEditor;

class PlantAtlasTest {

    private static final Box ALL = new Box(-124, -49, -122, -47);

    private final PlantAtlas atlas = new PlantAtlas();

    @AfterEach
    void close() {
        atlas.close();
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void finds_what_looking_at_every_record_finds_also_after_changes(long seed) {
        Random random = new Random(seed);
        Records records = SmallTown.of(200, seed);
        for (int step = 0; step < 30; step++) {
            Box box = box(random);
            PlantAtlas.Found found = atlas.within(records, box, 18, 1_000, 1_000);
            assertThat(ids(found.structures()))
                    .as("seed %s step %s", seed, step)
                    .isEqualTo(structures(records, box));
            assertThat(ids(found.spans())).as("seed %s step %s", seed, step).isEqualTo(spans(records, box));
            assertThat(found.all()).isTrue();
            records = changed(records, random);
        }
    }

    private static Records changed(Records records, Random random) {
        RecordsEditor editor = records.edit();
        int id = 1 + random.nextInt(200);
        SmallTown.add(editor, SmallTown.structure(id, random, "ST-" + id));
        int enclosure = 1 + random.nextInt(40);
        SmallTown.add(editor, SmallTown.enclosure(enclosure, "EN-" + enclosure, 1 + random.nextInt(200)));
        int span = 1 + random.nextInt(199);
        if (editor.record(RecordKind.SPAN, span) != null) {
            SmallTown.remove(editor, RecordKind.SPAN, span);
        }
        return editor.build(records.posting() + 1);
    }

    @Test
    void from_afar_only_what_is_large_or_holds_something_is_seen() {
        Records records = SmallTown.of(200, 4);

        PlantAtlas.Found found = atlas.within(records, ALL, 10, 1_000, 1_000);

        assertThat(found.all()).isFalse();
        assertThat(found.structures().mapToObj(records.structures()::get).map(Structure::type))
                .isNotEmpty()
                .allSatisfy(type -> assertThat(type.word()).isIn("building", "hut", "vault", "cabinet"));
        assertThat(found.spans().count()).isEqualTo(199);
    }

    @Test
    void of_too_many_the_weightier_are_seen() {
        Records records = SmallTown.of(200, 5);

        PlantAtlas.Found found = atlas.within(records, ALL, 18, 10, 20);

        assertThat(found.all()).isFalse();
        assertThat(found.structures().count()).isEqualTo(10);
        assertThat(found.spans().count()).isEqualTo(20);
        assertThat(found.structures().mapToObj(records.structures()::get))
                .allSatisfy(
                        structure -> assertThat(Weight.of(records, structure)).isEqualTo(Weight.LARGE));
    }

    @Test
    void bends_nearer_than_a_pixel_are_left_out_and_the_ends_kept() {
        List<Position> bends = List.of(
                new Position(0, 0),
                new Position(0.0001, 0),
                new Position(0.5, 0),
                new Position(0.50001, 0.00001),
                new Position(1, 0));

        assertThat(LineOf.thinned(bends, 10)).containsExactly(bends.get(0), bends.get(2), bends.get(4));
        assertThat(LineOf.thinned(bends, 24)).isEqualTo(bends);
    }

    @Test
    void fibers_are_those_of_cables_in_service() {
        Records records = SmallTown.of(20, 6);

        assertThat(FibersOf.span(records, 3)).isEqualTo(12);
        assertThat(FibersOf.structure(records, 3)).isEqualTo(12);
    }

    private static Box box(Random random) {
        double west = -123 + random.nextDouble() * 0.15;
        double south = -48 + random.nextDouble() * 0.15;
        return new Box(west, south, west + 0.05, south + 0.05);
    }

    private static Set<Integer> ids(IntStream ids) {
        return ids.boxed().collect(Collectors.toCollection(TreeSet::new));
    }

    private static Set<Integer> structures(Records records, Box box) {
        return records.structures()
                .list()
                .filter(structure -> Box.at(structure.position()).meets(box))
                .map(Structure::id)
                .collect(Collectors.toCollection(TreeSet::new));
    }

    private static Set<Integer> spans(Records records, Box box) {
        return records.spans()
                .list()
                .filter(span -> {
                    List<Position> line = LineOf.span(records, span);
                    return Box.at(line.get(0)).around(Box.at(line.get(1))).meets(box);
                })
                .map(Span::id)
                .collect(Collectors.toCollection(TreeSet::new));
    }
}
