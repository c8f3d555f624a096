package spanwright.network;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.EOFException;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.paged.IntSource;

class NetworkImageTest {

    private static Snapshot grown(RandomPostings postings) {
        MemoryLedger ledger = new MemoryLedger();
        ledger.post("Ana", "as built", postings.foundation());
        for (int posting = 0; posting < 40; posting++) {
            ledger.post("Ana", "at random", postings.next());
        }
        return ledger.current();
    }

    private static List<Integer> ints(Network network) throws IOException {
        List<Integer> written = new ArrayList<>();
        NetworkImage.write(network, (ints, count) -> {
            for (int index = 0; index < count; index++) {
                written.add(ints[index]);
            }
        });
        return written;
    }

    private static IntSource source(List<Integer> ints) {
        var left = ints.iterator();
        return (into, count) -> {
            for (int index = 0; index < count; index++) {
                if (!left.hasNext()) {
                    throw new EOFException("too few");
                }
                into[index] = left.next();
            }
        };
    }

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(longs = {1, 2, 3, 4, 5, 6})
    void a_network_put_together_again_is_the_same_and_goes_on_the_same(long seed) throws IOException {
        RandomPostings postings = new RandomPostings(seed);
        Snapshot before = grown(postings);

        Snapshot after = NetworkImage.beside(before.records(), NetworkImage.read(source(ints(before.network()))));

        assertThat(RecordsText.of(after)).as("seed %d", seed).isEqualTo(RecordsText.of(before));
        assertThat(ints(after.network())).isEqualTo(ints(before.network()));
        SnapshotEditor one = before.edit();
        SnapshotEditor other = after.edit();
        for (int posting = 0; posting < 10; posting++) {
            RandomPostings twin = new RandomPostings(seed + posting);
            assertThat(twin.next().enter(one))
                    .isEqualTo(new RandomPostings(seed + posting).next().enter(other));
        }
        assertThat(RecordsText.of(other.build(99))).isEqualTo(RecordsText.of(one.build(99)));
    }

    @Test
    void an_empty_network_comes_back_too() throws IOException {
        Snapshot empty = Snapshot.empty();

        assertThat(NetworkImage.read(source(ints(empty.network()))).pieces()).isZero();
    }

    @Test
    void ints_of_another_form_are_refused() throws IOException {
        List<Integer> ints = ints(Snapshot.empty().network());
        ints.set(0, 99);

        assertThatThrownBy(() -> NetworkImage.read(source(ints)))
                .isInstanceOf(IOException.class)
                .hasMessageContaining("99");
    }

    @Test
    void ints_that_end_too_soon_are_refused() throws IOException {
        Snapshot grown = grown(new RandomPostings(7));
        List<Integer> ints = ints(grown.network());

        assertThatThrownBy(() -> NetworkImage.read(source(ints.subList(0, ints.size() - 1))))
                .isInstanceOf(EOFException.class);
    }
}
