package spanwright.answers;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import spanwright.answers.Unanswerable.Kind;
import spanwright.fault.KnownEvent;
import spanwright.fault.Reading;
import spanwright.quantity.Length;
import spanwright.quantity.Wavelength;

/**
 * A distance read on an OTDR, and the shot that it was read on.
 *
 * @param port the port that was shot, or null
 * @param from the end that was shot, or null; exactly one of the two
 * @param to a port or an end that the path reaches, or null
 * @param shot the distance and how it was taken
 * @param events known joints of the same shot, each {@code C-S03=6038}
 * @param far a shot from the far end, or null
 */
public record FaultQuestion(
        @Nullable String port,
        @Nullable String from,
        @Nullable String to,
        Shot shot,
        List<String> events,
        @Nullable Far far) {

    private static final Wavelength USUAL = Wavelength.ofNanometres(1550);
    private static final Pattern METRES = Pattern.compile("[0-9]{1,9}(\\.[0-9]{1,9})?");
    private static final BigDecimal MOST_METRES = BigDecimal.valueOf(100_000_000);
    private static final BigDecimal LEAST_INDEX = BigDecimal.ONE;
    private static final BigDecimal MOST_INDEX = BigDecimal.TEN;

    /** Keeps its own copy; refuses more than one place to shoot from, and none. */
    public FaultQuestion {
        events = List.copyOf(events);
        if ((port == null) == (from == null)) {
            throw new Unanswerable(
                    Kind.BAD_REQUEST,
                    (port == null ? "Nothing says where the shot begins" : "Two things say where the shot begins")
                            + "; name a port, or an end.");
        }
    }

    /**
     * A distance as an instrument shows it.
     *
     * @param distance in meters, launch fiber included
     * @param launch length of the launch fiber in meters
     * @param index the group index set on the instrument, or null: meters of glass as they are
     * @param wavelength in nm, or null: 1550
     */
    public record Shot(
            BigDecimal distance,
            BigDecimal launch,
            @Nullable BigDecimal index,
            @Nullable BigDecimal wavelength) {

        private Reading reading(List<KnownEvent> events) {
            return new Reading(
                    metres(distance, "distance"),
                    metres(launch, "launch"),
                    index == null ? null : groupIndex(index),
                    wavelength == null ? USUAL : TraceQuestion.wavelength(wavelength),
                    events);
        }

        private static double groupIndex(BigDecimal index) {
            if (index.compareTo(LEAST_INDEX) < 0 || index.compareTo(MOST_INDEX) > 0) {
                throw new Unanswerable(
                        Kind.BAD_REQUEST,
                        index.toPlainString() + " is not a group index of glass; 1.4682 is one.",
                        "index");
            }
            return index.doubleValue();
        }
    }

    /**
     * A shot from the far end, with the index and at the wavelength of the near one.
     *
     * @param port the port that was shot
     * @param distance in meters, launch fiber included
     * @param launch length of its launch fiber in meters
     */
    public record Far(String port, BigDecimal distance, BigDecimal launch) {

        /** A far shot of its parts; null where there is none, refused where there is half of one. */
        public static @Nullable Far of(
                @Nullable String port, @Nullable BigDecimal distance, @Nullable BigDecimal launch) {
            if (port == null && distance == null && launch == null) {
                return null;
            }
            if (port == null || distance == null) {
                throw new Unanswerable(
                        Kind.BAD_REQUEST,
                        "A shot from the far end needs its port and its distance.",
                        port == null ? "far_port" : "far_distance");
            }
            return new Far(port, distance, launch == null ? BigDecimal.ZERO : launch);
        }
    }

    private static Length metres(BigDecimal metres, String parameter) {
        if (metres.signum() < 0 || metres.compareTo(MOST_METRES) > 0) {
            throw new Unanswerable(
                    Kind.BAD_REQUEST,
                    metres.toPlainString() + " is not a distance in meters; it is 0 or above.",
                    parameter);
        }
        return Length.ofMetres(metres);
    }

    /** The near reading, its events found in the records. */
    Reading reading(References references) {
        List<KnownEvent> known = new ArrayList<>();
        for (String event : events) {
            int equals = event.lastIndexOf('=');
            String reading = event.substring(equals + 1).strip();
            if (equals < 1 || !METRES.matcher(reading).matches()) {
                throw new Unanswerable(
                        Kind.BAD_REQUEST,
                        "'" + event + "' is not a known event; one is written enclosure=meters, such as C-S03=6038.",
                        "event");
            }
            known.add(new KnownEvent(
                    references.namedEnclosure(event.substring(0, equals).strip(), "event"),
                    metres(new BigDecimal(reading), "event")));
        }
        return shot.reading(known);
    }

    /** The far reading. */
    Reading farReading(Far asked) {
        Reading reading =
                new Shot(asked.distance(), asked.launch(), shot.index(), shot.wavelength()).reading(List.of());
        metres(asked.distance(), "far_distance");
        return reading;
    }
}
