package spanwright.sqlite;

import java.util.List;
import java.util.Objects;
import java.util.concurrent.locks.LockSupport;
import org.jspecify.annotations.Nullable;
import spanwright.network.Ledger;
import spanwright.network.Outcome;
import spanwright.records.Refusal;

/**
 * A posting that its caller waits for. Whoever makes it settles what became of it, and only then, once that is
 * durable, lets the caller go.
 */
final class Pending {

    final String by;
    final String reason;
    final Ledger.Entry entry;

    private final Thread caller = Thread.currentThread();
    private @Nullable Outcome outcome;
    private @Nullable Throwable thrown;
    private volatile boolean released;

    Pending(String by, String reason, Ledger.Entry entry) {
        this.by = by;
        this.reason = reason;
        this.entry = entry;
    }

    void settle(Outcome result) {
        outcome = result;
    }

    void refuse(String code, String sentence) {
        outcome = new Outcome.Refused(List.of(new Refusal(code, sentence, null, null, null)));
    }

    void fail(Throwable fault) {
        thrown = fault;
    }

    boolean failed() {
        return thrown != null;
    }

    /** Lets the caller go; it has been settled or has failed. */
    void release() {
        released = true;
        LockSupport.unpark(caller);
    }

    void wake() {
        LockSupport.unpark(caller);
    }

    boolean released() {
        return released;
    }

    /** What became of it. What its entry threw is thrown again. */
    Outcome result() {
        if (thrown instanceof RuntimeException fault) {
            throw fault;
        }
        if (thrown instanceof Error fault) {
            throw fault;
        }
        return Objects.requireNonNull(outcome);
    }
}
