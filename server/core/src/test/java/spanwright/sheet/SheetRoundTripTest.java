package spanwright.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import spanwright.network.Snapshot;
import spanwright.plant.Enclosure;
import spanwright.plants.RandomPlant;
import spanwright.records.Relation;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.LegKind;

/** What is recorded in an enclosure, written as the lines of a sheet and read again, is the same. */
class SheetRoundTripTest {

    static LongStream seeds() {
        return LongStream.rangeClosed(1, 250);
    }

    /** A joint, its identity apart. */
    private record Said(JointKind type, EndRange a, EndRange b, JointFacts facts) {}

    private static List<Said> recorded(Snapshot plant, Enclosure enclosure) {
        return PresentJoints.list(plant, enclosure.id()).stream()
                .map((Joint joint) -> new Said(joint.type(), joint.a(), joint.b(), joint.facts()))
                .toList();
    }

    private static List<Said> joints(SheetRead read) {
        return read.statements().stream()
                .filter(Statement.Joins.class::isInstance)
                .map(Statement.Joins.class::cast)
                .map(joins -> new Said(
                        joins.type(), joins.a(), joins.b(), joins.words().facts(joins.type(), ofSplitter(joins))))
                .toList();
    }

    private static boolean ofSplitter(Statement.Joins joins) {
        LegKind kind = joins.b().leg().kind();
        return kind == LegKind.IN || kind == LegKind.OUT;
    }

    private static List<String> states(SheetRead read) {
        return read.statements().stream()
                .filter(Statement.States.class::isInstance)
                .map(Statement.States.class::cast)
                .map(state -> state.range() + " " + state.condition() + " "
                        + (state.trust() == null ? "POSTED" : state.trust().name()) + " " + state.seen())
                .sorted()
                .toList();
    }

    private static List<String> recordedStates(Snapshot plant, Enclosure enclosure) {
        return plant.records()
                .endStates()
                .owned(Relation.ENCLOSURE_END_STATES, enclosure.id())
                .map(state -> state.ends() + " " + state.condition() + " "
                        + state.trust().name() + " " + state.verifiedOn())
                .sorted()
                .toList();
    }

    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void the_present_of_every_enclosure_read_back_is_equal(long seed) {
        Snapshot plant = Snapshot.of(RandomPlant.of(seed).entered());
        for (Enclosure enclosure : plant.records().enclosures().list().toList()) {
            List<String> lines = SheetWriter.present(plant, enclosure.id());
            SheetRead read = SheetReader.read(plant.records(), enclosure.id(), lines);
            String where = "seed " + seed + ", " + enclosure.code() + ":\n" + String.join("\n", lines);

            assertThat(read.mistakes()).as(where).isEmpty();
            assertThat(joints(read)).as(where).isEqualTo(recorded(plant, enclosure));
            assertThat(states(read)).as(where).isEqualTo(recordedStates(plant, enclosure));
        }
    }

    @Test
    void random_plants_write_lines_of_every_sort() {
        List<String> lines = new ArrayList<>();
        seeds().forEach(seed -> {
            Snapshot plant = Snapshot.of(RandomPlant.of(seed).entered());
            plant.records()
                    .enclosures()
                    .list()
                    .forEach(enclosure -> lines.addAll(SheetWriter.present(plant, enclosure.id())));
        });

        for (String part : List.of(
                " = ",
                "/",
                " in",
                " out ",
                "; tray",
                "; direct",
                "; mechanical",
                "; loss",
                "; trust planned",
                "capped",
                "stored",
                "through",
                "; seen",
                "; spliced",
                "; by",
                "; until",
                "; job")) {
            assertThat(lines).as(part).filteredOn(line -> line.contains(part)).hasSizeGreaterThan(3);
        }
    }
}
