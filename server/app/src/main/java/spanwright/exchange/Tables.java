package spanwright.exchange;

import spanwright.journal.Recorded;
import spanwright.plant.Setting;
import spanwright.splicing.PlanningValue;

/** How each table of a folder is entered. */
final class Tables {

    private final Entering entering;
    private final Formats formats;

    Tables(Entering entering) {
        this.entering = entering;
        this.formats = new Formats(entering.refs());
    }

    TableLoad load(Table table) {
        return switch (table) {
            case SETTINGS ->
                new ReplacingLoad<>(
                        entering, formats.settings(), entering.view().settings(), Setting::name, Setting::equals);
            case PLANNING_VALUES ->
                new ReplacingLoad<>(
                        entering,
                        formats.planningValues(),
                        entering.view().planningValues(),
                        PlanningValue::item,
                        (held, read) -> true);
            case FIBER_TYPES -> new FiberTypeLoad(entering);
            case COLOR_CODES -> new ColorCodeLoad(entering);
            case CABLE_RUNS -> new RunLoad(entering, formats.runRows());
            case SPLITTER_OUTPUTS -> new TapLoad(entering);
            case SPLICES -> new JointLoad(entering, formats.splices());
            case TERMINATIONS -> new JointLoad(entering, formats.terminations());
            default -> plain(formats.of(table));
        };
    }

    private <T extends Recorded> TableLoad plain(Rows<T> rows) {
        return new PlainLoad<>(entering, rows);
    }
}
