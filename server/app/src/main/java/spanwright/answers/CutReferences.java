package spanwright.answers;

import java.math.BigDecimal;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import spanwright.answers.Unanswerable.Kind;
import spanwright.outage.Cut;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.quantity.Length;
import spanwright.records.CableLay;
import spanwright.records.Records;

/**
 * Reads what is cut: {@code span:S-1}, {@code structure:H-1}, {@code cable:F-1}, {@code enclosure:E-1}, {@code
 * tube:F-1/3}, {@code place:F-1@1352.2}. A cable's name may be that of the longer cable whose reels they are.
 */
public final class CutReferences {

    private static final Pattern WRITTEN = Pattern.compile("(span|structure|cable|enclosure|tube|place):(\\S+)");
    private static final Pattern TUBE = Pattern.compile("([^\\s,/:]+)/([0-9]{1,7})");
    private static final Pattern PLACE = Pattern.compile("([^\\s,/:]+)@([0-9]{1,9}(?:\\.[0-9]{1,6})?)");

    private final Records records;
    private final References references;

    /** References into these records. */
    public CutReferences(Records records) {
        this.records = records;
        this.references = new References(records);
    }

    /** What a list of references cuts, taken together. */
    public List<Cut> list(List<String> written) {
        return written.stream().flatMap(this::cuts).toList();
    }

    private Stream<Cut> cuts(String written) {
        Matcher parts = WRITTEN.matcher(written);
        if (!parts.matches()) {
            throw wrong("'" + written + "' is not a cut; a cut is written span:S-1, structure:H-1, cable:F-1,"
                    + " enclosure:E-1, tube:F-1/3 or place:F-1@1352.2.");
        }
        String what = parts.group(2);
        return switch (parts.group(1)) {
            case "span" -> Stream.of(new Cut.OfSpan(references.cutSpan(what).id()));
            case "structure" ->
                Stream.of(new Cut.OfStructure(references.cutStructure(what).id()));
            case "enclosure" ->
                Stream.of(new Cut.OfEnclosure(references.cutEnclosure(what).id()));
            case "cable" -> references.cutCables(what).stream().map(cable -> new Cut.OfCable(cable.id()));
            case "tube" -> tubes(what);
            default -> Stream.of(place(what));
        };
    }

    private Stream<Cut> tubes(String written) {
        Matcher parts = TUBE.matcher(written);
        if (!parts.matches()) {
            throw wrong("'" + written + "' is not a tube; a tube is written cable/number, such as F-1/3.");
        }
        List<Cable> reels = references.cutCables(parts.group(1));
        int tube = Integer.parseInt(parts.group(2));
        List<Cut> cuts = reels.stream()
                .filter(cable -> tube >= 1 && tube <= type(cable).tubes())
                .<Cut>map(cable -> new Cut.OfTube(cable.id(), tube))
                .toList();
        if (cuts.isEmpty()) {
            int most =
                    reels.stream().mapToInt(cable -> type(cable).tubes()).max().orElseThrow();
            throw absent(parts.group(1) + " has tubes 1 to " + most + ", not " + tube + ".");
        }
        return cuts.stream();
    }

    private CableType type(Cable cable) {
        return records.cableTypes().get(cable.cableType());
    }

    private Cut place(String written) {
        Matcher parts = PLACE.matcher(written);
        if (!parts.matches()) {
            throw wrong("'" + written + "' is not a place; a place is written cable@metres of sheath from its start,"
                    + " such as F-1@1352.2.");
        }
        Cable cable = references.cutCable(parts.group(1));
        Length position = Length.ofMetres(new BigDecimal(parts.group(2)));
        Length end = CableLay.of(records, cable.id()).positions().length();
        if (position.compareTo(end) > 0) {
            throw absent(cable.code() + " is "
                    + end.exactMetres().stripTrailingZeros().toPlainString()
                    + " m of sheath long, so it has no place at " + parts.group(2) + " m.");
        }
        return new Cut.AtPlace(cable.id(), position);
    }

    private static Unanswerable wrong(String sentence) {
        return new Unanswerable(Kind.BAD_REQUEST, sentence, References.CUT);
    }

    private static Unanswerable absent(String sentence) {
        return new Unanswerable(Kind.BAD_REFERENCE, sentence, References.CUT);
    }
}
