package spanwright.exchange;

import spanwright.journal.Recorded;

/** How the rows of each table are read and written, over one state of the records. */
final class Formats {

    private final References refs;
    private final Ends ends;
    private final Ports ports;

    Formats(References refs) {
        this.refs = refs;
        this.ends = new Ends(refs);
        this.ports = new Ports(refs);
    }

    References refs() {
        return refs;
    }

    Ends ends() {
        return ends;
    }

    Ports ports() {
        return ports;
    }

    RunRowRows runRows() {
        return new RunRowRows(refs);
    }

    SettingRows settings() {
        return new SettingRows(refs);
    }

    PlanningValueRows planningValues() {
        return new PlanningValueRows(refs);
    }

    SpliceRows splices() {
        return new SpliceRows(refs, ends);
    }

    TerminationRows terminations() {
        return new TerminationRows(refs, ends, ports);
    }

    /**
     * The rows of a table of which each is a record.
     *
     * @throws IllegalArgumentException for a table of which several rows make a record
     */
    Rows<? extends Recorded> of(Table table) {
        return switch (table) {
            case SETTINGS -> settings();
            case STRUCTURES -> new StructureRows(refs);
            case SPANS -> new SpanRows(refs);
            case CABLE_TYPES -> new CableTypeRows(refs);
            case CABLES -> new CableRows(refs);
            case CABLE_VALUES -> new CableValueRows(refs);
            case CABLE_RUNS -> runRows();
            case SHEATH_MARKS -> new SheathMarkRows(refs);
            case ENCLOSURES -> new EnclosureRows(refs);
            case ENCLOSURE_CABLES -> new PassRows(refs);
            case SPLITTERS -> new SplitterRows(refs);
            case SPLICES -> splices();
            case PANELS -> new PanelRows(refs);
            case TERMINATIONS -> terminations();
            case END_STATES -> new EndStateRows(refs, ends);
            case JUMPERS -> new JumperRows(refs, ends, ports);
            case MEASUREMENTS -> new MeasurementRows(refs, ends, ports);
            case FIBER_FLAGS -> new FiberFlagRows(refs);
            case COUNTS -> new CountRows(refs);
            case CIRCUITS -> new CircuitRows(refs, ports);
            case PLANNING_VALUES -> planningValues();
            case FIBER_TYPES, COLOR_CODES, SPLITTER_OUTPUTS ->
                throw new IllegalArgumentException("several rows of " + table + " make a record");
        };
    }
}
