package sallowmere.check;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** What a walk met: lengths in metres, joints, and where it came to an end. */
public final class Journey {
    final String start;
    final Map<String, Double> events = new LinkedHashMap<>();
    final List<Stretch> stretches = new ArrayList<>();
    String end;
    double sheath;
    double glass;
    int splices;
    int connectors;
    int splitters;
    int jumpers;
    int steps;

    Journey(String start) {
        this.start = start;
        this.end = start;
    }

    /** Where it ended: a port, or the end of a fiber or splitter that nothing is joined to. */
    public String end() {
        return end;
    }

    /** The pieces of cable that it took, in order. */
    public List<Stretch> stretches() {
        return stretches;
    }

    /** Metres of glass. */
    public double glass() {
        return glass;
    }

    /** Metres of glass from the start to each enclosure where the fiber is cut, in order. */
    public Map<String, Double> events() {
        return events;
    }

    /** Loss in dB with the demo's own planning values, jumpers of 3 m at the fiber's loss. */
    public double loss(double perKilometre) {
        return (glass + 3 * jumpers) / 1000 * perKilometre + 0.1 * splices + 0.35 * connectors + 17.5 * splitters;
    }
}
