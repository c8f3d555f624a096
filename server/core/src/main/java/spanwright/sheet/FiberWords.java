package spanwright.sheet;

import java.util.List;
import java.util.OptionalInt;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import spanwright.plant.FiberColors;
import spanwright.plant.FiberRange;
import spanwright.records.RecordsView;
import spanwright.records.Relation;
import spanwright.splicing.FiberCount;

/**
 * Fibers as a line names them: {@code 7}, {@code 1-12}, {@code 12-1}; {@code tube 3}, {@code tube GR}, {@code tubes 1-3}
 * whole; {@code tube GR 1-6}, {@code tube GR SL} by their places within the tube. Colours are those of the cable's own
 * order, never others.
 */
final class FiberWords {

    private static final Pattern RANGE = Pattern.compile("([0-9]{1,6})(?:-([0-9]{1,6}))?");
    private static final String BAD_NUMBER = "bad-number";

    private final RecordsView records;

    FiberWords(RecordsView records) {
        this.records = records;
    }

    /** The fibers that words name on a leg. */
    FiberRange read(List<Word> words, CableLeg leg, TextPlace after) throws MistakeFound {
        if (words.isEmpty()) {
            throw new MistakeFound(
                    new TextPlace(after.line(), after.column() + after.length(), 0),
                    "fibers-missing",
                    "No fibers are named after " + leg.name() + ".",
                    "Write a range such as " + leg.name() + " 1-"
                            + Math.min(12, leg.type().fibers()) + ", or " + leg.name() + " tube 1.");
        }
        Word first = words.get(0);
        boolean tubes = first.is("tube") || first.is("tubes");
        int most = tubes ? 3 : 1;
        if (words.size() > most) {
            Word extra = words.get(most);
            throw new MistakeFound(
                    extra.place(),
                    "word-too-many",
                    "'" + extra.text() + "' is not understood after the fibers.",
                    "Write one range a line; what else is to be said stands behind a semicolon.");
        }
        return tubes ? inTubes(words, leg) : fibers(first, leg);
    }

    private FiberRange fibers(Word word, CableLeg leg) throws MistakeFound {
        FiberRange range = range(word, "a number, a range such as 1-12, or tube and its number or letters");
        int most = leg.type().fibers();
        if (Math.max(range.first(), range.last()) > most) {
            String count = inAnotherCount(leg, range);
            throw new MistakeFound(
                    word.place(),
                    "number-above-count",
                    range + " is too large: " + leg.cable().code() + " has fibers 1 to " + most + "."
                            + (count == null ? "" : " " + count),
                    count == null
                            ? "Name fibers that the cable has."
                            : "Write the cable's own numbers; both are shown.");
        }
        return range;
    }

    /** Where the numbers are those of another count: which fibers bear them there. Both are said, none is inferred. */
    private @Nullable String inAnotherCount(CableLeg leg, FiberRange range) {
        for (FiberCount count : records.fiberCounts()
                .owned(Relation.CABLE_COUNTS, leg.cable().id())
                .toList()) {
            if (count.numbers().contains(range.first()) && count.numbers().contains(range.last())) {
                return count.name() + " " + range + " are fibers " + own(count, range) + " of "
                        + leg.cable().code() + ".";
            }
        }
        return null;
    }

    private static FiberRange own(FiberCount count, FiberRange range) {
        return new FiberRange(
                count.fibers().at(Math.abs(range.first() - count.numbers().first())),
                count.fibers().at(Math.abs(range.last() - count.numbers().first())));
    }

    private static FiberRange inTubes(List<Word> words, CableLeg leg) throws MistakeFound {
        Word first = words.get(0);
        if (words.size() == 1) {
            throw new MistakeFound(
                    first.place(),
                    "tube-missing",
                    "No tube is named.",
                    "Write its number or letters: "
                            + ColorLetters.list(leg.colors(), leg.type().tubes()) + ".");
        }
        Word which = words.get(1);
        FiberRange tubes = positions(
                which,
                leg.colors(),
                leg.type().tubes(),
                "tubes of " + leg.cable().code());
        if (words.size() == 2) {
            return tubes.step() > 0
                    ? new FiberRange(
                            leg.fibersOf(tubes.first()).first(),
                            leg.fibersOf(tubes.last()).last())
                    : falling(which);
        }
        if (tubes.count() > 1) {
            throw new MistakeFound(
                    which.place(),
                    "several-tubes",
                    "Fibers by their places in a tube belong to one tube, and " + which.text() + " are several.",
                    "Write a line a tube, or the fibers' own numbers.");
        }
        FiberRange tube = leg.fibersOf(tubes.first());
        FiberRange places = positions(
                words.get(2),
                leg.colors(),
                tube.count(),
                "fibers in " + leg.tubeName(tubes.first()) + " of "
                        + leg.cable().code());
        return new FiberRange(tube.first() + places.first() - 1, tube.first() + places.last() - 1);
    }

    private static FiberRange falling(Word which) throws MistakeFound {
        throw new MistakeFound(
                which.place(),
                "tubes-falling",
                "Whole tubes are named in rising order, and " + which.text() + " falls.",
                "Write a line a tube.");
    }

    /** Positions in a colour order, by number or letters. */
    private static FiberRange positions(Word word, FiberColors colors, int last, String what) throws MistakeFound {
        OptionalInt one = ColorLetters.find(colors, last, word.text());
        if (one.isPresent()) {
            return FiberRange.of(one.getAsInt());
        }
        int dash = word.text().indexOf('-');
        if (dash > 0) {
            OptionalInt from = ColorLetters.find(colors, last, word.text().substring(0, dash));
            OptionalInt to = ColorLetters.find(colors, last, word.text().substring(dash + 1));
            if (from.isPresent() && to.isPresent()) {
                return new FiberRange(from.getAsInt(), to.getAsInt());
            }
        }
        Matcher numbers = RANGE.matcher(word.text());
        if (!numbers.matches()) {
            throw new MistakeFound(
                    word.place(),
                    "no-such-color",
                    "'" + word.text() + "' is not one of the " + what + ".",
                    "They are 1 to " + last + ": " + ColorLetters.list(colors, last) + ".");
        }
        FiberRange range = range(word, "a number or letters");
        if (Math.max(range.first(), range.last()) > last) {
            throw new MistakeFound(
                    word.place(),
                    "number-above-count",
                    range + " is too large: the " + what + " are 1 to " + last + ".",
                    "They are " + ColorLetters.list(colors, last) + ".");
        }
        return range;
    }

    /** A number or a range from 1. */
    static FiberRange range(Word word, String right) throws MistakeFound {
        Matcher written = RANGE.matcher(word.text());
        if (!written.matches()) {
            throw new MistakeFound(
                    word.place(), BAD_NUMBER, "'" + word.text() + "' is no range.", "Write " + right + ".");
        }
        int first = Integer.parseInt(written.group(1));
        int last = written.group(2) == null ? first : Integer.parseInt(written.group(2));
        if (first < 1 || last < 1) {
            throw new MistakeFound(word.place(), BAD_NUMBER, "Numbers begin at 1.", "Write " + right + ".");
        }
        return new FiberRange(first, last);
    }
}
