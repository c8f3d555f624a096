package spanwright.network;

import java.time.Clock;
import java.time.Instant;
import java.time.ZoneId;
import java.time.ZoneOffset;

/** A clock that stands where it is set, in UTC; for tests. */
public final class SetClock extends Clock {

    private volatile Instant now;

    /** A clock that stands at an instant. */
    public SetClock(Instant now) {
        this.now = now;
    }

    /** Sets the clock, forward or back. */
    public void set(Instant instant) {
        now = instant;
    }

    @Override
    public Instant instant() {
        return now;
    }

    @Override
    public ZoneId getZone() {
        return ZoneOffset.UTC;
    }

    @Override
    public Clock withZone(ZoneId zone) {
        return this;
    }
}
