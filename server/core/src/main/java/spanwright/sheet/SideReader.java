package spanwright.sheet;

import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Enclosure;
import spanwright.plant.FiberRange;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** Reads one side of a line: {@code F-1 ahead 1-12}, {@code S1 in}, {@code S1 out 1-8}, {@code E1/P/1-12 rear}. */
final class SideReader {

    private static final Pattern PORTS = Pattern.compile("([^/\\s]+)/([^/\\s]+)/([^/\\s]+)");
    private static final String NO_SUCH_LEG = "no-such-leg";

    private final EnclosureLegs legs;
    private final FiberWords fibers;

    SideReader(EnclosureLegs legs) {
        this.legs = legs;
        this.fibers = new FiberWords(legs.records());
    }

    SaidSide read(List<Word> words, TextPlace missing) throws MistakeFound {
        if (words.isEmpty()) {
            throw new MistakeFound(
                    missing,
                    "side-missing",
                    "Nothing stands here.",
                    "Name ends, such as F-1 ahead 1-12. Here are " + legs.words() + ".");
        }
        TextPlace place = words.get(0).place().to(words.get(words.size() - 1).place());
        if (words.get(0).text().indexOf('/') >= 0) {
            return ports(words, place);
        }
        String side = words.size() > 1 ? words.get(1).text() : "";
        return switch (side) {
            case "back" -> cable(words, LegKind.BACK, place);
            case "ahead" -> cable(words, LegKind.AHEAD, place);
            case "in" -> splitter(words, LegKind.IN, place);
            case "out" -> splitter(words, LegKind.OUT, place);
            default -> throw noDirection(words);
        };
    }

    private MistakeFound noDirection(List<Word> words) {
        Word code = words.get(0);
        List<CableLeg> known = legs.of(code.text());
        if (known.isEmpty()) {
            return noCable(code);
        }
        return new MistakeFound(
                words.size() > 1 ? words.get(1).place() : code.place(),
                "direction-missing",
                "It is not said on which side of the enclosure " + code.text() + " is meant.",
                "Write back or ahead after it: "
                        + String.join(
                                "; ", known.stream().map(CableLeg::nameToward).toList()) + ".");
    }

    private MistakeFound noCable(Word code) {
        return new MistakeFound(
                code.place(),
                NO_SUCH_LEG,
                "There is no " + code.text() + " in " + legs.code() + ".",
                "Here are " + legs.words() + ".");
    }

    /** The leg that a code and a direction name. */
    CableLeg leg(Word code, Word direction, LegKind kind) throws MistakeFound {
        Optional<CableLeg> leg = legs.find(code.text(), kind);
        if (leg.isPresent()) {
            return leg.get();
        }
        if (legs.of(code.text()).isEmpty()) {
            throw noCable(code);
        }
        throw new MistakeFound(
                direction.place(),
                NO_SUCH_LEG,
                code.text() + (kind == LegKind.BACK ? " begins in " : " ends in ") + legs.code() + ", so it has no "
                        + direction.text() + " here.",
                "Here are " + legs.words() + ".");
    }

    private SaidSide cable(List<Word> words, LegKind kind, TextPlace place) throws MistakeFound {
        CableLeg leg = leg(words.get(0), words.get(1), kind);
        List<Word> numbers = words.subList(2, words.size());
        if (numbers.size() == 1 && numbers.get(0).is("rest")) {
            return new SaidSide(place, leg.leg(), leg, null, null);
        }
        FiberRange range = fibers.read(numbers, leg, words.get(1).place());
        return new SaidSide(place, leg.leg(), leg, range, null);
    }

    /** The fibers of a leg that words name, without its code and direction. */
    FiberRange fibers(List<Word> words, CableLeg leg, TextPlace after) throws MistakeFound {
        return fibers.read(words, leg, after);
    }

