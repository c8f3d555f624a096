package spanwright.plants;

import java.math.BigDecimal;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.PortRange;
import spanwright.journal.RecordKind;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;
import spanwright.splicing.EndCondition;
import spanwright.splicing.EndRange;
import spanwright.splicing.EndState;
import spanwright.splicing.FiberFlag;
import spanwright.splicing.Flag;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.SpliceMethod;
import spanwright.splicing.Splitter;

/** Draws splitters, panels and joints. */
final class DrawnJoints {

    private final Board board;

    DrawnJoints(Board board) {
        this.board = board;
    }

    void splitter(Words words) {
        Enclosure enclosure = board.enclosureOf(words.next());
        String code = words.next();
        String[] sides = words.next().split("x", -1);
        Loss loss = null;
        Map<Integer, Loss> taps = new HashMap<>();
        while (words.more()) {
            String[] parts = words.next().split("=", -1);
            Loss value = Loss.ofDecibels(new BigDecimal(parts[parts.length - 1]));
            if (parts.length == 1) {
                loss = value;
            } else {
                taps.put(Integer.valueOf(parts[0]), value);
            }
        }
        board.add(new Splitter(
                board.next(RecordKind.SPLITTER),
                enclosure.id(),
                code,
                Integer.parseInt(sides[0]),
                Integer.parseInt(sides[1]),
                loss,
                taps));
    }

    void panel(Words words) {
        Enclosure enclosure = board.enclosureOf(words.next());
        board.add(
                new Panel(board.next(RecordKind.PANEL), enclosure.id(), words.next(), (int) words.number(), "SC/APC"));
    }

    void splice(Words words) {
        Enclosure enclosure = board.enclosureOf(words.next());
        words.skip(":");
        EndRange a = end(enclosure, words);
        words.skip("=");
        EndRange b = end(enclosure, words);
        Map<String, String> options = words.options("");
        SpliceMethod method = options.containsKey("mechanical") ? SpliceMethod.MECHANICAL : SpliceMethod.FUSION;
        join(JointKind.SPLICE, enclosure.id(), a, b, facts(options, method, null));
    }

    void termination(Words words) {
        PortRange ports = board.ports(words.next());
        Enclosure enclosure = board.view
                .enclosures()
                .get(board.view.panels().get(ports.panel()).enclosure());
        words.skip("=");
        EndRange b = end(enclosure, words);
        Map<String, String> options = words.options("");
        EndRange a = new EndRange(new Leg(LegKind.REAR, ports.panel()), ports.ports());
        SpliceMethod method = options.containsKey("direct") ? null : SpliceMethod.FUSION;
        join(JointKind.TERMINATION, enclosure.id(), a, b, facts(options, method, null));
    }

    void jumper(Words words) {
        PortRange a = board.ports(words.next());
        words.skip("=");
        PortRange b = board.ports(words.next());
        Length length = words.more() ? words.length() : Length.ofMetres(3);
        join(
                JointKind.JUMPER,
                board.view.panels().get(a.panel()).enclosure(),
                new EndRange(new Leg(LegKind.FRONT, a.panel()), a.ports()),
                new EndRange(new Leg(LegKind.FRONT, b.panel()), b.ports()),
                facts(Map.of(), null, length));
    }

    void state(Words words) {
        Enclosure enclosure = board.enclosureOf(words.next());
        words.skip(":");
        EndRange ends = end(enclosure, words);
        words.skip("=");
        EndCondition condition = EndCondition.find(words.next()).orElseThrow();
        Trust trust =
                Trust.find(words.options("").getOrDefault("trust", "posted")).orElseThrow();
        board.add(new EndState(board.next(RecordKind.END_STATE), enclosure.id(), ends, condition, trust, null));
    }

    void flag(Words words) {
        Cable cable = board.cableOf(words.next());
        FiberRange fibers = Words.range(words.next());
        Flag flag = Flag.valueOf(words.next().toUpperCase(Locale.ROOT));
        board.add(new FiberFlag(
                board.next(RecordKind.FIBER_FLAG), cable.id(), fibers, flag, null, null, null, null, null));
    }

    private void join(JointKind type, int enclosure, EndRange a, EndRange b, JointFacts facts) {
        board.add(new Joint(board.next(RecordKind.JOINT), type, enclosure, a, b, facts));
    }

    private static JointFacts facts(
            Map<String, String> options, @Nullable SpliceMethod method, @Nullable Length length) {
        String loss = options.get("loss");
        return new JointFacts(
                options.get("tray"),
                method,
                loss == null ? null : Loss.ofDecibels(new BigDecimal(loss)),
                Trust.find(options.getOrDefault("trust", "posted")).orElseThrow(),
                null,
                null,
                null,
                null,
                options.get("job"),
                length);
    }

    private EndRange end(Enclosure enclosure, Words words) {
        String owner = words.next();
        String side = words.next();
        return switch (side) {
            case "in" ->
                new EndRange(
                        new Leg(LegKind.IN, splitterOf(enclosure, owner)),
                        Words.range(words.optional("").orElse("1")));
            case "out" -> new EndRange(new Leg(LegKind.OUT, splitterOf(enclosure, owner)), Words.range(words.next()));
            default -> new EndRange(leg(enclosure, board.cableOf(owner), side), Words.range(words.next()));
        };
    }

    /** In the enclosures of a ring a cable leaves ahead from its first row, back from its last. */
    private Leg leg(Enclosure enclosure, Cable cable, String side) {
        List<Pass> passes = board.view.passesOf(cable.id()).stream()
                .filter(pass -> pass.enclosure() == enclosure.id())
                .toList();
        boolean back = side.equals("back");
        Pass pass = passes.get(back ? passes.size() - 1 : 0);
        return new Leg(back ? LegKind.BACK : LegKind.AHEAD, pass.runRow());
    }

    private int splitterOf(Enclosure enclosure, String code) {
        return board.view.findSplitter(enclosure.id(), code).orElseThrow().id();
    }
}
