package spanwright.answers;

import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import spanwright.answers.Unanswerable.Kind;
import spanwright.circuits.Circuit;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.records.Records;
import spanwright.records.Relation;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;

/** Reads codes, ports and fibers, and says what was probably meant where there is no such thing. */
public final class References {

    private static final Pattern PORT = Pattern.compile("([^\\s,/:]+)/([^\\s,/:]+)/([0-9]{1,7})");
    private static final Pattern FIBER = Pattern.compile("([^\\s,/:]+):([0-9]{1,7})");

    /** The parameter that names what is cut. */
    static final String CUT = "cut";

    private final Records records;

    /** References into these records. */
    public References(Records records) {
        this.records = records;
    }

    /** The structure with a code. */
    public Structure structure(String code) {
        return records.structures()
                .find(code)
                .orElseThrow(() ->
                        missing("structure", code, records.structures().list().map(Structure::code)));
    }

    /** The span with a code. */
    public Span span(String code) {
        return records.spans()
                .find(code)
                .orElseThrow(() -> missing("span", code, records.spans().list().map(Span::code)));
    }

    /** The enclosure with a code. */
    public Enclosure enclosure(String code) {
        return records.enclosures()
                .find(code)
                .orElseThrow(() ->
                        missing("enclosure", code, records.enclosures().list().map(Enclosure::code)));
    }

    /** The cable with a code. */
    public Cable cable(String code) {
        return records.cables().find(code).orElseThrow(() -> missing("cable", code, cableCodes()));
    }

    /** The circuit with a code. */
    public Circuit circuit(String code) {
        return records.circuits()
                .find(code)
                .orElseThrow(
                        () -> missing("circuit", code, records.circuits().list().map(Circuit::code)));
    }

    /** The circuit with a code that a question names among others. */
    Circuit askedCircuit(String code) {
        return namedCircuit(code, "circuit");
    }

    /** The circuit that a parameter names. */
    Circuit namedCircuit(String code, String parameter) {
        return named(
                records.circuits().find(code),
                "circuit",
                code,
                parameter,
                records.circuits().list().map(Circuit::code));
    }

    /** The structure that a parameter names. */
    Structure namedStructure(String code, String parameter) {
        return named(
                records.structures().find(code),
                "structure",
                code,
                parameter,
                records.structures().list().map(Structure::code));
    }

    /** A span that is cut. */
    Span cutSpan(String code) {
        return named(
                records.spans().find(code),
                "span",
                code,
                CUT,
                records.spans().list().map(Span::code));
    }

    /** A structure that is cut. */
    Structure cutStructure(String code) {
        return namedStructure(code, CUT);
    }

    /** An enclosure that is cut. */
    Enclosure cutEnclosure(String code) {
        return named(
                records.enclosures().find(code),
                "enclosure",
                code,
                CUT,
                records.enclosures().list().map(Enclosure::code));
    }

    /** A cable that is cut. */
    Cable cutCable(String code) {
        return named(records.cables().find(code), "cable", code, CUT, cableCodes());
    }

    /** An enclosure that was opened. */
    Enclosure openedEnclosure(String code) {
        return named(
                records.enclosures().find(code),
                "enclosure",
                code,
                "opened",
                records.enclosures().list().map(Enclosure::code));
    }

    /** The cable with a code, or all reels of the longer cable with that name. */
    List<Cable> cutCables(String name) {
        List<Cable> reels = records.cables()
                .list()
                .filter(cable -> name.equals(cable.code()) || name.equals(cable.partOf()))
                .toList();
        return reels.isEmpty() ? List.of(cutCable(name)) : reels;
    }

    /** The key of the front of a port written {@code E1/P/1}. */
    public long front(String port) {
        return front(port, "port");
    }

    /** The key of the front of a port that a parameter names. */
    long front(String port, String parameter) {
        Matcher written = PORT.matcher(port);
        if (!written.matches()) {
            throw wrong(
                    "'" + port + "' is not a port; a port is written enclosure/panel/number, such as E1/P/1.",
                    parameter);
        }
        Enclosure enclosure = namedEnclosure(written.group(1), parameter);
        Panel panel = named(
                records.findPanel(enclosure.id(), written.group(2)),
                "panel in " + enclosure.code(),
                written.group(2),
                parameter,
                records.panels()
                        .owned(Relation.ENCLOSURE_PANELS, enclosure.id())
                        .map(Panel::code));
        int number = Integer.parseInt(written.group(3));
        if (number < 1 || number > panel.ports()) {
            throw absent(
                    enclosure.code() + "/" + panel.code() + " has ports 1 to " + panel.ports() + ", not " + number
                            + ".",
                    parameter);
        }
        return EndKey.of(LegKind.FRONT, panel.id(), number);
    }

    /** A fiber written {@code F-1:3}. */
    public FiberRef fiber(String fiber) {
        Matcher written = FIBER.matcher(fiber);
        if (!written.matches()) {
            throw wrong("'" + fiber + "' is not a fiber; a fiber is written cable:number, such as F-1:3.", "fiber");
        }
        int number = Integer.parseInt(written.group(2));
        return new FiberRef(cable(written.group(1), number, "fiber"), number);
    }

    /** The cable that a parameter names, which must have a fiber of that number. */
    Cable cable(String code, int fiber, String parameter) {
        Cable cable = named(records.cables().find(code), "cable", code, parameter, cableCodes());
        int count = records.cableTypes().get(cable.cableType()).fibers();
        if (fiber < 1 || fiber > count) {
            throw absent(cable.code() + " has fibers 1 to " + count + ", not " + fiber + ".", parameter);
        }
        return cable;
    }

    /** The enclosure that a parameter names. */
    Enclosure namedEnclosure(String code, String parameter) {
        return named(
                records.enclosures().find(code),
                "enclosure",
                code,
                parameter,
                records.enclosures().list().map(Enclosure::code));
    }

    private Stream<String> cableCodes() {
        return records.cables().list().map(Cable::code);
    }

    private static <T> T named(
            Optional<T> found, String kind, String code, String parameter, Stream<String> candidates) {
        return found.orElseThrow(
                () -> absent("There is no " + kind + " " + code + "." + NearMiss.hint(code, candidates), parameter));
    }

    private static Unanswerable missing(String kind, String code, Stream<String> candidates) {
        String sentence = "There is no " + kind + " " + code + "." + NearMiss.hint(code, candidates);
        return new Unanswerable(Kind.NOT_FOUND, sentence);
    }

    private static Unanswerable absent(String sentence, String parameter) {
        return new Unanswerable(Kind.BAD_REFERENCE, sentence, parameter);
    }

    private static Unanswerable wrong(String sentence, String parameter) {
        return new Unanswerable(Kind.BAD_REQUEST, sentence, parameter);
    }

    /**
     * A fiber of a cable.
     *
     * @param cable the cable
     * @param number from 1 to the cable's count
     */
    public record FiberRef(Cable cable, int number) {}
}
