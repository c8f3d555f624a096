package spanwright.exchange;

import java.util.Optional;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.Enclosure;
import spanwright.plant.RunRow;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.records.RecordsView;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/**
 * The codes by which rows name other records. A record that has gone, or has not come yet, is named {@code ?}: the
 * journal shows rows of records that lived within one posting only.
 */
class Codes {

    private static final String UNKNOWN = "?";

    private final RecordsView view;

    Codes(RecordsView view) {
        this.view = view;
    }

    RecordsView view() {
        return view;
    }

    String structure(int id) {
        return view.structures().find(id).map(Structure::code).orElse(UNKNOWN);
    }

    String span(int id) {
        return view.spans().find(id).map(Span::code).orElse(UNKNOWN);
    }

    String cableType(int id) {
        return view.cableTypes().find(id).map(CableType::code).orElse(UNKNOWN);
    }

    String cable(int id) {
        return view.cables().find(id).map(Cable::code).orElse(UNKNOWN);
    }

    String enclosure(int id) {
        return view.enclosures().find(id).map(Enclosure::code).orElse(UNKNOWN);
    }

    String splitter(int id) {
        return view.splitters().find(id).map(Splitter::code).orElse(UNKNOWN);
    }

    /** A panel's code alone. */
    String panel(int id) {
        return view.panels().find(id).map(Panel::code).orElse(UNKNOWN);
    }

    /** The code of the cable of a run row. */
    String cableAt(int runRow) {
        return run(runRow).map(row -> cable(row.cable())).orElse(UNKNOWN);
    }

    /** The seq of a run row. */
    String seq(int runRow) {
        return run(runRow).map(row -> Integer.toString(row.seq())).orElse(UNKNOWN);
    }

    /** A panel with its enclosure, as ports are written: {@code E1/P}. */
    String panelWhole(int id) {
        return view.panels()
                .find(id)
                .map(panel -> enclosure(panel.enclosure()) + "/" + panel.code())
                .orElse(UNKNOWN);
    }

    private Optional<RunRow> run(int id) {
        return view.runRows().find(id);
    }
}
