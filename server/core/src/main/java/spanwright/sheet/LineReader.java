package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.plant.FiberRange;
import spanwright.splicing.EndCondition;
import spanwright.splicing.EndRange;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

/** Reads one line of a sheet. */
final class LineReader {

    private static final String STRAIGHT = "straight";
    private static final String REST = "rest";

    private final EnclosureLegs legs;
    private final SideReader sides;
    private final LegLineReader legLines;
    private final JoinReader joins = new JoinReader();

    LineReader(EnclosureLegs legs) {
        this.legs = legs;
        this.sides = new SideReader(legs);
        this.legLines = new LegLineReader(legs, sides);
    }

    LineSaid read(int number, String line) throws MistakeFound {
        LineParts parts = LineParts.of(number, line);
        if (parts.blank()) {
            return new LineSaid.Whole(List.of());
        }
        WordsBehind behind = new WordsBehind();
        for (List<Word> words : parts.behind()) {
            behind.take(words);
        }
        List<Word> said = parts.said();
        if (said.isEmpty()) {
            throw new MistakeFound(
                    parts.place(), "side-missing", "Nothing is said before the semicolon.", "Name ends first.");
        }
        if (said.get(0).is(REST) && said.size() == 2 && said.get(1).is(STRAIGHT)) {
            return restStraight(parts.place(), behind.words());
        }
        int equals = indexOfEquals(said);
        if (equals >= 0) {
            SaidSide a = sides.read(said.subList(0, equals), said.get(equals).place());
            TextPlace after = said.get(equals).place();
            SaidSide b = sides.read(
                    said.subList(equals + 1, said.size()), new TextPlace(number, after.column() + after.length(), 0));
            return joins.join(parts.place(), a, b, behind.words());
        }
        return withoutEquals(parts, behind.words());
    }

    private static int indexOfEquals(List<Word> said) {
        for (int index = 0; index < said.size(); index++) {
            if (said.get(index).is("=")) {
                return index;
            }
        }
        return -1;
    }

    private LineSaid withoutEquals(LineParts parts, JointWords words) throws MistakeFound {
        List<Word> said = parts.said();
        Optional<Statement> ofLeg = legLines.find(parts);
        if (ofLeg.isPresent()) {
            return new LineSaid.Whole(List.of(ofLeg.get()));
        }
        Word last = said.get(said.size() - 1);
        EndCondition condition = EndCondition.find(last.text()).orElse(null);
        if (condition == null) {
            Optional<Word> close =
                    said.stream().filter(word -> word.text().contains("=")).findFirst();
            throw new MistakeFound(
                    close.map(Word::place).orElse(last.place()),
                    "nothing-said",
                    close.isPresent()
                            ? "'" + close.get().text() + "' holds an = that does not stand alone."
                            : "It is not said what becomes of these ends.",
                    "Write = with a space on both sides and other ends behind it, or end with capped, stored,"
                            + " through or unknown.");
        }
        return state(parts.place(), said.subList(0, said.size() - 1), last, condition, words);
    }

    private LineSaid state(TextPlace place, List<Word> ends, Word last, EndCondition condition, JointWords words)
            throws MistakeFound {
        boolean bothWays = ends.size() > 1 && isBothWays(ends);
        if (bothWays && condition == EndCondition.THROUGH) {
            return through(place, ends, words);
        }
        SaidSide side = sides.read(ends, last.place());
        if (side.isPort()) {
            throw new MistakeFound(
                    side.place(), "not-an-end", "A port has no state.", "Name a cable's fibers or a splitter's ends.");
        }
        if (side.isRest()) {
            return new LineSaid.Rest(place, side, null, condition, words);
        }
        return new LineSaid.Whole(List.of(
                new Statement.States(place, side.ends(side.leg().kind()), condition, words.trust(), words.seen())));
    }

    /** Whether a cable is named without a direction, so in both. */
    private boolean isBothWays(List<Word> ends) {
        return !legs.of(ends.get(0).text()).isEmpty()
                && !List.of("back", "ahead").contains(ends.get(1).text());
    }

    private LineSaid through(TextPlace place, List<Word> ends, JointWords words) throws MistakeFound {
        Word code = ends.get(0);
        CableLeg back = legs.find(code.text(), LegKind.BACK).orElse(null);
        CableLeg ahead = legs.find(code.text(), LegKind.AHEAD).orElse(null);
        if (back == null || ahead == null || !back.middle()) {
            throw new MistakeFound(
                    code.place(),
                    "not-through",
                    code.text() + " begins or ends in " + legs.code() + ", so none of its fibers goes through.",
                    "Say that they are capped or stored, or what they join.");
        }
        if (ends.size() == 2 && ends.get(1).is(REST)) {
            return new LineSaid.RestThrough(place, back, ahead, words);
        }
        FiberRange range = sides.fibers(ends.subList(1, ends.size()), back, code.place());
        List<Statement> both = new ArrayList<>();
        for (Leg leg : List.of(back.leg(), ahead.leg())) {
            both.add(new Statement.States(
                    place, new EndRange(leg, range), EndCondition.THROUGH, words.trust(), words.seen()));
        }
        return new LineSaid.Whole(both);
    }

    /** The rest straight needs no names where the enclosure has two legs. */
    private LineSaid restStraight(TextPlace place, JointWords words) throws MistakeFound {
        List<CableLeg> all = legs.list();
        if (all.size() != 2) {
            throw new MistakeFound(
                    place,
                    "which-legs",
                    legs.code() + " has " + all.size() + " legs, so it is not clear which go straight.",
                    "Name them: " + (all.size() < 2 ? "F-1 back rest = F-2 ahead rest" : example(all)) + ".");
        }
        return joins.join(place, rest(place, all.get(0)), rest(place, all.get(1)), words);
    }

    private static String example(List<CableLeg> all) {
        return all.get(0).name() + " rest = " + all.get(all.size() - 1).name() + " rest";
    }

    private static SaidSide rest(TextPlace place, @Nullable CableLeg leg) {
        if (leg == null) {
            throw new IllegalStateException("no leg");
        }
        return new SaidSide(place, leg.leg(), leg, null, null);
    }
}
