package spanwright.draft;

import java.time.Clock;

class MemoryDraftsTest extends DraftBookContract {

    @Override
    protected DraftBook empty(Clock clock) {
        return new MemoryDrafts(clock);
    }
}
