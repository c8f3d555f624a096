package spanwright.paged;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Random;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Paged references against plain maps. */
class PagedRefsTest {

    private static final int LOADED = 70_000;

    static IntStream seeds() {
        return IntStream.range(0, 30);
    }

    private static @Nullable Object[] page(int number) {
        Object[] page = new Object[PagedRefs.PAGE];
        for (int index = 0; index < page.length; index++) {
            int at = number * PagedRefs.PAGE + index;
            page[index] = at < LOADED && at % 3 == 0 ? "loaded " + at : null;
        }
        return page;
    }

    private static Map<Integer, String> loaded() {
        Map<Integer, String> map = new HashMap<>();
        IntStream.range(0, LOADED).filter(at -> at % 3 == 0).forEach(at -> map.put(at, "loaded " + at));
        return map;
    }

    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void every_array_of_a_row_of_edits_stays_as_it_was_built(int seed) {
        Random random = new Random(seed);
        boolean lazy = seed % 2 == 0;
        List<PagedRefs<String>> built = new ArrayList<>();
        built.add(lazy ? PagedRefs.lazy(LOADED, PagedRefsTest::page) : PagedRefs.empty());
        List<Map<Integer, String>> expected = new ArrayList<>();
        expected.add(lazy ? loaded() : Map.of());
        Map<Integer, String> now = new HashMap<>(expected.get(0));
        for (int round = 0; round < 6; round++) {
            PagedRefs.Editor<String> editor = built.get(built.size() - 1).edit();
            for (int step = 0; step < 30; step++) {
                int index = random.nextInt(random.nextInt(6) == 0 ? 400_000 : 1_000);
                String value = random.nextInt(4) == 0 ? null : "written " + random.nextInt();
                editor.set(index, value);
                now.put(index, value);
                assertThat(editor.find(index)).isEqualTo(value);
                assertThat(editor.size()).isGreaterThan(index);
            }
            built.add(editor.build());
            expected.add(new HashMap<>(now));
        }
        for (int index = 0; index < built.size(); index++) {
            assertHolds(built.get(index), expected.get(index));
        }
    }

    private static void assertHolds(PagedRefs<String> refs, Map<Integer, String> expected) {
        int size = expected.keySet().stream().mapToInt(at -> at + 1).max().orElse(0);
        assertThat(refs.size()).isGreaterThanOrEqualTo(size);
        for (int at = 0; at < size + 2 * PagedRefs.PAGE; at++) {
            String found = refs.find(at);
            if (found == null ? expected.get(at) != null : !found.equals(expected.get(at))) {
                assertThat(found).as("at %d", at).isEqualTo(expected.get(at));
            }
        }
    }

    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void tells_where_two_arrays_differ(int seed) {
        Random random = new Random(seed);
        PagedRefs<String> one = seed % 2 == 0 ? PagedRefs.lazy(LOADED, PagedRefsTest::page) : PagedRefs.empty();
        PagedRefs.Editor<String> editor = one.edit();
        Map<Integer, String> written = new HashMap<>();
        for (int step = 0; step < 20; step++) {
            int index = random.nextInt(random.nextInt(6) == 0 ? 400_000 : 6_000);
            String value = random.nextInt(4) == 0 ? one.find(index) : "written " + step;
            editor.set(index, value);
            written.put(index, value);
        }
        PagedRefs<String> other = editor.build();
        List<Integer> expected = written.keySet().stream()
                .filter(index -> !Objects.equals(one.find(index), written.get(index)))
                .sorted()
                .toList();

        List<Integer> there = new ArrayList<>();
        one.differing(other, there::add);
        List<Integer> back = new ArrayList<>();
        other.differing(one, back::add);

        assertThat(there).isEqualTo(expected);
        assertThat(back).isEqualTo(expected);
    }

    @Test
    void neighbours_are_compared_without_loading_what_they_share() {
        AtomicInteger loads = new AtomicInteger();
        PagedRefs<String> one = PagedRefs.lazy(LOADED, number -> {
            loads.incrementAndGet();
            return page(number);
        });
        PagedRefs.Editor<String> editor = one.edit();
        editor.set(700, "new");

        List<Integer> found = new ArrayList<>();
        editor.build().differing(one, found::add);

        assertThat(found).containsExactly(700);
        assertThat(loads).hasValueLessThan(3);
    }

    @Test
    void outside_of_the_array_there_is_nothing() {
        PagedRefs<String> refs = PagedRefs.empty();

        assertThat(refs.find(0)).isNull();
        assertThat(refs.find(-1)).isNull();
        assertThat(refs.edit().find(-1)).isNull();
        assertThat(refs.edit().find(7)).isNull();
    }

    @Test
    void a_page_is_loaded_once_when_first_read() {
        AtomicInteger loads = new AtomicInteger();
        PagedRefs<String> refs = PagedRefs.lazy(1_000, number -> {
            loads.incrementAndGet();
            return page(number);
        });

        assertThat(loads).hasValue(0);
        assertThat(refs.find(3)).isEqualTo("loaded 3");
        assertThat(refs.find(6)).isEqualTo("loaded 6");
        assertThat(loads).hasValue(1);
        PagedRefs.Editor<String> editor = refs.edit();
        editor.set(300, "new");
        assertThat(editor.find(303)).isEqualTo("loaded 303");
        assertThat(loads).hasValue(2);
        assertThat(editor.build().find(300)).isEqualTo("new");
        assertThat(refs.find(300)).isEqualTo("loaded 300");
    }

    @Test
    void an_edit_that_writes_nothing_gives_the_same_array() {
        PagedRefs<String> refs = PagedRefs.empty();

        assertThat(refs.edit().build()).isSameAs(refs);
    }
}
