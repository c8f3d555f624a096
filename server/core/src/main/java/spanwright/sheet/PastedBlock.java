package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import spanwright.records.RecordsView;

/**
 * A block of cells pasted from a spreadsheet, read into lines. Columns are known by their header, else by what stands in
 * them; tubes and fibers are numbers or letters. Rows that carry on one another become one line.
 *
 * @param lines a line for every row or run of rows that is understood, in order
 * @param doubts every cell that is not; its row makes no line
 */
public record PastedBlock(List<String> lines, List<CellDoubt> doubts) {

    /** Keeps its own copies. */
    public PastedBlock {
        lines = List.copyOf(lines);
        doubts = List.copyOf(doubts);
    }

    /**
     * Reads a block.
     *
     * @param enclosure identity of the enclosure
     * @param text rows parted by line breaks, cells by tabs, else by commas
     */
    public static PastedBlock read(RecordsView records, int enclosure, String text) {
        EnclosureLegs legs = new EnclosureLegs(records, enclosure);
        List<List<String>> rows = rows(text);
        List<CellDoubt> doubts = new ArrayList<>();
        List<Statement.Joins> joins = new ArrayList<>();
        if (rows.isEmpty()) {
            return new PastedBlock(List.of(), doubts);
        }
        boolean headed = PastedColumns.isHeader(rows.get(0));
        PastedColumns columns = headed ? PastedColumns.ofHeader(rows.get(0)) : PastedColumns.ofContent(rows, legs);
        LineReader reader = new LineReader(legs);
        for (int row = headed ? 1 : 0; row < rows.size(); row++) {
            if (rows.get(row).stream().anyMatch(cell -> !cell.isBlank())) {
                new PastedRow(legs, columns, rows.get(row), row + 1, doubts)
                        .read(reader)
                        .ifPresent(joins::add);
            }
        }
        SheetWriter writer = new SheetWriter(records);
        List<String> lines = new ArrayList<>();
        JoinRuns.list(joins).forEach(run -> lines.add(writer.line(run.a(), run.b())));
        return new PastedBlock(lines, doubts);
    }

    private static List<List<String>> rows(String text) {
        String separator = text.indexOf('\t') >= 0 ? "\t" : ",";
        return text.lines()
                .map(line -> List.of(line.split(separator, -1)).stream()
                        .map(cell -> cell.strip().replaceAll("^\"(.*)\"$", "$1").strip())
                        .toList())
                .toList();
    }
}
