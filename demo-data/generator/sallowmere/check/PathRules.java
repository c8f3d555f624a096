package sallowmere.check;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** Every circuit has its path and keeps its budget; the worst subscriber's path is the one the demo is known for. */
final class PathRules {
    private final RecordsFolder folder;
    private final Glass glass;
    private final Network network;
    private final List<String> wrong = new ArrayList<>();
    private Journey worst;

    private PathRules(RecordsFolder folder, Glass glass, Network network) {
        this.folder = folder;
        this.glass = glass;
        this.network = network;
    }

    static List<String> of(RecordsFolder folder, Glass glass, Network network) {
        PathRules rules = new PathRules(folder, glass, network);
        rules.fronts();
        rules.circuits();
        return rules.wrong;
    }

    /** A front has a jumper or circuits' ends, never both; its rear is joined. */
    private void fronts() {
        Map<String, String> users = new HashMap<>();
        for (Map<String, String> circuit : folder.rows("circuits.csv")) {
            for (String side : List.of("a", "z")) {
                for (String port : Network.ports(circuit.get(side))) {
                    users.put(port, circuit.get("circuit"));
                }
            }
        }
        users.forEach((port, circuit) -> {
            if (glass.peer(Glass.front(port)) != null) {
                wrong.add("circuits.csv: " + circuit + " ends on " + port + ", which has a jumper");
            }
        });
    }

    private void circuits() {
        double longest = 0;
        for (Map<String, String> circuit : folder.rows("circuits.csv")) {
            List<String> a = Network.ports(circuit.get("a"));
            List<String> z = Network.ports(circuit.get("z"));
            for (int i = 0; i < a.size(); i++) {
                Journey journey = network.from(z.get(i));
                if (!journey.end.equals(a.get(i))) {
                    wrong.add(circuit.get("circuit") + ": from " + z.get(i) + " light ends at " + journey.end);
                }
                budget(circuit, journey);
                longest = journey.splitters > 0 ? Math.max(longest, journey.glass) : longest;
            }
        }
        System.out.printf(
                Locale.ROOT,
                "worst subscriber: %s, %.0f m, %.3f dB at 1310, %d splices, %d connectors%n",
                worst.start,
                worst.glass,
                worst.loss(0.35),
                worst.splices,
                worst.connectors);
        boolean known = Math.round(worst.glass / 100) == 167 && Math.round(worst.loss(0.35) * 10) == 258;
        if (!known || worst.glass < longest) {
            wrong.add("the worst subscriber is not 16.7 km and 25.8 dB, or another is farther: " + longest + " m");
        }
    }

    private void budget(Map<String, String> circuit, Journey journey) {
        if (journey.splitters > 0 && (worst == null || journey.loss(0.35) > worst.loss(0.35))) {
            worst = journey;
        }
        double perKilometre = circuit.get("wavelength_nm").startsWith("1310") ? 0.35 : 0.22;
        String budget = circuit.get("budget");
        double most = budget.equals("B+") ? 28 : budget.isEmpty() ? 99 : Double.parseDouble(budget);
        if (journey.loss(perKilometre) > most) {
            wrong.add(circuit.get("circuit") + ": " + journey.loss(perKilometre) + " dB of " + most);
        }
        if (budget.equals("B+") && journey.loss(perKilometre) < 13) {
            wrong.add(circuit.get("circuit") + ": too little loss, " + journey.loss(perKilometre) + " dB");
        }
    }
}
