package spanwright.network;

import java.time.Clock;

class MemoryLedgerTest extends LedgerContract {

    @Override
    protected Ledger open(Clock clock) {
        return new MemoryLedger(clock);
    }
}
