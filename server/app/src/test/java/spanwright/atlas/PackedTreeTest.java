package spanwright.atlas;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class PackedTreeTest {

    /** Boxes are kept as float: nothing is missed, and nothing is found that is further off than this. */
    private static final double FLOAT_STEP = 4e-5;

    @Test
    void an_empty_tree_finds_nothing() {
        assertThat(found(new PackedTree.Builder(0).build(), new Box(-180, -90, 180, 90)))
                .isEmpty();
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 16, 17, 255, 256, 257, 5_000})
    void finds_what_looking_at_every_box_finds(int count) {
        Random random = new Random(count);
        Map<Integer, Box> boxes = new HashMap<>();
        PackedTree.Builder builder = new PackedTree.Builder(0);
        for (int id = 1; id <= count; id++) {
            Box box = box(random, 0.002);
            boxes.put(id, box);
            builder.add(id, box);
        }
        PackedTree tree = builder.build();
        for (int question = 0; question < 50; question++) {
            Box asked = box(random, 0.05);
            Set<Integer> found = found(tree, asked);
            assertThat(found).as("count %s question %s", count, question).containsAll(slow(boxes, asked, 0));
            assertThat(slow(boxes, asked, FLOAT_STEP)).containsAll(found);
        }
    }

    @Test
    void each_item_is_told_once() {
        PackedTree.Builder builder = new PackedTree.Builder(4);
        List<Integer> told = new ArrayList<>();
        for (int id = 1; id <= 300; id++) {
            builder.add(id, new Box(-123, -48, -123, -48));
        }

        builder.build().within(new Box(-123, -48, -123, -48), told::add);

        assertThat(told).hasSize(300).doesNotHaveDuplicates();
    }

    @Test
    void neighbours_on_the_curve_share_a_side() {
        int[][] cells = new int[64 * 64][];
        for (int x = 0; x < 64; x++) {
            for (int y = 0; y < 64; y++) {
                cells[(int) Hilbert.position(x, y)] = new int[] {x, y};
            }
        }
        assertThat(Arrays.asList(cells)).doesNotContainNull();
        for (int along = 1; along < cells.length; along++) {
            int[] before = cells[along - 1];
            int[] here = cells[along];
            assertThat(Math.abs(before[0] - here[0]) + Math.abs(before[1] - here[1]))
                    .as("step %s", along)
                    .isEqualTo(1);
        }
    }

    private static Box box(Random random, double size) {
        double west = -123 + random.nextDouble() * 0.3;
        double south = -48 + random.nextDouble() * 0.2;
        return new Box(west, south, west + random.nextDouble() * size, south + random.nextDouble() * size);
    }

    private static Set<Integer> found(PackedTree tree, Box asked) {
        Set<Integer> found = new TreeSet<>();
        tree.within(asked, found::add);
        return found;
    }

    private static Set<Integer> slow(Map<Integer, Box> boxes, Box asked, double slack) {
        Box wide = new Box(asked.west() - slack, asked.south() - slack, asked.east() + slack, asked.north() + slack);
        Set<Integer> found = new TreeSet<>();
        boxes.forEach((id, box) -> {
            if (box.meets(wide)) {
                found.add(id);
            }
        });
        return found;
    }
}
