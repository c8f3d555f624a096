package spanwright.plants;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import spanwright.circuits.Circuit;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.Enclosure;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.splicing.Joint;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** The records of a plant as far as they are drawn, and the identities given so far. */
final class PlantDraft {

    private final Map<RecordKind, List<Recorded>> byKind = new EnumMap<>(RecordKind.class);

    final List<Structure> structures = new ArrayList<>();
    final List<Span> spans = new ArrayList<>();
    final List<CableType> cableTypes = new ArrayList<>();
    final List<Cable> cables = new ArrayList<>();
    private final Map<Integer, List<RunRow>> runs = new HashMap<>();
    final List<Enclosure> enclosures = new ArrayList<>();
    final List<Pass> passes = new ArrayList<>();
    final List<Splitter> splitters = new ArrayList<>();
    final List<Panel> panels = new ArrayList<>();
    final List<Joint> joints = new ArrayList<>();
    final List<Circuit> circuits = new ArrayList<>();

    /** The identity that the next record of a kind has. */
    int next(RecordKind kind) {
        return all(kind).size() + 1;
    }

    private List<Recorded> all(RecordKind kind) {
        return byKind.computeIfAbsent(kind, key -> new ArrayList<>());
    }

    <T extends Recorded> T add(T record) {
        all(record.kind()).add(record);
        if (record instanceof Structure structure) {
            structures.add(structure);
        } else if (record instanceof Span span) {
            spans.add(span);
        } else if (record instanceof CableType type) {
            cableTypes.add(type);
        } else if (record instanceof Cable cable) {
            cables.add(cable);
        } else if (record instanceof RunRow row) {
            runs.computeIfAbsent(row.cable(), key -> new ArrayList<>()).add(row);
        } else if (record instanceof Enclosure enclosure) {
            enclosures.add(enclosure);
        } else {
            sortWithin(record);
        }
        return record;
    }

    private void sortWithin(Recorded record) {
        if (record instanceof Pass pass) {
            passes.add(pass);
        } else if (record instanceof Splitter splitter) {
            splitters.add(splitter);
        } else if (record instanceof Panel panel) {
            panels.add(panel);
        } else if (record instanceof Joint joint) {
            joints.add(joint);
        } else if (record instanceof Circuit circuit) {
            circuits.add(circuit);
        }
    }

    /** All of them, kind after kind, by identity. */
    List<Recorded> records() {
        List<Recorded> all = new ArrayList<>();
        byKind.values().forEach(all::addAll);
        return all;
    }

    /** The run rows of a cable by seq, none before they are drawn. */
    List<RunRow> run(int cable) {
        return runs.getOrDefault(cable, List.of());
    }

    int fibers(Cable cable) {
        return cableTypes.get(cable.cableType() - 1).fibers();
    }

    Cable cable(int id) {
        return cables.get(id - 1);
    }

    Enclosure enclosure(int id) {
        return enclosures.get(id - 1);
    }

    RunRow row(Pass pass) {
        return run(pass.cable()).stream()
                .filter(row -> row.id() == pass.runRow())
                .findFirst()
                .orElseThrow();
    }

    boolean firstRow(RunRow row) {
        return row.seq() == 0;
    }

    boolean lastRow(RunRow row) {
        return row.seq() == run(row.cable()).size() - 1;
    }
}
