package spanwright.paged;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.EOFException;
import java.io.IOException;
import java.nio.IntBuffer;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Paged ints against plain arrays. */
class PagedIntsTest {

    static IntStream seeds() {
        return IntStream.range(0, 30);
    }

    private static int[] plain(PagedInts ints) {
        int[] plain = new int[ints.size()];
        ints.copyTo(0, plain.length, plain);
        return plain;
    }

    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void every_array_of_a_row_of_edits_stays_as_it_was_built(int seed) {
        Random random = new Random(seed);
        List<PagedInts> built =
                new ArrayList<>(List.of(PagedInts.empty(PageSize.values()[seed % PageSize.values().length])));
        List<int[]> expected = new ArrayList<>(List.of(new int[0]));
        int[] now = new int[0];
        for (int round = 0; round < 12; round++) {
            PagedInts.Editor editor = built.get(built.size() - 1).edit();
            for (int step = 0; step < 6; step++) {
                now = edit(editor, now, random);
                assertThat(editor.size()).isEqualTo(now.length);
            }
            int[] seen = new int[now.length];
            editor.copyTo(0, seen.length, seen);
            assertThat(seen).isEqualTo(now);
            built.add(editor.build());
            expected.add(now.clone());
        }
        for (int index = 0; index < built.size(); index++) {
            assertThat(plain(built.get(index))).isEqualTo(expected.get(index));
        }
    }

    private static int[] edit(PagedInts.Editor editor, int[] before, Random random) {
        int[] now = before.clone();
        switch (random.nextInt(4)) {
            case 0 -> {
                int size = now.length + random.nextInt(random.nextInt(8) == 0 ? 300_000 : 2_000);
                int fill = random.nextInt(3) - 1;
                editor.grow(size, fill);
                now = Arrays.copyOf(now, size);
                Arrays.fill(now, before.length, size, fill);
            }
            case 1 -> {
                now = Arrays.copyOf(now, now.length + 1);
                now[before.length] = random.nextInt();
                assertThat(editor.add(now[before.length])).isEqualTo(before.length);
            }
            case 2 -> {
                for (int more = 0; more < 40 && now.length > 0; more++) {
                    int index = random.nextInt(now.length);
                    now[index] = random.nextInt();
                    editor.set(index, now[index]);
                    assertThat(editor.get(index)).isEqualTo(now[index]);
                }
            }
            default -> {
                int from = now.length == 0 ? 0 : random.nextInt(now.length);
                int[] some = random.ints(Math.min(1_500, now.length - from)).toArray();
                editor.copyFrom(some, some.length, from);
                System.arraycopy(some, 0, now, from, some.length);
            }
        }
        return now;
    }

    static Stream<Arguments> sizes() {
        return Stream.of(PageSize.values())
                .flatMap(pages -> IntStream.of(0, 1, 2, 256, 512)
                        .flatMap(count -> IntStream.of(-1, 0, 1).map(more -> count * pages.ints() + more))
                        .filter(size -> size >= 0)
                        .mapToObj(size -> Arguments.of(pages, size)));
    }

    @ParameterizedTest(name = "{0}, {1} ints")
    @MethodSource("sizes")
    void is_copied_written_and_read_back_at_any_size(PageSize pages, int size) throws IOException {
        int[] ints = IntStream.range(0, size).map(index -> index * 31 - 7).toArray();
        PagedInts copied = PagedInts.copyOf(Arrays.copyOf(ints, size + 5), size, pages);
        IntBuffer written = IntBuffer.allocate(size + 5);
        copied.write((some, count) -> written.put(some, 0, count));
        written.flip();
        PagedInts read = PagedInts.read(size, pages, (into, count) -> written.get(into, 0, count));

        assertThat(plain(copied)).isEqualTo(ints);
        assertThat(written.limit()).isEqualTo(size);
        assertThat(plain(read)).isEqualTo(ints);
        if (size > 0) {
            assertThat(read.get(size - 1)).isEqualTo(ints[size - 1]);
        }
        assertThat(copied.heapBytes()).isGreaterThanOrEqualTo(4L * size);
    }

    @Test
    void a_part_is_copied_over_page_ends() {
        PagedInts ints = PagedInts.copyOf(IntStream.range(0, 2_000).toArray(), 2_000);
        int[] into = new int[1_400];
        int[] further = new int[1_403];

        ints.copyTo(300, 1_400, into);
        ints.copyTo(300, 1_400, further, 2);

        assertThat(into).isEqualTo(IntStream.range(300, 1_700).toArray());
        assertThat(Arrays.copyOfRange(further, 2, 1_402)).isEqualTo(into);
        assertThat(further[0] + further[1] + further[1_402]).isZero();
    }

    @ParameterizedTest
    @EnumSource(PageSize.class)
    void rows_are_copied_in_the_order_asked_for(PageSize pages) {
        int size = 3 * pages.ints() - 4;
        PagedInts ints = PagedInts.copyOf(IntStream.range(0, size).toArray(), size, pages);
        int[] rows = new Random(5).ints(700, 0, size / 4).toArray();
        int[] into = new int[4 * rows.length];

        ints.copyRows(rows, rows.length, into);

        assertThat(into)
                .isEqualTo(IntStream.of(rows)
                        .flatMap(row -> IntStream.range(4 * row, 4 * row + 4))
                        .toArray());
    }

    @Test
    void a_source_that_ends_too_soon_is_passed_on() {
        assertThatThrownBy(() -> PagedInts.read(10, PageSize.SMALL, (into, count) -> {
                    throw new EOFException("too short");
                }))
                .isInstanceOf(EOFException.class);
    }

    @Test
    void an_edit_that_writes_nothing_shares_all() {
        PagedInts ints = PagedInts.copyOf(new int[] {4, 5}, 2);

        assertThat(plain(ints.edit().build())).containsExactly(4, 5);
    }
}
