package spanwright.sqlite;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.time.Clock;
import org.junit.jupiter.api.io.TempDir;
import spanwright.network.Ledger;
import spanwright.network.LedgerContract;

class SqliteLedgerTest extends LedgerContract {

    @TempDir
    private Path folder;

    @Override
    protected Ledger open(Clock clock) {
        Opening opening = SqliteLedger.open(folder.resolve("plant.spanwright"), Access.WRITE, clock);
        assertThat(opening).isInstanceOf(Opening.Opened.class);
        return ((Opening.Opened) opening).ledger();
    }
}
