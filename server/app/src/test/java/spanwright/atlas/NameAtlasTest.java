package spanwright.atlas;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.atlas.Match.Closeness;
import spanwright.journal.RecordKind;
import spanwright.records.Records;
import spanwright.records.RecordsEditor;

class NameAtlasTest {

    private final NameAtlas atlas = new NameAtlas();

    @AfterEach
    void close() {
        atlas.close();
    }

    @Test
    void the_whole_name_comes_first_then_beginnings_then_words_then_what_is_within() {
        Records records = records("ST-1", "ST-11", "X-ST-1", "XST-1");

        List<Match> found = atlas.find(records, "st-1", 10);

        assertThat(found.stream().map(match -> name(records, match) + " " + match.closeness()))
                .containsExactly("ST-1 WHOLE", "ST-11 BEGINNING", "X-ST-1 WORD", "XST-1 WITHIN");
    }

    @Test
    void letters_are_compared_without_case_accents_or_double_spaces() {
        Records records = records("Señal-9");

        assertThat(atlas.find(records, " SENAL-9 ", 10))
                .extracting(Match::closeness)
                .containsExactly(Closeness.WHOLE);
    }

    @Test
    void a_record_found_by_two_names_is_told_once() {
        Records records = SmallTown.of(5, 1);

        assertThat(atlas.find(records, "F", 50).stream().filter(match -> match.named() == Named.CABLE))
                .singleElement()
                .satisfies(match -> assertThat(match.closeness()).isEqualTo(Closeness.WHOLE));
    }

    @Test
    void a_panel_is_found_by_its_enclosure_also_when_that_is_renamed() {
        RecordsEditor editor = SmallTown.of(10, 1).edit();
        SmallTown.add(editor, SmallTown.panel(1, 1, "P"));
        Records records = editor.build(2);
        assertThat(atlas.find(records, "EN-1/P", 5)).extracting(Match::named).containsExactly(Named.PANEL);

        RecordsEditor renaming = records.edit();
        SmallTown.add(renaming, SmallTown.enclosure(1, "FRAME", 5));
        Records renamed = renaming.build(3);

        assertThat(atlas.find(renamed, "EN-1/P", 5)).isEmpty();
        assertThat(atlas.find(renamed, "FRAME/P", 5)).extracting(Match::named).containsExactly(Named.PANEL);
    }

    @Test
    void nothing_typed_finds_nothing() {
        assertThat(atlas.find(SmallTown.of(5, 1), "  ", 5)).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void finds_what_looking_at_every_name_finds_also_after_changes(long seed) {
        Random random = new Random(seed);
        Records records = SmallTown.of(300, seed);
        for (int step = 0; step < 20; step++) {
            String typed = typed(random);
            Set<String> found = atlas.find(records, typed, 10_000).stream()
                    .filter(match -> match.named() == Named.STRUCTURE || match.named() == Named.ADDRESS)
                    .map(match -> match.id() + "")
                    .collect(Collectors.toCollection(TreeSet::new));
            assertThat(found).as("seed %s step %s '%s'", seed, step, typed).isEqualTo(slow(records, typed));
            RecordsEditor editor = records.edit();
            int id = 1 + random.nextInt(300);
            SmallTown.add(editor, SmallTown.structure(id, random, "NEW-" + step + "-" + id));
            records = editor.build(records.posting() + 1);
        }
    }

    private static String typed(Random random) {
        return switch (random.nextInt(4)) {
            case 0 -> "ST-" + random.nextInt(30);
            case 1 -> "mill";
            case 2 -> Integer.toString(random.nextInt(99));
            default -> "new-" + random.nextInt(10);
        };
    }

    private static Set<String> slow(Records records, String typed) {
        String wanted = typed.toLowerCase(Locale.ROOT);
        return records.structures()
                .list()
                .filter(structure -> structure.code().toLowerCase(Locale.ROOT).contains(wanted)
                        || (structure.address() != null
                                && structure.address().toLowerCase(Locale.ROOT).contains(wanted)))
                .map(structure -> structure.id() + "")
                .collect(Collectors.toCollection(TreeSet::new));
    }

    private static Records records(String... circuits) {
        RecordsEditor editor = Records.empty().edit();
        SmallTown.add(editor, SmallTown.structure(1, new Random(1), "AT"));
        SmallTown.add(editor, SmallTown.enclosure(1, "AT-E", 1));
        SmallTown.add(editor, SmallTown.panel(1, 1, "P"));
        for (int i = 0; i < circuits.length; i++) {
            SmallTown.add(editor, SmallTown.circuit(i + 1, circuits[i], "Kestrelby"));
        }
        return editor.build(1);
    }

    private static String name(Records records, Match match) {
        assertThat(match.named().kind()).isEqualTo(RecordKind.CIRCUIT);
        return records.circuits().get(match.id()).code();
    }
}
