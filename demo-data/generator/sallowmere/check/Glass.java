package sallowmere.check;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;

/** What is joined to what: every end by name, and where each fiber is cut. */
final class Glass {
    private final Map<String, String> peers = new HashMap<>();
    private final Map<String, String> kinds = new HashMap<>();
    private final Map<String, Integer> seqs = new HashMap<>();
    private final Map<String, String> enclosures = new HashMap<>();
    private final Map<String, TreeSet<Integer>> cuts = new HashMap<>();
    private final Map<String, Integer> fibers = new HashMap<>();
    private final Map<String, Integer> lastRows = new HashMap<>();
    private final Map<String, Integer> sizes = new HashMap<>();
    private final Map<String, Integer> joints = new TreeMap<>();
    private final List<String> wrong = new ArrayList<>();

    Glass(RecordsFolder folder) {
        Map<String, List<Map<String, String>>> types = folder.rowsBy("cable_types.csv", "cable_type");
        for (Map<String, String> cable : folder.rows("cables.csv")) {
            String type = types.get(cable.get("cable_type")).get(0).get("fibers");
            fibers.put(cable.get("cable"), Integer.parseInt(type));
        }
        folder.rowsBy("cable_runs.csv", "cable").forEach((cable, rows) -> lastRows.put(cable, rows.size() - 1));
        for (Map<String, String> pass : folder.rows("enclosure_cables.csv")) {
            pass(pass);
        }
        for (Map<String, String> panel : folder.rows("panels.csv")) {
            sizes.put(panel.get("enclosure") + "|" + panel.get("panel"), Integer.parseInt(panel.get("ports")));
        }
        for (Map<String, String> splitter : folder.rows("splitters.csv")) {
            sizes.put(
                    splitter.get("enclosure") + "|" + splitter.get("splitter"),
                    Integer.parseInt(splitter.get("outputs")));
        }
        folder.rows("splices.csv").forEach(this::splice);
        folder.rows("terminations.csv").forEach(this::termination);
        folder.rows("jumpers.csv").forEach(this::jumper);
        folder.rows("end_states.csv").forEach(this::state);
    }

    private void pass(Map<String, String> pass) {
        String cable = pass.get("cable");
        int seq = Integer.parseInt(pass.get("seq"));
        if (seqs.put(pass.get("enclosure") + "|" + cable, seq) != null) {
            wrong.add("enclosure_cables.csv: " + cable + " twice in " + pass.get("enclosure"));
        }
        if (enclosures.put(cable + "|" + seq, pass.get("enclosure")) != null) {
            wrong.add("enclosure_cables.csv: two enclosures on row " + seq + " of " + cable);
        }
    }

    private void splice(Map<String, String> row) {
        boolean planned = row.get("trust").equals("planned");
        join(ends(row.get("enclosure"), row.get("a")), ends(row.get("enclosure"), row.get("b")), "splice", planned);
    }

    private void termination(Map<String, String> row) {
        boolean planned = row.get("trust").equals("planned");
        List<String> rears = new ArrayList<>();
        String panel = row.get("enclosure") + "|" + row.get("panel");
        for (int port : numbers(row.get("ports"))) {
            rears.add(panel + "|rear|" + port);
            if (port < 1 || port > sizes.getOrDefault(panel, 0)) {
                wrong.add("terminations.csv: no port " + panel + " " + port);
            }
        }
        join(rears, ends(row.get("enclosure"), row.get("end")), row.get("method"), planned);
    }

    private void jumper(Map<String, String> row) {
        join(List.of(front(row.get("a"))), List.of(front(row.get("b"))), "jumper", false);
    }

    private void state(Map<String, String> row) {
        for (String end : ends(row.get("enclosure"), row.get("end"))) {
            if (peers.containsKey(end)) {
                wrong.add("end_states.csv: " + end + " is joined");
            }
        }
    }

    static String front(String port) {
        String[] parts = port.split("/");
        return parts[0] + "|" + parts[1] + "|front|" + parts[2];
    }

