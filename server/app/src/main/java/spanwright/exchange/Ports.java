package spanwright.exchange;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.plant.FiberRange;
import spanwright.splicing.Panel;

/** Ports as they are written: {@code <enclosure>/<panel>/<port>}, or a range of ports of one panel. */
final class Ports {

    private static final String FORM = "; write <enclosure>/<panel>/<port>, such as E1/P/1 or E1/P/1-2";

    /**
     * Ports of one panel.
     *
     * @param panel the panel
     * @param numbers the ports
     */
    record Found(Panel panel, FiberRange numbers) {}

    private final References refs;

    Ports(References refs) {
        this.refs = refs;
    }

    /** The ports that a column names; null where they are wrong or in doubt. */
    @Nullable
    Found find(Row row, int column) {
        return row.blank(column) ? null : find(row, column, row.from(column), row.to(column));
    }

    /** The same of a part of a column. */
    @Nullable
    Found find(Row row, int column, int from, int to) {
        int first = slash(row.chars(), from, to);
        int second = first < to ? slash(row.chars(), first + 1, to) : to;
        if (first == from || second >= to - 1 || second == first + 1 || slash(row.chars(), second + 1, to) < to) {
            row.fault(column, row.named(column) + " is no port" + FORM);
            return null;
        }
        int enclosure = refs.enclosures.find(row, column, from, first);
        Panel panel = enclosure == 0 ? null : panel(row, column, enclosure, first + 1, second);
        int most = panel == null ? Integer.MAX_VALUE : panel.ports();
        String what = panel == null ? "" : "ports of panel " + panel.code();
        FiberRange numbers = Ranges.range(row, column, second + 1, to, most, what);
        return panel == null || numbers == null ? null : new Found(panel, numbers);
    }

    private static int slash(char[] chars, int from, int to) {
        int at = from;
        while (at < to && chars[at] != '/') {
            at++;
        }
        return at;
    }

    /** The panel that a part of a column names within an enclosure; null where there is none, or it is in doubt. */
    @Nullable
    Panel panel(Row row, int column, int enclosure, int from, int to) {
        String code = new String(row.chars(), from, to - from);
        Optional<Panel> panel = refs.view().findPanel(enclosure, code);
        if (panel.isEmpty()) {
            String where = refs.view().enclosures().get(enclosure).code();
            if (!refs.doubts().cover(Table.PANELS, where + "/" + code)) {
                row.fault(
                        column,
                        row.table().columns().get(column) + ": there is no panel '" + Texts.shown(code)
                                + "' in enclosure " + where + "; enter it in panels.csv, or name one that is there");
            }
            return null;
        }
        return panel.get();
    }

    /** Ports as a row names them. */
    String text(int panel, FiberRange numbers) {
        return refs.panelWhole(panel) + "/" + numbers;
    }
}
