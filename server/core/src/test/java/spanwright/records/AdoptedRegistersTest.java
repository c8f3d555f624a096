package spanwright.records;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Objects;
import java.util.Random;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.paged.PagedRefs;
import spanwright.plants.RandomPlant;

/** Registers adopted whole, and indexed when first asked, against records entered one by one. */
class AdoptedRegistersTest {

    static IntStream seeds() {
        return IntStream.range(0, 60);
    }

    private static Records adopted(Records entered) {
        RecordsEditor editor = Records.empty().edit();
        for (RecordKind kind : RecordKind.values()) {
            PagedRefs.Editor<Recorded> register = PagedRefs.<Recorded>empty().edit();
            all(entered, kind).forEach(record -> register.set(record.id(), record));
            editor.adopt(kind, register.build(), entered.count(kind), entered.limit(kind));
        }
        for (String job : entered.plannedJobs()) {
            entered.plannedJoints(job)
                    .forEach(id -> editor.adoptPlanned(entered.joints().get(id)));
        }
        return editor.build(entered.posting());
    }

    private static List<Recorded> all(RecordsView records, RecordKind kind) {
        return IntStream.range(0, records.limit(kind))
                .mapToObj(id -> records.record(kind, id))
                .filter(Objects::nonNull)
                .toList();
    }

    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void say_the_same_and_go_on_the_same(int seed) {
        Records entered = RandomPlant.of(seed).entered();
        Records adopted = adopted(entered);
        assertSame(adopted, entered, seed);

        List<Recorded> some = new ArrayList<>();
        for (RecordKind kind : RecordKind.values()) {
            some.addAll(all(entered, kind));
        }
        Collections.shuffle(some, new Random(seed));
        RecordsEditor one = entered.edit();
        RecordsEditor other = adopted(entered).edit();
        for (Recorded record : some.subList(0, some.size() / 3)) {
            one.apply(Change.remove(record));
            other.apply(Change.remove(record));
        }
        assertSame(other, one, seed);
        assertSame(other.build(2), one.build(2), seed);
        assertSame(adopted, entered, seed);
    }

    private static void assertSame(RecordsView adopted, RecordsView entered, int seed) {
        for (RecordKind kind : RecordKind.values()) {
            assertThat(adopted.count(kind)).isEqualTo(entered.count(kind));
            assertThat(adopted.limit(kind)).isEqualTo(entered.limit(kind));
            assertThat(all(adopted, kind)).as("seed %d, %s", seed, kind).isEqualTo(all(entered, kind));
            for (Recorded record : all(entered, kind)) {
                String code = Codes.of(record);
                if (code != null) {
                    assertThat(adopted.identity(kind, code)).isEqualTo(entered.identity(kind, code));
                }
            }
            assertThat(adopted.identity(kind, "none such")).isZero();
        }
        int owners = IntStream.of(kinds(entered)).max().orElse(0);
        for (Relation relation : Relation.values()) {
            for (int owner = 0; owner < owners; owner++) {
                assertThat(sorted(adopted.owned(relation, owner)))
                        .as("seed %d, %s %d", seed, relation, owner)
                        .isEqualTo(sorted(entered.owned(relation, owner)));
            }
        }
        assertThat(adopted.plannedJobs()).isEqualTo(entered.plannedJobs());
        for (String job : entered.plannedJobs()) {
            assertThat(adopted.plannedJoints(job)).isEqualTo(entered.plannedJoints(job));
        }
    }

    private static int[] kinds(RecordsView records) {
        return IntStream.range(0, RecordKind.values().length)
                .map(kind -> records.limit(RecordKind.values()[kind]))
                .toArray();
    }

    private static int[] sorted(int[] ids) {
        return IntStream.of(ids).sorted().toArray();
    }

    @Test
    void what_is_made_later_is_made_once_whoever_asks() throws InterruptedException {
        AtomicInteger made = new AtomicInteger();
        Later<Integer> later = Later.by(made::incrementAndGet);
        List<Thread> threads = new ArrayList<>();
        for (int count = 0; count < 8; count++) {
            threads.add(new Thread(later::get));
        }
        assertThat(made).hasValue(0);
        threads.forEach(Thread::start);
        for (Thread thread : threads) {
            thread.join();
        }

        assertThat(later.get()).isEqualTo(1);
        assertThat(made).hasValue(1);
    }
}
