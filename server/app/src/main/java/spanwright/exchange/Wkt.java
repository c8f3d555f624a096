package spanwright.exchange;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Line;
import spanwright.plant.Position;

/** Lines as well-known text: {@code LINESTRING (lon lat, lon lat, ...)}, plain decimals only. */
final class Wkt {

    private static final String FORM = "; write LINESTRING (lon lat, lon lat, ...)";

    private Wkt() {}

    /** The line that a column holds; null and a fault where it holds none. */
    static @Nullable Line line(Row row, int column) {
        String text = row.text(column).strip();
        String word = "LINESTRING";
        String upper = text.toUpperCase(Locale.ROOT);
        String inner = upper.startsWith(word) ? text.substring(word.length()).strip() : "";
        if (!inner.startsWith("(") || !inner.endsWith(")")) {
            row.fault(column, row.named(column) + " is no line" + FORM);
            return null;
        }
        List<Position> positions = new ArrayList<>();
        for (String point : inner.substring(1, inner.length() - 1).split(",", -1)) {
            Position position = position(row, column, point.strip());
            if (position == null) {
                return null;
            }
            positions.add(position);
        }
        if (positions.size() < 2) {
            row.fault(column, row.named(column) + " has one position; a line has two or more" + FORM);
            return null;
        }
        return new Line(positions);
    }

    private static @Nullable Position position(Row row, int column, String point) {
        String[] numbers = point.split("[ \t\r\n]+", -1);
        if (numbers.length != 2 || !plain(numbers[0]) || !plain(numbers[1])) {
            row.fault(
                    column,
                    row.table().columns().get(column) + " holds '" + Texts.shown(point)
                            + "', which is no position of two plain decimal numbers" + FORM);
            return null;
        }
        double lon = new BigDecimal(numbers[0]).doubleValue();
        double lat = new BigDecimal(numbers[1]).doubleValue();
        if (Math.abs(lon) > 180 || Math.abs(lat) > 90) {
            row.fault(
                    column,
                    row.table().columns().get(column) + " holds '" + Texts.shown(point)
                            + "', which is out of range; a longitude is -180 to 180 and comes first, a latitude is -90 to 90");
            return null;
        }
        return new Position(lon, lat);
    }

    private static boolean plain(String text) {
        return Decimals.plain(text.toCharArray(), 0, text.length());
    }

    /** A line as text, each number as short as names it. */
    static String text(Line line) {
        StringBuilder text = new StringBuilder("LINESTRING (");
        for (Position position : line.positions()) {
            if (text.charAt(text.length() - 1) != '(') {
                text.append(", ");
            }
            text.append(Cells.plain(position.lon())).append(' ').append(Cells.plain(position.lat()));
        }
        return text.append(')').toString();
    }
}
