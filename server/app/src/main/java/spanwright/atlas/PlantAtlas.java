package spanwright.atlas;

import java.util.Arrays;
import java.util.EnumSet;
import java.util.List;
import java.util.OptionalInt;
import java.util.Set;
import java.util.function.IntConsumer;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.Enclosure;
import spanwright.plant.Position;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.records.Records;
import spanwright.records.Relation;

/** Finds structures and spans by a box on the map, the less the further away one looks from. Any thread may ask. */
public final class PlantAtlas implements AutoCloseable {

    private static final Set<RecordKind> KINDS =
            EnumSet.of(RecordKind.STRUCTURE, RecordKind.SPAN, RecordKind.ENCLOSURE);

    private final Near<Index> near = new Near<>(KINDS, Index::new);

    /**
     * What lies in a box.
     *
     * @param zoom as in web maps: 0 the world, 18 a street
     * @param mostStructures no more structures than this, the weightier first
     * @param mostSpans no more spans than this, those with more fibers first
     */
    public Found within(Records records, Box box, double zoom, int mostStructures, int mostSpans) {
        Near.Found<Index> found = near.to(records);
        Gathered spans = new Gathered();
        spans(records, found, box, spans);
        boolean all = true;
        int[] kept = spans.ids();
        if (kept.length > mostSpans) {
            kept = heaviest(records, kept, mostSpans);
            all = false;
        }
        Gathered structures = new Gathered();
        Weight least = Weight.from(zoom);
        for (Weight weight : Weight.heaviestFirst()) {
            if (weight.compareTo(least) >= 0 && structures.count < mostStructures) {
                structures(records, found, box, weight, structures);
            } else {
                all = false;
            }
        }
        int[] seen = structures.ids();
        if (seen.length > mostStructures) {
            all = false;
            seen = Arrays.copyOf(seen, mostStructures);
        }
        return new Found(kept, seen, all);
    }

    private static void spans(Records records, Near.Found<Index> found, Box box, Gathered into) {
        Changed changed = new Changed();
        found.changed(RecordKind.SPAN).stream().forEach(changed::add);
        // A structure that moved takes the ends of its straight spans with it.
        found.changed(RecordKind.STRUCTURE).stream()
                .forEach(structure -> IntStream.of(records.owned(Relation.STRUCTURE_SPANS, structure))
                        .forEach(changed::add));
        IntConsumer look = id -> {
            if (records.spans()
                    .find(id)
                    .filter(span -> lies(records, span, box))
                    .isPresent()) {
                into.add(id);
            }
        };
        found.index().spans.within(box, id -> {
            if (!changed.contains(id)) {
                look.accept(id);
            }
        });
        changed.stream().forEach(look);
    }

    private static void structures(Records records, Near.Found<Index> found, Box box, Weight weight, Gathered into) {
        Changed changed = new Changed();
        found.changed(RecordKind.STRUCTURE).stream().forEach(changed::add);
        found.changed(RecordKind.ENCLOSURE).stream().forEach(enclosure -> {
            records.enclosures().find(enclosure).map(Enclosure::structure).ifPresent(changed::add);
            found.index().structureOf(enclosure).ifPresent(changed::add);
        });
        IntConsumer look = id -> {
            Structure structure = records.structures().find(id).orElse(null);
            if (structure != null && Box.at(structure.position()).meets(box)) {
                into.add(id);
            }
        };
        found.index().structures(weight).within(box, id -> {
            if (!changed.contains(id)) {
                look.accept(id);
            }
        });
        changed.stream().forEach(id -> {
            if (records.structures()
                    .find(id)
                    .filter(s -> Weight.of(records, s) == weight)
                    .isPresent()) {
                look.accept(id);
            }
        });
    }

    /** The spans with the most fibers; of those with as many, the ones first recorded. */
    private static int[] heaviest(Records records, int[] spans, int most) {
        return IntStream.of(spans)
                .mapToLong(id -> (long) -FibersOf.span(records, id) << 32 | id)
                .sorted()
                .limit(most)
                .mapToInt(packed -> (int) packed)
                .toArray();
    }

    private static boolean lies(Records records, Span span, Box box) {
        Box own = boxOf(records, span);
        return own != null && own.meets(box);
    }

    /** The box of a span's line; null where it has none, because it begins and ends at one structure. */
    private static @Nullable Box boxOf(Records records, Span span) {
        if (span.line() == null && span.from() == span.to()) {
            return null;
        }
        Box box = null;
        for (Position position : LineOf.span(records, span)) {
            Box at = Box.at(position);
            box = box == null ? at : box.around(at);
        }
        return box;
    }

    @Override
    public void close() {
        near.close();
    }

    /** What lies in a box, by identity. */
    public static final class Found {

        private final int[] spans;
        private final int[] structures;
        private final boolean all;

        private Found(int[] spans, int[] structures, boolean all) {
            this.spans = spans;
            this.structures = structures;
            this.all = all;
        }

        /** Spans, in no order. */
        public IntStream spans() {
            return IntStream.of(spans);
        }

        /** Structures, the weightiest first. */
        public IntStream structures() {
            return IntStream.of(structures);
        }

        /** False where some were left out. */
        public boolean all() {
            return all;
        }
    }

    /** The trees of one state. */
    private static final class Index {

        private final PackedTree spans;
        /** By weight. */
        private final List<PackedTree> structures;

        private final Records of;

        Index(Records records) {
            of = records;
            PackedTree.Builder lines = new PackedTree.Builder(records.spans().count());
            records.spans().list().forEach(span -> {
                Box box = boxOf(records, span);
                if (box != null) {
                    lines.add(span.id(), box);
                }
            });
            spans = lines.build();
            List<PackedTree.Builder> points = Arrays.stream(Weight.values())
                    .map(weight -> new PackedTree.Builder(0))
                    .toList();
            records.structures()
                    .list()
                    .forEach(structure -> points.get(
                                    Weight.of(records, structure).ordinal())
                            .add(structure.id(), Box.at(structure.position())));
            structures = points.stream().map(PackedTree.Builder::build).toList();
        }

        PackedTree structures(Weight weight) {
            return structures.get(weight.ordinal());
        }

        OptionalInt structureOf(int enclosure) {
            return of.enclosures().find(enclosure).stream()
                    .mapToInt(Enclosure::structure)
                    .findFirst();
        }
    }

    /** Identities as they come. */
    private static final class Gathered {

        private int[] ids = new int[256];
        private int count;

        void add(int id) {
            if (count == ids.length) {
                ids = Arrays.copyOf(ids, count * 2);
            }
            ids[count++] = id;
        }

        int[] ids() {
            return Arrays.copyOf(ids, count);
        }
    }
}
