package spanwright.records;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.plant.Setting;

class DifferingTest {

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4})
    void tells_what_looking_at_every_record_tells(long seed) {
        Random random = new Random(seed);
        Records before = Records.empty();
        for (int step = 0; step < 40; step++) {
            Records after = changed(before, random);
            List<Integer> told = new ArrayList<>();
            before.differing(RecordKind.SETTING, after, told::add);
            assertThat(told).as("seed %s step %s", seed, step).isEqualTo(slow(before, after));
            List<Integer> back = new ArrayList<>();
            after.differing(RecordKind.SETTING, before, back::add);
            assertThat(back).isEqualTo(told);
            before = random.nextInt(3) == 0 ? before : after;
        }
    }

    private static Records changed(Records records, Random random) {
        RecordsEditor editor = records.edit();
        int changes = random.nextInt(4);
        for (int change = 0; change < changes; change++) {
            int id = 1 + random.nextInt(2_000);
            Setting was = (Setting) editor.record(RecordKind.SETTING, id);
            if (was != null && random.nextBoolean()) {
                editor.apply(Change.remove(was));
            } else {
                Setting is = new Setting(id, "s" + id, "v" + random.nextInt(2));
                editor.apply(was == null ? Change.add(is) : Change.replace(was, is));
            }
        }
        return editor.build(records.posting() + 1);
    }

    private static List<Integer> slow(Records one, Records other) {
        List<Integer> differing = new ArrayList<>();
        for (int id = 0; id < 2_100; id++) {
            Object was = one.record(RecordKind.SETTING, id);
            Object is = other.record(RecordKind.SETTING, id);
            if (was == null ? is != null : !was.equals(is)) {
                differing.add(id);
            }
        }
        return differing;
    }
}
