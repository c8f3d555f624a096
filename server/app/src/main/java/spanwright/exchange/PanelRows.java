package spanwright.exchange;

import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.splicing.Panel;

/** Rows of {@code panels.csv}. */
final class PanelRows extends Rows<Panel> {

    private static final int ENCLOSURE = Table.PANELS.column("enclosure");
    private static final int PANEL = Table.PANELS.column("panel");
    private static final int PORTS = Table.PANELS.column("ports");
    private static final int CONNECTOR = Table.PANELS.column("connector");
    private static final int MOST_PORTS = 100_000;

    PanelRows(References refs) {
        super(Table.PANELS, RecordKind.PANEL, refs);
    }

    @Override
    @Nullable
    Panel read(Row row, int id) {
        int enclosure = refs.enclosures.find(row, ENCLOSURE);
        String code = row.code(PANEL);
        Integer ports = row.whole(PORTS, 1, MOST_PORTS);
        String connector = row.free(CONNECTOR);
        return enclosure == 0 || code == null || ports == null
                ? null
                : new Panel(id, enclosure, code, ports, Objects.requireNonNullElse(connector, "SC/APC"));
    }

    @Override
    void write(Panel panel, Cells cells) {
        cells.put(ENCLOSURE, refs.enclosure(panel.enclosure()));
        cells.put(PANEL, panel.code());
        cells.put(PORTS, panel.ports());
        cells.put(CONNECTOR, panel.connector());
    }

    @Override
    String key(Row row) {
        return row.text(ENCLOSURE) + "/" + row.text(PANEL);
    }
}