    private SaidSide splitter(List<Word> words, LegKind kind, TextPlace place) throws MistakeFound {
        Word code = words.get(0);
        Splitter splitter = legs.findSplitter(code.text()).orElse(null);
        if (splitter == null) {
            throw new MistakeFound(
                    code.place(),
                    NO_SUCH_LEG,
                    "There is no splitter " + code.text() + " in " + legs.code() + ".",
                    "Here are " + legs.words() + ".");
        }
        boolean input = kind == LegKind.IN;
        int most = input ? splitter.inputs() : splitter.outputs();
        FiberRange range = words.size() == 2 && input ? FiberRange.of(1) : number(words, input);
        if (Math.max(range.first(), range.last()) > most) {
            throw new MistakeFound(
                    words.get(words.size() - 1).place(),
                    "number-above-count",
                    range + " is too large: splitter " + splitter.code() + " has " + (input ? "inputs" : "outputs")
                            + " 1 to " + most + ".",
                    "Name what it has.");
        }
        return new SaidSide(place, new Leg(kind, splitter.id()), null, range, null);
    }

    private static FiberRange number(List<Word> words, boolean input) throws MistakeFound {
        Word last = words.get(words.size() - 1);
        if (words.size() != 3) {
            throw new MistakeFound(
                    last.place(),
                    "bad-number",
                    input ? "One input or one range of inputs is named." : "No outputs are named.",
                    "Write " + words.get(0).text() + (input ? " in, or in 2." : " out 1-8."));
        }
        return FiberWords.range(last, input ? "in, or in 2" : "outputs such as 1-8");
    }

    private SaidSide ports(List<Word> words, TextPlace place) throws MistakeFound {
        Word named = words.get(0);
        Matcher written = PORTS.matcher(named.text());
        LegKind face = face(words);
        if (!written.matches()) {
            throw new MistakeFound(
                    named.place(),
                    "bad-port",
                    "'" + named.text() + "' names no ports.",
                    "Write the enclosure, the panel and the ports: " + legs.code() + "/P/1-12.");
        }
        Panel panel = panel(named, written.group(1), written.group(2));
        TextPlace at = new TextPlace(
                place.line(),
                named.place().column() + written.start(3),
                written.group(3).length());
        FiberRange range = FiberWords.range(new Word(written.group(3), at), "ports such as 1-12");
        if (Math.max(range.first(), range.last()) > panel.ports()) {
            throw new MistakeFound(
                    at,
                    "number-above-count",
                    range + " is too large: panel " + panel.code() + " has ports 1 to " + panel.ports() + ".",
                    "Name ports that it has.");
        }
        return new SaidSide(place, new Leg(face == null ? LegKind.REAR : face, panel.id()), null, range, face);
    }

    private static @Nullable LegKind face(List<Word> words) throws MistakeFound {
        if (words.size() == 1) {
            return null;
        }
        Word word = words.get(1);
        if (words.size() == 2 && (word.is("rear") || word.is("front"))) {
            return word.is("rear") ? LegKind.REAR : LegKind.FRONT;
        }
        throw new MistakeFound(
                word.place(),
                "word-too-many",
                "'" + word.text() + "' is not understood after ports.",
                "Write rear or front, or nothing: fibers join rears, ports join fronts.");
    }

    private Panel panel(Word named, String enclosure, String code) throws MistakeFound {
        Enclosure holder = legs.records().enclosures().find(enclosure).orElse(null);
        int structure = legs.records().enclosures().get(legs.enclosure()).structure();
        Panel panel = holder == null || holder.structure() != structure
                ? null
                : legs.records().findPanel(holder.id(), code).orElse(null);
        if (panel == null) {
            throw new MistakeFound(
                    named.place(),
                    "no-such-panel",
                    "There is no panel " + enclosure + "/" + code + " at this structure.",
                    "Name a panel of " + legs.code() + ", or for a jumper one of another enclosure of its structure.");
        }
        return panel;
    }
}
