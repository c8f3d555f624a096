package spanwright.atlas;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.records.Records;

/**
 * Keeps an index of a few states of the records, and gives for any state the nearest index with what differs. Where
 * much differs, a new index is made: at once where there is none near, else in the background. Any thread may ask.
 *
 * @param <T> the index
 */
final class Near<T> implements AutoCloseable {

    /** So many differing records are looked at one by one without being felt. */
    private static final int FEW = 2_000;

    /** Above this, looking one by one takes longer than a reader should wait. */
    private static final int MANY = 50_000;

    private static final int KEPT = 3;

    private final Set<RecordKind> kinds;
    private final Function<Records, T> make;
    private final Deque<Made<T>> kept = new ArrayDeque<>();
    private final AtomicBoolean making = new AtomicBoolean();
    private final ExecutorService background = Executors.newSingleThreadExecutor(task -> {
        Thread thread = new Thread(task, "atlas");
        thread.setDaemon(true);
        return thread;
    });

    Near(Set<RecordKind> kinds, Function<Records, T> make) {
        this.kinds = EnumSet.copyOf(kinds);
        this.make = make;
    }

    /** The index nearest to the records asked, and what differs. */
    Found<T> to(Records asked) {
        Found<T> nearest = nearest(asked);
        if (nearest == null || nearest.count > MANY) {
            return made(asked);
        }
        if (nearest.count > FEW && making.compareAndSet(false, true)) {
            background.execute(() -> {
                try {
                    keep(asked);
                } finally {
                    making.set(false);
                }
            });
        }
        return nearest;
    }

    /** Makes an index at once; who asks for the same meanwhile waits for it. */
    private synchronized Found<T> made(Records asked) {
        Found<T> nearest = nearest(asked);
        return nearest != null && nearest.count <= MANY ? nearest : new Found<>(keep(asked), Map.of(), 0);
    }

    private @Nullable Found<T> nearest(Records asked) {
        Found<T> best = null;
        for (Made<T> made : all()) {
            Found<T> found = compare(made, asked);
            if (best == null || found.count < best.count) {
                best = found;
            }
        }
        return best;
    }

    private List<Made<T>> all() {
        synchronized (kept) {
            return List.copyOf(kept);
        }
    }

    private Found<T> compare(Made<T> made, Records asked) {
        Map<RecordKind, Changed> changed = new EnumMap<>(RecordKind.class);
        int count = 0;
        if (made.of != asked) {
            for (RecordKind kind : kinds) {
                Changed ids = new Changed();
                made.of.differing(kind, asked, ids::add);
                changed.put(kind, ids);
                count += ids.count();
            }
        }
        return new Found<>(made.index, changed, count);
    }

    private T keep(Records of) {
        T index = make.apply(of);
        synchronized (kept) {
            kept.addFirst(new Made<>(of, index));
            if (kept.size() > KEPT) {
                kept.removeLast();
            }
        }
        return index;
    }

    @Override
    public void close() {
        background.shutdownNow();
    }

    /** An index and the state it was made of. */
    private record Made<T>(Records of, T index) {}

    /** An index, and by kind the identities that differ. */
    record Found<T>(T index, Map<RecordKind, Changed> changed, int count) {

        private static final Changed NONE = new Changed();

        Changed changed(RecordKind kind) {
            return changed.getOrDefault(kind, NONE);
        }
    }
}