    private void join(List<String> a, List<String> b, String kind, boolean planned) {
        if (a.size() != b.size()) {
            wrong.add("unlike in count: " + a + " " + b);
            return;
        }
        for (int i = 0; i < a.size() && !planned; i++) {
            String one = a.get(i);
            String other = b.get(i);
            if (peers.put(one, other) != null || peers.put(other, one) != null) {
                wrong.add("joined twice: " + one + " or " + other);
            }
            kinds.put(one, kind);
            kinds.put(other, kind);
            joints.merge(kind, 1, Integer::sum);
            cut(one);
            cut(other);
        }
    }

    private void cut(String end) {
        String[] parts = end.split("\\|");
        if (parts[2].equals("back") || parts[2].equals("ahead")) {
            int seq = seqs.get(parts[0] + "|" + parts[1]);
            cuts.computeIfAbsent(parts[1] + ":" + parts[3], key -> new TreeSet<>())
                    .add(seq);
        }
    }

    /** The names of the ends that a cell means. */
    private List<String> ends(String enclosure, String text) {
        String[] parts = text.split(" ");
        List<String> ends = new ArrayList<>();
        for (int number : parts.length == 2 ? List.of(1) : numbers(parts[2])) {
            ends.add(enclosure + "|" + parts[0] + "|" + parts[1] + "|" + number);
            check(enclosure, parts[0], parts[1], number);
        }
        return ends;
    }

    private void check(String enclosure, String owner, String side, int number) {
        String key = enclosure + "|" + owner;
        if (side.equals("in") || side.equals("out")) {
            if (number > sizes.getOrDefault(key, 0)) {
                wrong.add("no " + side + " " + number + " of splitter " + key);
            }
            return;
        }
        Integer seq = seqs.get(key);
        if (seq == null) {
            wrong.add(owner + " is not in " + enclosure);
        } else if (number < 1 || number > fibers.get(owner)) {
            wrong.add(owner + " has no fiber " + number);
        } else if (seq == 0 && side.equals("back") || seq.equals(lastRows.get(owner)) && side.equals("ahead")) {
            wrong.add(owner + " has no " + side + " in " + enclosure);
        }
    }

    static List<Integer> numbers(String range) {
        String[] parts = range.split("-");
        int first = Integer.parseInt(parts[0]);
        int last = Integer.parseInt(parts[parts.length - 1]);
        List<Integer> numbers = new ArrayList<>();
        for (int n = first; first <= last ? n <= last : n >= last; n += first <= last ? 1 : -1) {
            numbers.add(n);
        }
        return numbers;
    }

    /** What an end is joined to, or null. */
    String peer(String end) {
        return peers.get(end);
    }

    /** How an end is joined: splice, pigtail, direct or jumper. */
    String kind(String end) {
        return kinds.get(end);
    }

    /** The end that light reaches along the fiber from an end. */
    String far(String end) {
        String[] parts = end.split("\\|");
        String cable = parts[1];
        int seq = seqs.get(parts[0] + "|" + cable);
        TreeSet<Integer> places = new TreeSet<>(cuts.getOrDefault(cable + ":" + parts[3], new TreeSet<>()));
        places.add(0);
        places.add(lastRows.get(cable));
        boolean ahead = parts[2].equals("ahead");
        int reached = ahead ? places.higher(seq) : places.lower(seq);
        String enclosure = enclosures.getOrDefault(cable + "|" + reached, "");
        return enclosure + "|" + cable + "|" + (ahead ? "back" : "ahead") + "|" + parts[3];
    }

    /** The run row at which a cable is in an enclosure; the last one where the enclosure is blank. */
    int seq(String enclosure, String cable) {
        return enclosure.isEmpty() ? lastRows.get(cable) : seqs.get(enclosure + "|" + cable);
    }

    /** How many joints there are of a kind. */
    int count(String kind) {
        return joints.getOrDefault(kind, 0);
    }

    List<String> wrong() {
        return wrong;
    }
}
