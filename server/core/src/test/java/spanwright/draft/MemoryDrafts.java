package spanwright.draft;

import java.time.Clock;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.NoSuchElementException;
import java.util.Objects;
import java.util.Optional;
import java.util.TreeMap;
import spanwright.records.Refusal;

/** A book of drafts that forgets all at its end: the plain twin of the real one, for tests. */
public final class MemoryDrafts implements DraftBook {

    private final Clock clock;
    private final List<Draft> drafts = new ArrayList<>();
    private final List<Map<Integer, DraftText>> versions = new ArrayList<>();

    /** An empty book at the time of a clock. */
    public MemoryDrafts(Clock clock) {
        this.clock = clock;
    }

    @Override
    public synchronized List<Draft> list() {
        List<Draft> list = new ArrayList<>(drafts);
        Collections.reverse(list);
        return list;
    }

    @Override
    public synchronized Optional<Draft> find(int id) {
        return id < 1 || id > drafts.size() ? Optional.empty() : Optional.of(drafts.get(id - 1));
    }

    @Override
    public synchronized DraftOutcome begin(DraftStart start) {
        Optional<Refusal> refused = DraftRules.refuse(start);
        if (refused.isPresent()) {
            return new DraftOutcome.Refused(List.of(refused.get()));
        }
        Draft draft = DraftRules.begin(drafts.size() + 1, start, now());
        drafts.add(draft);
        versions.add(new TreeMap<>(Map.of(1, draft.text())));
        return new DraftOutcome.Kept(draft);
    }

    @Override
    public synchronized DraftOutcome change(int id, int revision, DraftStep step) {
        Draft draft = find(id).orElseThrow(() -> new NoSuchElementException("There is no draft " + id + "."));
        if (draft.revision() != revision) {
            return new DraftOutcome.Stale(draft);
        }
        Optional<Refusal> refused = DraftRules.refuse(draft, step);
        if (refused.isPresent()) {
            return new DraftOutcome.Refused(List.of(refused.get()));
        }
        Map<Integer, DraftText> texts = versions.get(id - 1);
        Draft after = DraftRules.after(draft, step, now(), number -> Objects.requireNonNull(texts.get(number)));
        texts.put(after.steps().at(), after.text());
        texts.keySet()
                .removeIf(number -> number < after.steps().oldest()
                        || number > after.steps().newest());
        drafts.set(id - 1, after);
        return new DraftOutcome.Kept(after);
    }

    private Instant now() {
        return clock.instant().truncatedTo(ChronoUnit.MICROS);
    }
}
