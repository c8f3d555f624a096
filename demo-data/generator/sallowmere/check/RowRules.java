package sallowmere.check;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** Codes, references and the order of runs. */
final class RowRules {
    private final RecordsFolder folder;
    private final List<String> wrong = new ArrayList<>();

    private RowRules(RecordsFolder folder) {
        this.folder = folder;
    }

    static List<String> of(RecordsFolder folder) {
        RowRules rules = new RowRules(folder);
        Set<String> structures = rules.codes("structures.csv", "structure");
        Set<String> spans = rules.codes("spans.csv", "span");
        Set<String> types = rules.codes("cable_types.csv", "cable_type");
        Set<String> cables = rules.codes("cables.csv", "cable");
        Set<String> enclosures = rules.codes("enclosures.csv", "enclosure");
        rules.codes("circuits.csv", "circuit");
        rules.refer("spans.csv", "from", structures);
        rules.refer("spans.csv", "to", structures);
        rules.refer("cables.csv", "cable_type", types);
        rules.refer("cable_runs.csv", "cable", cables);
        rules.refer("cable_runs.csv", "structure", structures);
        rules.refer("cable_runs.csv", "span", spans);
        rules.refer("sheath_marks.csv", "cable", cables);
        rules.refer("fiber_flags.csv", "cable", cables);
        rules.refer("counts.csv", "cable", cables);
        rules.refer("enclosures.csv", "structure", structures);
        for (String file : List.of(
                "enclosure_cables.csv",
                "splitters.csv",
                "splices.csv",
                "panels.csv",
                "terminations.csv",
                "end_states.csv")) {
            rules.refer(file, "enclosure", enclosures);
        }
        rules.refer("enclosure_cables.csv", "cable", cables);
        rules.runs();
        return rules.wrong;
    }

    private Set<String> codes(String file, String column) {
        Set<String> codes = new HashSet<>();
        for (Map<String, String> row : folder.rows(file)) {
            String code = row.get(column);
            if (!codes.add(code)) {
                wrong.add(file + ": " + code + " twice");
            }
            if (code.isEmpty() || code.chars().anyMatch(c -> c <= ' ' || c == ',' || c == '/' || c == ':')) {
                wrong.add(file + ": not a code: " + code);
            }
        }
        return codes;
    }

    private void refer(String file, String column, Set<String> codes) {
        for (Map<String, String> row : folder.rows(file)) {
            String code = row.get(column);
            if (!code.isEmpty() && !codes.contains(code)) {
                wrong.add(file + ": no " + column + " " + code);
            }
        }
    }

    /** Runs are 0, 1, 2 ...; each span joins its two structures; enclosures stand at the structures of their rows. */
    private void runs() {
        Map<String, Map<String, String>> spans = new HashMap<>();
        folder.rows("spans.csv").forEach(row -> spans.put(row.get("span"), row));
        Map<String, String> structureAt = new HashMap<>();
        folder.rowsBy("cable_runs.csv", "cable").forEach((cable, rows) -> {
            for (int seq = 0; seq < rows.size(); seq++) {
                Map<String, String> row = rows.get(seq);
                structureAt.put(cable + "|" + seq, row.get("structure"));
                if (!row.get("seq").equals(Integer.toString(seq))) {
                    wrong.add("cable_runs.csv: " + cable + " row " + seq + " is numbered " + row.get("seq"));
                }
                if (seq > 0 && !joins(spans.get(row.get("span")), rows.get(seq - 1), row)) {
                    wrong.add("cable_runs.csv: " + cable + " row " + seq + ": " + row.get("span") + " leads elsewhere");
                }
            }
            if (rows.size() < 2) {
                wrong.add("cable_runs.csv: " + cable + " has one row");
            }
        });
        Map<String, String> at = new HashMap<>();
        folder.rows("enclosures.csv").forEach(row -> at.put(row.get("enclosure"), row.get("structure")));
        for (Map<String, String> pass : folder.rows("enclosure_cables.csv")) {
            String structure = structureAt.get(pass.get("cable") + "|" + pass.get("seq"));
            if (!at.get(pass.get("enclosure")).equals(structure)) {
                wrong.add("enclosure_cables.csv: " + pass + " is at " + structure);
            }
        }
    }

    private static boolean joins(Map<String, String> span, Map<String, String> before, Map<String, String> after) {
        if (span == null) {
            return false;
        }
        Set<String> ends = Set.of(span.get("from"), span.get("to"));
        return ends.equals(Set.of(before.get("structure"), after.get("structure")));
    }
}
