package spanwright.records;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.BaseFeature;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.CableValue;
import spanwright.plant.ColorCode;
import spanwright.plant.Enclosure;
import spanwright.plant.FiberType;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.plant.Setting;
import spanwright.plant.SheathMark;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.splicing.EndState;
import spanwright.splicing.FiberCount;
import spanwright.splicing.FiberFlag;
import spanwright.splicing.Joint;
import spanwright.splicing.Measurement;
import spanwright.splicing.Panel;
import spanwright.splicing.PlanningValue;
import spanwright.splicing.Splitter;

/** Reads the records: the state at one posting, or that state as an editor has changed it so far. */
public abstract class RecordsView {

    RecordsView() {}

    /** The record of a kind and identity, or null. */
    public abstract @Nullable Recorded record(RecordKind kind, int id);

    /** The identity behind a code, or 0; a panel's or splitter's code is asked through its own finder. */
    abstract int identity(RecordKind kind, String code);

    /** One more than the largest identity ever given in a kind, removed records included. */
    public abstract int limit(RecordKind kind);

    /** How many records of a kind there are. */
    public abstract int count(RecordKind kind);

    /** Identities of what an owner owns by a relation, as entered; not to be changed. */
    public abstract int[] owned(Relation relation, int owner);

    /** Identities of the joints that are planned within a job, as entered. */
    public abstract List<Integer> plannedJoints(String job);

    /** The jobs that have planned joints, by name. */
    public abstract List<String> plannedJobs();

    /** The settings. */
    public Register<Setting> settings() {
        return new Register<>(this, RecordKind.SETTING, Setting.class);
    }

    /** The structures. */
    public Register<Structure> structures() {
        return new Register<>(this, RecordKind.STRUCTURE, Structure.class);
    }

    /** The spans. */
    public Register<Span> spans() {
        return new Register<>(this, RecordKind.SPAN, Span.class);
    }

    /** The recorded fiber types (the built-in ones are not records). */
    public Register<FiberType> fiberTypes() {
        return new Register<>(this, RecordKind.FIBER_TYPE, FiberType.class);
    }

    /** The recorded colour orders (the built-in one is not a record). */
    public Register<ColorCode> colorCodes() {
        return new Register<>(this, RecordKind.COLOR_CODE, ColorCode.class);
    }

    /** The cable types. */
    public Register<CableType> cableTypes() {
        return new Register<>(this, RecordKind.CABLE_TYPE, CableType.class);
    }

    /** The cables. */
    public Register<Cable> cables() {
        return new Register<>(this, RecordKind.CABLE, Cable.class);
    }

    /** The values from reel sheets. */
    public Register<CableValue> cableValues() {
        return new Register<>(this, RecordKind.CABLE_VALUE, CableValue.class);
    }

    /** The run rows. */
    public Register<RunRow> runRows() {
        return new Register<>(this, RecordKind.RUN_ROW, RunRow.class);
    }

    /** The sheath marks. */
    public Register<SheathMark> sheathMarks() {
        return new Register<>(this, RecordKind.SHEATH_MARK, SheathMark.class);
    }

    /** The enclosures. */
    public Register<Enclosure> enclosures() {
        return new Register<>(this, RecordKind.ENCLOSURE, Enclosure.class);
    }

    /** The cables in enclosures. */
    public Register<Pass> passes() {
        return new Register<>(this, RecordKind.PASS, Pass.class);
    }

    /** The splitters. */
    public Register<Splitter> splitters() {
        return new Register<>(this, RecordKind.SPLITTER, Splitter.class);
    }

    /** The panels. */
    public Register<Panel> panels() {
        return new Register<>(this, RecordKind.PANEL, Panel.class);
    }

    /** The splices, terminations and jumpers. */
    public Register<Joint> joints() {
        return new Register<>(this, RecordKind.JOINT, Joint.class);
    }

    /** The states of ends that no joint uses. */
    public Register<EndState> endStates() {
        return new Register<>(this, RecordKind.END_STATE, EndState.class);
    }

    /** The measurements. */
    public Register<Measurement> measurements() {
        return new Register<>(this, RecordKind.MEASUREMENT, Measurement.class);
    }

    /** The flags on fibers. */
    public Register<FiberFlag> fiberFlags() {
        return new Register<>(this, RecordKind.FIBER_FLAG, FiberFlag.class);
    }

    /** The other numberings of fibers. */
    public Register<FiberCount> fiberCounts() {
        return new Register<>(this, RecordKind.FIBER_COUNT, FiberCount.class);
    }

    /** The circuits. */
    public Register<Circuit> circuits() {
        return new Register<>(this, RecordKind.CIRCUIT, Circuit.class);
    }

    /** The circuits of a protection group, in the order in which they were entered. */
    public Stream<Circuit> groupCircuits(String group) {
        return circuits()
                .owned(Relation.GROUP_CIRCUITS, Ownership.groupNumber(group))
                .filter(circuit -> group.equals(circuit.protectionGroup()));
    }

    /** The planning values that replace built-in ones. */
    public Register<PlanningValue> planningValues() {
        return new Register<>(this, RecordKind.PLANNING_VALUE, PlanningValue.class);
    }

    /** The features of the base map. */
    public Register<BaseFeature> baseFeatures() {
        return new Register<>(this, RecordKind.BASE_FEATURE, BaseFeature.class);
    }

    /** The run of a cable, by seq. */
    public List<RunRow> runOf(int cable) {
        return runRows()
                .owned(Relation.CABLE_RUN_ROWS, cable)
                .sorted(Comparator.comparingInt(RunRow::seq))
                .collect(Collectors.toList());
    }

    /** The passes of a cable, by the seq of their run rows. */
    public List<Pass> passesOf(int cable) {
        return passes().owned(Relation.CABLE_PASSES, cable)
                .sorted(Comparator.comparingInt(
                        pass -> runRows().get(pass.runRow()).seq()))
                .collect(Collectors.toList());
    }

    /** The pass at a run row, if any. */
    public Optional<Pass> findPassAt(int runRow) {
        return passes().owned(Relation.RUN_ROW_PASSES, runRow).findFirst();
    }

    /** A splitter of an enclosure, by its code. */
    public Optional<Splitter> findSplitter(int enclosure, String code) {
        return splitters().find(Codes.within(enclosure, code));
    }

    /** A panel of an enclosure, by its code. */
    public Optional<Panel> findPanel(int enclosure, String code) {
        return panels().find(Codes.within(enclosure, code));
    }
}
