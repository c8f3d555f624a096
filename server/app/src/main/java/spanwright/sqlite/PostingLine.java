package spanwright.sqlite;

import java.util.Queue;
import java.util.concurrent.ConcurrentLinkedQueue;
import java.util.concurrent.locks.LockSupport;
import java.util.concurrent.locks.ReentrantLock;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;

/**
 * The line in which callers wait to post. The first in it makes the postings of all who stand behind it by then, in
 * one commit, and hands over to the next: one writes at a time, and none waits for a thread to be woken for it alone.
 *
 * <p>Lost to this: a thread that does nothing but write. For a single client it cost two switches of threads a
 * posting, half as much again as the commit itself.
 */
final class PostingLine {

    /** Makes postings. */
    @FunctionalInterface
    interface Maker {
        /** Takes postings from the line, one at least if there is one, and releases each that it took. */
        void make(Supplier<@Nullable Pending> line);
    }

    private final Queue<Pending> line = new ConcurrentLinkedQueue<>();
    private final ReentrantLock turn = new ReentrantLock();
    private final Maker maker;

    PostingLine(Maker maker) {
        this.maker = maker;
    }

    /** Waits until a posting has been made or refused. */
    void await(Pending pending) {
        if (turn.isHeldByCurrentThread()) {
            throw new IllegalStateException("a posting within a posting");
        }
        line.add(pending);
        boolean interrupted = false;
        while (!pending.released()) {
            if (turn.tryLock()) {
                try {
                    if (!pending.released()) {
                        maker.make(line::poll);
                    }
                } finally {
                    turn.unlock();
                    wakeNext();
                }
            } else {
                LockSupport.park(this);
                interrupted |= Thread.interrupted();
            }
        }
        if (interrupted) {
            Thread.currentThread().interrupt();
        }
    }

    private void wakeNext() {
        Pending next = line.peek();
        if (next != null) {
            next.wake();
        }
    }

    /** Does something while nobody posts. */
    void alone(Runnable action) {
        inTurn(() -> {
            action.run();
            return true;
        });
    }

    /** Asks something, or writes it, while nobody posts. */
    <T> T inTurn(Supplier<T> action) {
        turn.lock();
        try {
            return action.get();
        } finally {
            turn.unlock();
            wakeNext();
        }
    }
}
