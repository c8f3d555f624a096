package spanwright.benchmarks.outage;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import spanwright.answers.ImpactDocument;
import spanwright.answers.Json;
import spanwright.answers.View;
import spanwright.benchmarks.grid.GridPlant;
import spanwright.benchmarks.race.Race;
import spanwright.benchmarks.race.Samples;
import spanwright.benchmarks.sql.SqlImpact;
import spanwright.circuits.Circuit;
import spanwright.journal.Change;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.outage.Cut;
import spanwright.outage.HitCircuit;
import spanwright.outage.Impact;
import spanwright.records.Records;
import spanwright.records.RecordsEditor;

/**
 * Races what a cut of the largest cables takes down against recursive SQL. Arguments: fiber sections (default
 * 10,000,000), rounds (default 25).
 */
public final class ImpactRace {

    private static final int WARM_UP = 3;
    /** The program's own answers are given so often before the race, as in a running server. */
    private static final int COMPILED = 2_000;

    private final Snapshot snapshot;
    private final List<Block> cables;

    /** Races on a plant of about so many fiber sections. */
    ImpactRace(int sections) {
        snapshot = Snapshot.of(served(new GridPlant(sections, 42).records()));
        cables = largest(snapshot.network());
    }

    /** Prints the result as Markdown. */
    public static void main(String[] args) throws Exception {
        int sections = args.length > 0 ? Integer.parseInt(args[0]) : 10_000_000;
        int rounds = args.length > 1 ? Integer.parseInt(args[1]) : 25;
        ImpactRace race = new ImpactRace(sections);
        System.out.println(race.likeness());
        for (int round = 0; round < COMPILED; round++) {
            race.impact(round);
            race.written(round, round % 10 == 0);
        }
        Race run = race.run(rounds);
        System.out.println(run.table());
        for (int variant = 2; variant <= 4; variant++) {
            System.out.printf(
                    Locale.ROOT,
                    "%s: median %s (goal: at most 20 ms), p99 %s, %.0f times faster than the recursive SQL (goal: 100)%n",
                    run.samples(variant).name(),
                    Samples.text(run.samples(variant).median()),
                    Samples.text(run.samples(variant).quantile(0.99)),
                    run.timesFaster(variant));
        }
    }

    /** Circuits of every priority; every fifth is of a group of two. */
    private static Records served(Records records) {
        RecordsEditor editor = records.edit();
        records.circuits().list().forEach(circuit -> editor.apply(Change.replace(circuit, served(circuit))));
        return editor.build(records.posting() + 1);
    }

    private static Circuit served(Circuit circuit) {
        int id = circuit.id();
        return new Circuit(
                id,
                circuit.code(),
                null,
                null,
                1 + id % 5,
                id % 41,
                circuit.wavelengths(),
                null,
                id % 10 == 0 || id % 10 == 5 ? "G-" + id / 10 : null,
                circuit.a(),
                circuit.z(),
                circuit.status());
    }

    private static List<Block> largest(Network network) {
        List<Block> sections = network.blocks().stream()
                .filter(block -> block.kind() == BlockKind.SECTION)
                .toList();
        int most = sections.stream().mapToInt(Block::count).max().orElseThrow();
        return sections.stream().filter(block -> block.count() == most).toList();
    }

    private String likeness() {
        return String.format(
                Locale.ROOT,
                "%,d circuits, %,d splitters, %,d cables of %d fibers, %.0f circuits hit by a cut of one",
                snapshot.records().circuits().count(),
                snapshot.records().splitters().count(),
                cables.size(),
                cables.get(0).count(),
                cables.stream()
                        .limit(WARM_UP * 10L)
                        .mapToInt(cable -> impact(cable).circuits().size())
                        .average()
                        .orElseThrow());
    }

    /** Runs all variants; the SQL's and the program's answers must be the same. */
    Race run(int rounds) throws Exception {
        Path file = Files.createTempFile("spanwright-sql", ".db");
        Files.delete(file);
        int third = cables.size() / 4;
        try (SqlImpact sql = new SqlImpact(file, snapshot)) {
            return new Race("What a cut of " + cables.get(0).count() + " fibers takes down")
                    .variant("recursive SQL", round -> sql.cut(cable(round)))
                    .variant("records, compared with the SQL's", round -> rows(impact(round)))
                    .apart("records", round -> impact(round + third))
                    .apart("records, the answer written as JSON", round -> written(round + 2 * third, false))
                    .apart("the same with what every fiber carries", round -> written(round + 3 * third, true))
                    .run(WARM_UP, rounds);
        } finally {
            Files.deleteIfExists(file);
        }
    }

    private Block cable(int round) {
        return cables.get(round % cables.size());
    }

    private Impact impact(int round) {
        return impact(cable(round));
    }

    private Impact impact(Block cable) {
        return Impact.of(snapshot, List.of(new Cut.OfCable(cable.owner())));
    }

    /** The answer as the server sends it: the document's bytes, of a view of its own as every question has. */
    private byte[] written(int round, boolean fibers) {
        View view = new View(snapshot, null);
        return Json.bytes(new ImpactDocument(view, impact(round), fibers)::write);
    }

    /** The same as {@link SqlImpact#cut}, to compare: a row for each fiber of a circuit. */
    private static List<SqlImpact.Row> rows(Impact impact) {
        List<SqlImpact.Row> rows = new ArrayList<>();
        for (HitCircuit hit : impact.circuits()) {
            hit.at().stream()
                    .mapToInt(at -> Integer.parseInt(at.substring(at.indexOf(':') + 1)))
                    .sorted()
                    .forEach(fiber -> rows.add(new SqlImpact.Row(
                            hit.circuit().code(),
                            hit.single(),
                            hit.circuit().priority(),
                            hit.circuit().customersServed(),
                            fiber)));
        }
        return rows;
    }
}
