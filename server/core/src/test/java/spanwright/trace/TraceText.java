package spanwright.trace;

import java.util.List;
import java.util.stream.Collectors;
import spanwright.circuits.Circuit;
import spanwright.circuits.PortRange;
import spanwright.network.Snapshot;
import spanwright.plant.Enclosure;
import spanwright.plants.Drawing;

/**
 * Paths as lines of text, in the notation of the records folder:
 *
 * <pre>
 * E1/P/1 >> (E1/P/1) | E1/P/1 ~ F-1 ahead 3 | F-1:3 E1-E4 1200/1212 | through E4 | S1 in>out 5 | E5/P/1 -3- E5/Q/1 >> end
 * </pre>
 *
 * A connector in parentheses, a splice with {@code ~}, a fiber with its sheath and glass in metres, a jumper with its
 * length between dashes, then whether it is complete and on which circuits.
 */
final class TraceText {

    private TraceText() {}

    static String ofPort(Snapshot snapshot, String port) {
        PortRange ports = Drawing.ports(snapshot.records(), port);
        return lines(new Tracer(snapshot).fromPort(ports.panel(), ports.ports().first()));
    }

    static String ofFiber(Snapshot snapshot, String cable, int fiber) {
        int id = snapshot.records().cables().find(cable).orElseThrow().id();
        return lines(new Tracer(snapshot).ofFiber(id, fiber));
    }

    static String ofCircuit(Snapshot snapshot, String code) {
        Circuit circuit = snapshot.records().circuits().find(code).orElseThrow();
        return lines(new Tracer(snapshot).ofCircuit(circuit));
    }

    static String lines(List<Path> paths) {
        return paths.stream().map(TraceText::line).collect(Collectors.joining("\n"));
    }

    static String line(Path path) {
        String elements = path.elements().stream().map(TraceText::element).collect(Collectors.joining(" | "));
        String circuits = path.circuits().stream().map(Circuit::code).collect(Collectors.joining(","));
        String tail = (path.complete() ? " complete" : "") + (circuits.isEmpty() ? "" : " " + circuits);
        if (path.loop()) {
            return "circle: " + elements + tail;
        }
        return path.ends().get(0).name() + " >> " + elements + " >> "
                + path.ends().get(1).name() + tail;
    }

    static String element(Element element) {
        return switch (element.kind()) {
            case CONNECTOR -> "(" + ((Connector) element).name() + ")";
            case SPLICE -> splice((Splice) element);
            case FIBER -> fiber((Fiber) element);
            case THROUGH -> "through " + ((Through) element).enclosure().code();
            case JUMPER -> ((Jumper) element).a() + " -" + plain(element) + "- " + ((Jumper) element).b();
            case SPLITTER -> splitter((SplitterCrossing) element);
        };
    }

    private static String splice(Splice splice) {
        return splice.a() + " ~ " + splice.b();
    }

    private static String fiber(Fiber fiber) {
        return fiber.cable().code() + ":" + fiber.fiber() + " "
                + fiber.from().map(Enclosure::code).orElse("-") + ">"
                + fiber.to().map(Enclosure::code).orElse("-") + " "
                + fiber.sheath().exactMetres().toPlainString() + "/" + plain(fiber);
    }

    private static String plain(Element element) {
        return element.glass().exactMetres().toPlainString();
    }

    private static String splitter(SplitterCrossing crossing) {
        String in = crossing.input() == 1 ? "in" : "in " + crossing.input();
        String out = "out " + crossing.output();
        return crossing.splitter().code() + " " + (crossing.towardOutput() ? in + ">" + out : out + ">" + in);
    }
}
