package spanwright.http;

import java.time.Duration;
import java.util.Map;
import java.util.Timer;
import java.util.TimerTask;
import java.util.concurrent.ConcurrentHashMap;

/**
 * Stops answers that take too long: their thread is interrupted, which every answer notices at its next object.
 *
 * <p>Lost to this: a second pool of threads to wait on, which costs every short answer a hand-over.
 */
final class Watch implements AutoCloseable {

    private final long limitNanos;
    private final Map<Thread, Long> begun = new ConcurrentHashMap<>();
    private final Timer clock = new Timer("time-limit", true);

    Watch(Duration limit) {
        this.limitNanos = limit.toNanos();
        long every = Math.max(5, Math.min(500, limit.toMillis() / 4));
        clock.schedule(
                new TimerTask() {
                    @Override
                    public void run() {
                        stopLate();
                    }
                },
                every,
                every);
    }

    /** The answer of the calling thread begins. */
    void begin() {
        begun.put(Thread.currentThread(), System.nanoTime());
    }

    /** It has ended; a stop that came too late is forgotten with it. */
    void end() {
        if (begun.remove(Thread.currentThread()) == null) {
            Thread.interrupted();
        }
    }

    private void stopLate() {
        long now = System.nanoTime();
        // Removed atomically with the interrupt, so that a thread's next answer is never stopped for its last.
        begun.forEach((thread, since) -> begun.computeIfPresent(thread, (late, at) -> {
            if (now - at <= limitNanos) {
                return at;
            }
            late.interrupt();
            return null;
        }));
    }

    @Override
    public void close() {
        clock.cancel();
    }
}
