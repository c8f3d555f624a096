package spanwright.sheet;

import java.math.BigDecimal;
import java.time.DateTimeException;
import java.time.LocalDate;
import java.util.List;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;
import spanwright.splicing.SpliceMethod;

/** Reads what stands behind a line's semicolons: {@code ; tray 2; mechanical; until 2026-04-30; by K. Ash}. */
final class WordsBehind {

    private static final Pattern DECIMAL = Pattern.compile("-?[0-9]{1,6}(\\.[0-9]{1,6})?");
    private static final BigDecimal LEAST_LOSS = new BigDecimal("-0.1");
    private static final String KNOWN =
            "tray, fusion, mechanical, pigtail, direct, loss, trust, seen, spliced, by," + " until, job, jumper, light";

    private @Nullable String tray;
    private @Nullable SpliceMethod method;
    private @Nullable Boolean direct;
    private @Nullable Loss loss;
    private @Nullable Trust trust;
    private @Nullable LocalDate seen;
    private @Nullable LocalDate splicedOn;
    private @Nullable String splicedBy;
    private @Nullable LocalDate until;
    private @Nullable String job;
    private @Nullable Length length;
    private @Nullable LocalDate light;

    /** Takes what stands between two semicolons. */
    void take(List<Word> words) throws MistakeFound {
        Word key = words.get(0);
        List<Word> rest = words.subList(1, words.size());
        switch (key.text()) {
            case "tray" -> tray = text(key, rest);
            case "fusion" -> method = alone(SpliceMethod.FUSION, rest);
            case "mechanical" -> method = alone(SpliceMethod.MECHANICAL, rest);
            case "pigtail" -> direct = alone(false, rest);
            case "direct" -> direct = alone(true, rest);
            case "loss" -> loss = loss(key, rest);
            case "trust" -> trust = trust(key, rest);
            case "seen" -> seen = date(key, rest);
            case "spliced" -> splicedOn = date(key, rest);
            case "by" -> splicedBy = text(key, rest);
            case "until" -> until = date(key, rest);
            case "job" -> job = text(key, rest);
            case "jumper" -> length = metres(key, rest);
            case "light" -> light = date(key, rest);
            default ->
                throw new MistakeFound(
                        key.place(),
                        "unknown-word",
                        "'" + key.text() + "' is not understood behind a semicolon.",
                        "There are " + KNOWN + ".");
        }
    }

    JointWords words() {
        return new JointWords(tray, method, direct, loss, trust, seen, splicedOn, splicedBy, until, job, length, light);
    }

    private static <T> T alone(T value, List<Word> rest) throws MistakeFound {
        if (!rest.isEmpty()) {
            throw new MistakeFound(
                    rest.get(0).place(),
                    "word-too-many",
                    "'" + rest.get(0).text() + "' is too much here.",
                    "Put a semicolon between one thing said and the next.");
        }
        return value;
    }

    private static MistakeFound missing(Word key, String what) {
        return new MistakeFound(key.place(), "value-missing", "'" + key.text() + "' needs " + what + ".", "Write it.");
    }

    private static Word one(Word key, List<Word> rest, String what) throws MistakeFound {
        if (rest.isEmpty()) {
            throw missing(key, what);
        }
        alone(key, rest.subList(1, rest.size()));
        return rest.get(0);
    }

    /** A text of any number of words; in quotes it may hold a semicolon, and a quote doubled. */
    private static String text(Word key, List<Word> rest) throws MistakeFound {
        if (rest.isEmpty()) {
            throw missing(key, "a text");
        }
        if (rest.get(0).text().startsWith("\"")) {
            String quoted = one(key, rest, "a text").text();
            if (quoted.length() < 2 || !quoted.endsWith("\"")) {
                throw missing(key, "a quote at the end of its text");
            }
            return quoted.substring(1, quoted.length() - 1).replace("\"\"", "\"");
        }
        return String.join(" ", rest.stream().map(Word::text).toList());
    }

    private static LocalDate date(Word key, List<Word> rest) throws MistakeFound {
        Word word = one(key, rest, "a date such as 2026-03-31");
        try {
            return LocalDate.parse(word.text());
        } catch (DateTimeException notADate) {
            throw new MistakeFound(
                    word.place(), "bad-date", "'" + word.text() + "' is no date.", "Write year-month-day: 2026-03-31.");
        }
    }

    private static Loss loss(Word key, List<Word> rest) throws MistakeFound {
        BigDecimal number = decimal(one(key, rest, "a loss in dB, such as 0.05"));
        if (number.compareTo(LEAST_LOSS) < 0) {
            throw new MistakeFound(
                    rest.get(0).place(),
                    "loss-out-of-range",
                    number + " dB is out of range.",
                    "The mean of both ways is -0.1 dB or above.");
        }
        return Loss.ofDecibels(number);
    }

    static BigDecimal decimal(Word word) throws MistakeFound {
        if (!DECIMAL.matcher(word.text()).matches()) {
            throw new MistakeFound(
                    word.place(),
                    "bad-number",
                    "'" + word.text() + "' is no number.",
                    "Write it plainly, such as 0.05.");
        }
        return new BigDecimal(word.text());
    }

    private static Length metres(Word key, List<Word> rest) throws MistakeFound {
        List<Word> number = rest.size() == 2 && rest.get(1).is("m") ? rest.subList(0, 1) : rest;
        return Length.ofMetres(decimal(one(key, number, "its length in metres, such as 3 m")));
    }

    private static Trust trust(Word key, List<Word> rest) throws MistakeFound {
        Word word = one(key, rest, "planned, reported, posted, verified or unknown");
        return Trust.find(word.text())
                .orElseThrow(() -> new MistakeFound(
                        word.place(),
                        "unknown-word",
                        "'" + word.text() + "' is no trust.",
                        "There are planned, reported, posted, verified, unknown."));
    }
}
