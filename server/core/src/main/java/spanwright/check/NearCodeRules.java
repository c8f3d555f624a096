package spanwright.check;

import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.Consumer;
import java.util.stream.Stream;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.Structure;

/** Codes that a muddy tag or a tired eye takes for each other: 1 and I, 0 and O, 5 and S, 8 and B. */
final class NearCodeRules implements Rule {

    @Override
    public void find(Checked checked, Consumer<Finding> found) {
        near(checked.records().structures().list().map(Structure::code), "structures.csv", found);
        near(checked.records().cables().list().map(Cable::code), "cables.csv", found);
        near(checked.records().enclosures().list().map(Enclosure::code), "enclosures.csv", found);
    }

    private static void near(Stream<String> codes, String file, Consumer<Finding> found) {
        Map<String, String> seen = new HashMap<>();
        codes.forEach(code -> {
            String earlier = seen.putIfAbsent(blurred(code), code);
            if (earlier != null) {
                found.accept(new Finding(
                        Severity.NOTE,
                        "codes-near-equal",
                        file,
                        code,
                        code + " and " + earlier + " are easily taken for each other.",
                        "Give one of them another code, on its tag too, or check every sheet that names either."));
            }
        });
    }

    private static String blurred(String code) {
        String blurred = code.toUpperCase(Locale.ROOT);
        for (String pair : List.of("I1", "L1", "O0", "Q0", "S5", "B8", "Z2")) {
            blurred = blurred.replace(pair.charAt(0), pair.charAt(1));
        }
        return blurred;
    }
}
