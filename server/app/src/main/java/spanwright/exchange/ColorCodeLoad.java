package spanwright.exchange;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import spanwright.journal.RecordKind;
import spanwright.plant.ColorCode;

/** Enters {@code color_codes.csv}: all rows of a code make one record, positions 1, 2, 3 ... without gaps. */
final class ColorCodeLoad implements TableLoad {

    static final int CODE = Table.COLOR_CODES.column("code");
    static final int POSITION = Table.COLOR_CODES.column("position");
    static final int COLOR = Table.COLOR_CODES.column("color");
    static final int MOST_POSITIONS = 10_000;

    /** A colour, and the line it stands on. */
    private record Color(String word, int line) {}

    private final Entering entering;
    private final Map<String, Map<Integer, Color>> byCode = new LinkedHashMap<>();

    ColorCodeLoad(Entering entering) {
        this.entering = entering;
    }

    @Override
    public void enter(Row row) {
        String code = row.code(CODE);
        Integer position = row.whole(POSITION, 1, MOST_POSITIONS);
        String color = row.free(COLOR);
        if (code == null) {
            return;
        }
        if (position == null || color == null) {
            entering.doubts().add(Table.COLOR_CODES, code);
            return;
        }
        Color earlier = byCode.computeIfAbsent(code, any -> new TreeMap<>())
                .putIfAbsent(position, new Color(color, row.line()));
        if (earlier != null) {
            row.fault(
                    POSITION,
                    row.named(POSITION) + " stands twice in code " + code
                            + "; write one row a position (the earlier is "
                            + row.table().file() + ":" + earlier.line + ")");
        }
    }

    @Override
    public void end() {
        byCode.forEach((code, colors) -> {
            if (!entering.doubts().cover(Table.COLOR_CODES, code)) {
                enter(code, colors);
            }
        });
    }

    private void enter(String code, Map<Integer, Color> colors) {
        List<String> words = new ArrayList<>();
        int line = Integer.MAX_VALUE;
        for (Map.Entry<Integer, Color> entry : colors.entrySet()) {
            if (entry.getKey() != words.size() + 1) {
                entering.faults()
                        .add(
                                Table.COLOR_CODES,
                                entry.getValue().line,
                                "position '" + entry.getKey()
                                        + "' of code " + code + " stands where position " + (words.size() + 1)
                                        + " should; positions are 1, 2, 3 ... without gaps");
                entering.doubts().add(Table.COLOR_CODES, code);
                return;
            }
            words.add(entry.getValue().word);
            line = Math.min(line, entry.getValue().line);
        }
        ColorCode record = new ColorCode(entering.view().limit(RecordKind.COLOR_CODE), code, words);
        entering.add(Table.COLOR_CODES, line, record);
    }

    /** Writes one row of a code. */
    static void write(ColorCode code, int index, Cells cells) {
        cells.put(CODE, code.code());
        cells.put(POSITION, index + 1);
        cells.put(COLOR, code.colors().get(index));
    }
}
