package spanwright.trace;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.circuits.PortRange;
import spanwright.plant.Enclosure;
import spanwright.plant.Pass;
import spanwright.plant.PlantState;
import spanwright.plant.RunRow;
import spanwright.plants.PlainGlass;
import spanwright.records.RecordsView;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;
import spanwright.splicing.Splitter;

/**
 * Traces by recursion over plain maps, from the sentences of the records folder, and writes what it finds as the lines of
 * {@link TraceText}. It shares no code with the tracer.
 */
final class TraceTwin {

    private final RecordsView records;
    private final PlainGlass glass;
    private final TwinText text;
    private final Set<Long> ends;

    TraceTwin(RecordsView records, PlainGlass glass) {
        this.records = records;
        this.glass = glass;
        this.text = new TwinText(records, glass);
        this.ends = Set.copyOf(glass.ends());
    }

    /** One piece met: in by one end, out by the other; of a splitter in by one terminal, out by another. */
    record Visit(long in, long out) {

        Visit turned() {
            return new Visit(out, in);
        }
    }

    /** A walk and how it ended: FREE, FOUND, CHOICE, CIRCLE or CROSSED. */
    private record Found(List<Visit> visits, String stop) {

        boolean loop() {
            return stop.equals("CIRCLE") || stop.equals("CROSSED");
        }
    }

    /** What a walk may do. */
    private record Rules(@Nullable Long target, boolean choose) {}

    private static final Rules EVERYWHERE = new Rules(null, true);
    private static final Rules NO_CHOICE = new Rules(null, false);

    private List<Found> walks(long in, Rules rules) {
        List<Found> found = new ArrayList<>();
        walk(in, in, List.of(), Set.of(), rules, found);
        return found;
    }

    private void walk(long start, long in, List<Visit> before, Set<Long> crossed, Rules rules, List<Found> found) {
        if (splitter(in)) {
            cross(start, in, before, crossed, rules, found);
            return;
        }
        long out = glass.across(in);
        goOn(start, new Visit(in, out), before, crossed, rules, found);
    }

    private void cross(long start, long in, List<Visit> before, Set<Long> crossed, Rules rules, List<Found> found) {
        List<Long> others = otherSide(in);
        if (others.size() > 1 && !rules.choose()) {
            found.add(new Found(with(before, new Visit(in, in)), "CHOICE"));
            return;
        }
        Set<Long> now = new HashSet<>(crossed);
        now.add(in);
        boolean said = false;
        for (long out : others) {
            if (now.contains(out)) {
                if (!said) {
                    found.add(new Found(with(before, new Visit(in, in)), "CROSSED"));
                }
                said = true;
            } else {
                Set<Long> then = new HashSet<>(now);
                then.add(out);
                goOn(start, new Visit(in, out), before, then, rules, found);
            }
        }
    }

    private void goOn(long start, Visit visit, List<Visit> before, Set<Long> crossed, Rules rules, List<Found> found) {
        List<Visit> visits = with(before, visit);
        Long next = glass.peer(visit.out());
        if (rules.target() != null && rules.target() == visit.out()) {
            found.add(new Found(visits, "FOUND"));
        } else if (next == null) {
            found.add(new Found(visits, "FREE"));
        } else if (next == start) {
            found.add(new Found(visits, "CIRCLE"));
        } else {
            walk(start, next, visits, crossed, rules, found);
        }
    }

    private static List<Visit> with(List<Visit> before, Visit visit) {
        List<Visit> visits = new ArrayList<>(before);
        visits.add(visit);
        return visits;
    }

    private static boolean splitter(long key) {
        return EndKey.kind(key) == LegKind.IN || EndKey.kind(key) == LegKind.OUT;
    }

    private List<Long> otherSide(long key) {
        Splitter splitter = records.splitters().get(EndKey.owner(key));
        boolean in = EndKey.kind(key) == LegKind.IN;
        List<Long> others = new ArrayList<>();
        for (int number = 1; number <= (in ? splitter.outputs() : splitter.inputs()); number++) {
            others.add(EndKey.of(in ? LegKind.OUT : LegKind.IN, splitter.id(), number));
        }
        return others;
    }

    private boolean there(long key) {
        return ends.contains(key);
    }

    /** The lines of {@code --port}. */
    List<String> ofPort(int panel, int port) {
        long front = EndKey.of(LegKind.FRONT, panel, port);
        if (!there(front)) {
            return List.of(text.nothing(front));
        }
        List<String> lines = new ArrayList<>();
        for (Found walk : walks(front, EVERYWHERE)) {
            lines.add(line(front, walk));
        }
        return lines;
    }

    private String line(long front, Found walk) {
        if (walk.loop()) {
            return text.circle(walk.visits(), walk.stop().equals("CIRCLE"));
        }
        return text.open(front, walk.visits(), last(walk), circuits(front, last(walk)));
    }

    private static long last(Found walk) {
        return walk.visits().get(walk.visits().size() - 1).out();
    }

