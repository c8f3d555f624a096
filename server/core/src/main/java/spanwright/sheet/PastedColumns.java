package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * What the columns of a pasted block hold.
 *
 * @param columns a column each
 */
record PastedColumns(List<Column> columns) {

    /** What stands in a column. */
    enum Part {
        CABLE,
        DIRECTION,
        TUBE,
        FIBER,
        OTHER
    }

    /**
     * A column.
     *
     * @param side 0 for the first side of a joint, 1 for the second
     * @param part what stands in it
     */
    record Column(int side, Part part) {}

    private static Part part(String header) {
        String word = header.toLowerCase(Locale.ROOT);
        if (word.contains("cable") || word.contains("sheath")) {
            return Part.CABLE;
        }
        if (word.contains("direction") || word.contains("side") || word.contains("way")) {
            return Part.DIRECTION;
        }
        if (word.contains("tube") || word.contains("buffer")) {
            return Part.TUBE;
        }
        return word.contains("fiber") || word.contains("fibre") || word.contains("strand") ? Part.FIBER : Part.OTHER;
    }

    /** Whether a row names columns: a cable's and a fiber's at least. */
    static boolean isHeader(List<String> row) {
        List<Part> parts = row.stream().map(PastedColumns::part).toList();
        return parts.contains(Part.CABLE) && parts.contains(Part.FIBER);
    }

    /** Each part stands once a side: the second of its kind is the other side's. */
    static PastedColumns ofHeader(List<String> header) {
        return sided(header.stream().map(PastedColumns::part).toList());
    }

    private static PastedColumns sided(List<Part> parts) {
        List<Column> columns = new ArrayList<>();
        for (Part part : parts) {
            boolean seen = columns.contains(new Column(0, part));
            columns.add(new Column(seen ? 1 : 0, part));
        }
        return new PastedColumns(columns);
    }

    /** By what stands in the first row: a cable of the enclosure, a direction, and behind them a tube and a fiber. */
    static PastedColumns ofContent(List<List<String>> rows, EnclosureLegs legs) {
        List<String> row = rows.stream()
                .filter(cells -> cells.stream().anyMatch(cell -> !legs.of(cell).isEmpty()))
                .findFirst()
                .orElse(rows.get(0));
        List<Part> parts = new ArrayList<>();
        for (int at = 0; at < row.size(); at++) {
            parts.add(content(row, at, legs));
        }
        return sided(parts);
    }

    private static Part content(List<String> row, int at, EnclosureLegs legs) {
        String cell = row.get(at);
        if (!legs.of(cell).isEmpty()) {
            return Part.CABLE;
        }
        if (cell.equalsIgnoreCase("back") || cell.equalsIgnoreCase("ahead")) {
            return Part.DIRECTION;
        }
        boolean named = at > 0
                && !row.subList(0, at).stream()
                        .allMatch(before -> legs.of(before).isEmpty());
        if (!named || !cell.matches("[0-9]{1,4}|[A-Za-z]{2}(/[0-9]?[A-Za-z]{2})?|[A-Za-z]{3,9}")) {
            return Part.OTHER;
        }
        boolean tubeBefore = at > 0
                && row.get(at - 1).matches("[0-9]{1,4}|[A-Za-z/0-9]{2,9}")
                && legs.of(row.get(at - 1)).isEmpty()
                && !row.get(at - 1).equalsIgnoreCase("back")
                && !row.get(at - 1).equalsIgnoreCase("ahead");
        boolean another = at + 1 < row.size()
                && legs.of(row.get(at + 1)).isEmpty()
                && row.get(at + 1).matches("[0-9]{1,4}|[A-Za-z]{2}(/[0-9]?[A-Za-z]{2})?|[A-Za-z]{3,9}");
        return !tubeBefore && another ? Part.TUBE : Part.FIBER;
    }

    /** The index of a column, if it is there. */
    Optional<Integer> find(int side, Part part) {
        int at = columns.indexOf(new Column(side, part));
        return at < 0 ? Optional.empty() : Optional.of(at);
    }
}
