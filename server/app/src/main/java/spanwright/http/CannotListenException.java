package spanwright.http;

import java.io.Serial;

/** The address or the port that the server should listen at cannot be had. */
public final class CannotListenException extends RuntimeException {

    @Serial
    private static final long serialVersionUID = 1;

    CannotListenException(String host, int port) {
        super(
                "Cannot listen at " + host + " port " + port
                        + ": another program has it, or the address is not this machine's. Name another with --port or --host.");
    }
}
