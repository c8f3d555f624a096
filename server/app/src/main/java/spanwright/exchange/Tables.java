package spanwright.exchange;

import spanwright.journal.Recorded;
import spanwright.plant.Setting;
import spanwright.splicing.PlanningValue;

/** How each table of a folder is entered. */
final class Tables {

    private final Entering entering;
    private final References refs;
    private final Ends ends;
    private final Ports ports;

    Tables(Entering entering) {
        this.entering = entering;
        this.refs = entering.refs();
        this.ends = new Ends(refs);
        this.ports = new Ports(refs);
    }

    TableLoad load(Table table) {
        return switch (table) {
            case SETTINGS ->
                new ReplacingLoad<>(
                        entering, new SettingRows(refs), entering.view().settings(), Setting::name, Setting::equals);
            case STRUCTURES -> plain(new StructureRows(refs));
            case SPANS -> plain(new SpanRows(refs));
            case FIBER_TYPES -> new FiberTypeLoad(entering);
            case CABLE_TYPES -> plain(new CableTypeRows(refs));
            case COLOR_CODES -> new ColorCodeLoad(entering);
            case CABLES -> plain(new CableRows(refs));
            case CABLE_VALUES -> plain(new CableValueRows(refs));
            case CABLE_RUNS -> new RunLoad(entering, new RunRowRows(refs));
            case SHEATH_MARKS -> plain(new SheathMarkRows(refs));
            case ENCLOSURES -> plain(new EnclosureRows(refs));
            case ENCLOSURE_CABLES -> plain(new PassRows(refs));
            case SPLITTERS -> plain(new SplitterRows(refs));
            case SPLITTER_OUTPUTS -> new TapLoad(entering);
            case SPLICES -> plain(new SpliceRows(refs, ends));
            case PANELS -> plain(new PanelRows(refs));
            case TERMINATIONS -> plain(new TerminationRows(refs, ends, ports));
            case END_STATES -> plain(new EndStateRows(refs, ends));
            case JUMPERS -> plain(new JumperRows(refs, ends, ports));
            case MEASUREMENTS -> plain(new MeasurementRows(refs, ends, ports));
            case FIBER_FLAGS -> plain(new FiberFlagRows(refs));
            case COUNTS -> plain(new CountRows(refs));
            case CIRCUITS -> plain(new CircuitRows(refs, ports));
            case PLANNING_VALUES ->
                new ReplacingLoad<>(
                        entering,
                        new PlanningValueRows(refs),
                        entering.view().planningValues(),
                        PlanningValue::item,
                        (held, read) -> true);
        };
    }

    private <T extends Recorded> TableLoad plain(Rows<T> rows) {
        return new PlainLoad<>(entering, rows);
    }
}
