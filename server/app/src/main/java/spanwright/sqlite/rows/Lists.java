package spanwright.sqlite.rows;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import spanwright.plant.FiberRange;
import spanwright.plant.FiberValues;
import spanwright.plant.Line;
import spanwright.plant.Position;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;

/** Lists within one column, as text that a person can read. */
final class Lists {

    private static final String WKT_HEAD = "LINESTRING (";

    private Lists() {}

    /** Splits at a mark; empty text is an empty list. */
    static List<String> split(String text, char mark) {
        if (text.isEmpty()) {
            return List.of();
        }
        List<String> parts = new ArrayList<>();
        int from = 0;
        for (int to = text.indexOf(mark); to >= 0; to = text.indexOf(mark, from)) {
            parts.add(text.substring(from, to));
            from = to + 1;
        }
        parts.add(text.substring(from));
        return parts;
    }

    /** Words parted by a mark; a mark or a backslash within a word has a backslash before it, no word at all is {@code \e}. */
    static String words(List<String> words, char mark) {
        StringBuilder text = new StringBuilder();
        for (int index = 0; index < words.size(); index++) {
            String word = words.get(index);
            text.append(index == 0 ? "" : String.valueOf(mark)).append(word.isEmpty() ? "\\e" : "");
            for (int at = 0; at < word.length(); at++) {
                char letter = word.charAt(at);
                text.append(letter == mark || letter == '\\' ? "\\" : "").append(letter);
            }
        }
        return text.toString();
    }

    static List<String> words(String text, char mark) {
        if (text.indexOf('\\') < 0) {
            return split(text, mark);
        }
        List<String> words = new ArrayList<>();
        StringBuilder word = new StringBuilder();
        for (int at = 0; at < text.length(); at++) {
            char letter = text.charAt(at);
            if (letter == mark) {
                words.add(word.toString());
                word.setLength(0);
            } else if (letter != '\\') {
                word.append(letter);
            } else if (text.charAt(++at) != 'e') {
                word.append(text.charAt(at));
            }
        }
        words.add(word.toString());
        return words;
    }

    static String ranges(List<FiberRange> ranges) {
        StringBuilder text = new StringBuilder();
        for (FiberRange range : ranges) {
            text.append(text.isEmpty() ? "" : ",").append(range);
        }
        return text.toString();
    }

    static List<FiberRange> ranges(String text) {
        return split(text, ',').stream().map(Lists::range).toList();
    }

    private static FiberRange range(String text) {
        int dash = text.indexOf('-');
        return dash < 0
                ? FiberRange.of(Integer.parseInt(text))
                : new FiberRange(Integer.parseInt(text.substring(0, dash)), Integer.parseInt(text.substring(dash + 1)));
    }

    static String wavelengths(List<Wavelength> wavelengths) {
        StringBuilder text = new StringBuilder();
        for (Wavelength wavelength : wavelengths) {
            text.append(text.isEmpty() ? "" : " ").append(wavelength.picometres());
        }
        return text.toString();
    }

    static List<Wavelength> wavelengths(String text) {
        return split(text, ' ').stream()
                .map(part -> new Wavelength(Long.parseLong(part)))
                .toList();
    }

    static String values(List<FiberValues> values) {
        StringBuilder text = new StringBuilder();
        for (FiberValues value : values) {
            Double index = value.groupIndex();
            text.append(text.isEmpty() ? "" : ";")
                    .append(value.wavelength().picometres())
                    .append(' ')
                    .append(value.lossPerKm().microdecibels())
                    .append(' ')
                    .append(value.lossLimitPerKm().microdecibels())
                    .append(' ')
                    .append(index == null ? "-" : index.toString());
        }
        return text.toString();
    }

    static List<FiberValues> values(String text) {
        return split(text, ';').stream().map(Lists::fiberValues).toList();
    }

    private static FiberValues fiberValues(String text) {
        List<String> parts = split(text, ' ');
        String index = parts.get(3);
        return new FiberValues(
                new Wavelength(Long.parseLong(parts.get(0))),
                new Loss(Long.parseLong(parts.get(1))),
                new Loss(Long.parseLong(parts.get(2))),
                index.equals("-") ? null : (Double) Double.parseDouble(index));
    }

    /** Losses by output, in the order of the outputs. */
    static String losses(Map<Integer, Loss> losses) {
        StringBuilder text = new StringBuilder();
        new TreeMap<>(losses)
                .forEach((output, loss) -> text.append(text.isEmpty() ? "" : " ")
                        .append(output)
                        .append('=')
                        .append(loss.microdecibels()));
        return text.toString();
    }

    static Map<Integer, Loss> losses(String text) {
        Map<Integer, Loss> losses = new TreeMap<>();
        for (String part : split(text, ' ')) {
            int sign = part.indexOf('=');
            losses.put(Integer.parseInt(part.substring(0, sign)), new Loss(Long.parseLong(part.substring(sign + 1))));
        }
        return losses;
    }

    /** A line as WKT; the shortest decimals that give back the same doubles. */
    static String line(Line line) {
        StringBuilder text = new StringBuilder(WKT_HEAD);
        for (Position position : line.positions()) {
            text.append(text.length() == WKT_HEAD.length() ? "" : ", ")
                    .append(position.lon())
                    .append(' ')
                    .append(position.lat());
        }
        return text.append(')').toString();
    }

    static Line line(String text) {
        List<Position> positions = new ArrayList<>();
        int from = WKT_HEAD.length();
        while (from < text.length()) {
            int space = text.indexOf(' ', from);
            int comma = text.indexOf(',', space);
            int to = comma < 0 ? text.length() - 1 : comma;
            positions.add(new Position(
                    Double.parseDouble(text.substring(from, space)),
                    Double.parseDouble(text.substring(space + 1, to))));
            from = to + 2;
        }
        return new Line(positions);
    }
}