    private List<String> circuits(long one, long other) {
        return EndKey.kind(one) == LegKind.FRONT && EndKey.kind(other) == LegKind.FRONT
                ? List.copyOf(glass.circuits(one, other))
                : List.of();
    }

    /** The lines of {@code --circuit}. */
    List<String> ofCircuit(Circuit circuit) {
        List<String> lines = new ArrayList<>();
        for (int index = 0; index < circuit.fibers(); index++) {
            lines.add(ofCircuit(circuit, front(circuit.a(), index), front(circuit.z(), index)));
        }
        return lines;
    }

    private static long front(PortRange ports, int index) {
        return EndKey.of(LegKind.FRONT, ports.panel(), ports.ports().at(index));
    }

    private String ofCircuit(Circuit circuit, long a, long z) {
        if (!there(a)) {
            return text.nothing(a);
        }
        for (Found walk : walks(a, new Rules(z, true))) {
            if (walk.stop().equals("FOUND")) {
                Set<String> codes = new TreeSet<>(circuits(a, z));
                codes.add(circuit.code());
                return text.open(a, walk.visits(), z, List.copyOf(codes));
            }
        }
        Found plain = walks(a, NO_CHOICE).get(0);
        if (plain.loop()) {
            return line(a, plain);
        }
        List<String> codes = new ArrayList<>(circuits(a, last(plain)));
        return text.incomplete(a, plain.visits(), last(plain), codes);
    }

    /** The lines of {@code --fiber}. */
    List<String> ofFiber(int cable, int fiber) {
        Set<String> lines = new LinkedHashSet<>();
        for (List<Visit> piece : pieces(cable, fiber)) {
            Visit first = piece.get(0);
            List<Found> backward = walks(first.out(), EVERYWHERE);
            List<Found> onward = walks(first.in(), EVERYWHERE);
            for (Found back : backward) {
                List<Visit> before = turned(back);
                if (back.stop().equals("CROSSED")) {
                    lines.add(text.circleOf(List.of(piece, before), true));
                } else if (!back.loop()) {
                    onward.stream().filter(on -> !on.loop()).forEach(on -> lines.add(join(before, back, on)));
                }
            }
            for (Found on : onward) {
                if (on.loop()) {
                    lines.add(text.circle(on.visits(), on.stop().equals("CIRCLE")));
                }
            }
        }
        return List.copyOf(lines);
    }

    /** What a walk backward met before it came to its piece, in the cable's direction. */
    private static List<Visit> turned(Found back) {
        List<Visit> visits = new ArrayList<>();
        for (Visit visit : back.visits().subList(1, back.visits().size())) {
            visits.add(visit.turned());
        }
        Collections.reverse(visits);
        return visits;
    }

    private String join(List<Visit> before, Found back, Found on) {
        Set<Long> met = new HashSet<>();
        before.forEach(visit -> met.addAll(List.of(visit.in(), visit.out())));
        for (int index = 0; index < on.visits().size(); index++) {
            Visit visit = on.visits().get(index);
            if (met.contains(visit.in()) || met.contains(visit.out())) {
                List<Visit> until = new ArrayList<>(on.visits().subList(0, index));
                if (!met.contains(visit.in())) {
                    until.add(new Visit(visit.in(), visit.in()));
                }
                return text.circleOf(List.of(until, before), true);
            }
        }
        List<Visit> all = new ArrayList<>(before);
        all.addAll(on.visits());
        return text.open(last(back), all, last(on), circuits(last(back), last(on)));
    }

    /** The pieces of a fiber from its cable's start on, each as the sections from cut to cut. */
    private List<List<Visit>> pieces(int cable, int fiber) {
        List<List<Visit>> pieces = new ArrayList<>();
        List<Visit> piece = new ArrayList<>();
        for (Visit section : sections(cable, fiber)) {
            Visit before = piece.isEmpty() ? null : piece.get(piece.size() - 1);
            boolean uncut = before != null
                    && Objects.equals(glass.peer(before.out()), section.in())
                    && glass.joint(section.in()) == 0;
            if (!uncut && before != null) {
                pieces.add(piece);
                piece = new ArrayList<>();
            }
            piece.add(section);
        }
        if (!piece.isEmpty()) {
            pieces.add(piece);
        }
        return pieces;
    }

    private List<Visit> sections(int cable, int fiber) {
        List<Visit> sections = new ArrayList<>();
        List<RunRow> run = records.runOf(cable);
        int from = 0;
        for (int row = 1; row < run.size(); row++) {
            boolean cut = row == run.size() - 1 || TwinText.enclosure(records, run.get(row)) != null;
            long in = EndKey.of(LegKind.AHEAD, run.get(from).id(), fiber);
            if (cut && there(in)) {
                sections.add(new Visit(in, EndKey.of(LegKind.BACK, run.get(row).id(), fiber)));
            }
            from = cut ? row : from;
        }
        return sections;
    }

    static @Nullable Enclosure inService(RecordsView records, @Nullable Pass pass) {
        Enclosure enclosure = pass == null ? null : records.enclosures().get(pass.enclosure());
        return enclosure != null && enclosure.state() == PlantState.IN_SERVICE ? enclosure : null;
    }
}
