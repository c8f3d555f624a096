package spanwright.sheet;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.quantity.Length;
import spanwright.quantity.LengthUnit;
import spanwright.splicing.LegKind;

/**
 * Reads lines about the cables themselves: {@code F-1 ahead to HH-2}, {@code F-1 back mark 17387 ft}, both in one, and
 * {@code F-1 slack 12 m}.
 */
final class LegLineReader {

    private final EnclosureLegs legs;
    private final SideReader sides;

    LegLineReader(EnclosureLegs legs, SideReader sides) {
        this.legs = legs;
        this.sides = sides;
    }

    /** The statement of such a line; nothing where it is another. */
    Optional<Statement> find(LineParts parts) throws MistakeFound {
        List<Word> said = parts.said();
        if (said.size() > 1 && said.get(1).is("slack")) {
            return Optional.of(slack(parts));
        }
        boolean directed =
                said.size() > 2 && List.of("back", "ahead").contains(said.get(1).text());
        if (!directed || !List.of("to", "mark").contains(said.get(2).text())) {
            return Optional.empty();
        }
        Word direction = said.get(1);
        CableLeg leg = sides.leg(said.get(0), direction, direction.is("back") ? LegKind.BACK : LegKind.AHEAD);
        refuseWords(parts);
        return Optional.of(seen(parts.place(), leg, said.subList(2, said.size())));
    }

    private static void refuseWords(LineParts parts) throws MistakeFound {
        if (!parts.behind().isEmpty()) {
            throw new MistakeFound(
                    parts.behind().get(0).get(0).place(),
                    "word-not-here",
                    "Nothing stands behind a semicolon in a line about a cable.",
                    "Leave it out.");
        }
    }

    private static Statement seen(TextPlace place, CableLeg leg, List<Word> words) throws MistakeFound {
        int at = 0;
        Word toward = null;
        if (words.get(0).is("to")) {
            toward = value(words, 1, "the next structure");
            at = 2;
        }
        BigDecimal mark = null;
        LengthUnit unit = null;
        TextPlace markPlace = place;
        if (at < words.size() && words.get(at).is("mark")) {
            Word number = value(words, at + 1, "the number printed on the sheath");
            mark = WordsBehind.decimal(number);
            unit = unit(value(words, at + 2, "the mark's unit, m or ft"));
            markPlace = number.place();
            at += 3;
        }
        if (at < words.size()) {
            throw new MistakeFound(
                    words.get(at).place(),
                    "word-too-many",
                    "'" + words.get(at).text() + "' is not understood.",
                    "Write " + leg.name() + " to " + leg.toward().code() + " mark 17387 ft, or one of the two.");
        }
        return new Statement.LegSeen(
                place,
                toward == null ? place : toward.place(),
                markPlace,
                leg,
                toward == null ? null : toward.text(),
                mark,
                unit);
    }

    private static Word value(List<Word> words, int index, String what) throws MistakeFound {
        if (index < words.size()) {
            return words.get(index);
        }
        TextPlace last = words.get(words.size() - 1).place();
        throw new MistakeFound(
                new TextPlace(last.line(), last.column() + last.length(), 0),
                "value-missing",
                "Here stands " + what + ".",
                "Write it.");
    }

    private static LengthUnit unit(Word word) throws MistakeFound {
        return LengthUnit.find(word.text())
                .orElseThrow(() -> new MistakeFound(
                        word.place(), "bad-unit", "'" + word.text() + "' is no unit.", "Write m or ft."));
    }

    private Statement slack(LineParts parts) throws MistakeFound {
        List<Word> said = parts.said();
        @Nullable
        CableLeg leg = legs.of(said.get(0).text()).stream().findFirst().orElse(null);
        if (leg == null) {
            throw new MistakeFound(
                    said.get(0).place(),
                    "no-such-leg",
                    "There is no cable " + said.get(0).text() + " in " + legs.code() + ".",
                    "Here are " + legs.words() + ".");
        }
        refuseWords(parts);
        Word number = value(said, 2, "how much is coiled here now");
        BigDecimal left = WordsBehind.decimal(number);
        LengthUnit unit = unit(value(said, 3, "its unit, m or ft"));
        if (said.size() > 4 || left.signum() < 0) {
            throw new MistakeFound(
                    number.place(),
                    "bad-number",
                    "What is coiled here is one length, 0 or above.",
                    "Write " + leg.cable().code() + " slack 12 m.");
        }
        return new Statement.Coiled(parts.place(), leg, Length.of(left, unit));
    }
}
