package spanwright.suspicion;

import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.plant.Enclosure;
import spanwright.plant.Span;
import spanwright.quantity.Length;
import spanwright.splicing.Joint;

/**
 * What may have caused an outage: spans and enclosures that the alarms do not tell apart.
 *
 * @param kind what kind of cause
 * @param span the likeliest span, or null where there is none
 * @param enclosure the likeliest enclosure where there is no span, else null
 * @param spans all spans, in order along the route
 * @param enclosures all enclosures, in order along the route
 * @param route the length of the spans together
 * @param tubes the tubes that it means, {@code F-1/7}; none where it means whole sheaths
 * @param ports the ports behind which it lies; none where it does not lie behind a port
 * @param explains the circuits that it explains
 * @param contradicts the circuits that are up although it should have taken them down
 * @param score the logarithm of its odds
 * @param restsOn joints on the paths of the explained circuits that the records are not sure of, the first few
 */
public record Suspect(
        Kind kind,
        @Nullable Span span,
        @Nullable Enclosure enclosure,
        List<Span> spans,
        List<Enclosure> enclosures,
        Length route,
        List<String> tubes,
        List<String> ports,
        List<Circuit> explains,
        List<Circuit> contradicts,
        double score,
        List<Joint> restsOn) {

    /** Keeps its own copies of the lists. */
    public Suspect {
        spans = List.copyOf(spans);
        enclosures = List.copyOf(enclosures);
        tubes = List.copyOf(tubes);
        ports = List.copyOf(ports);
        explains = List.copyOf(explains);
        contradicts = List.copyOf(contradicts);
        restsOn = List.copyOf(restsOn);
    }

    /** What kind of cause. */
    public enum Kind {
        /** Glass is broken. */
        CUT("cut"),
        /** Joints were made wrongly when an enclosure was opened lately. */
        CROSSED("crossed"),
        /** Equipment, jumper or drop behind a port. */
        END("end");

        private final String word;

        Kind(String word) {
            this.word = word;
        }

        /** How an answer writes it. */
        public String word() {
            return word;
        }
    }
}
