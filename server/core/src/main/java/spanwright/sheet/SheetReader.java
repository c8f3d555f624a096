package spanwright.sheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import spanwright.records.EndNames;
import spanwright.records.RecordsView;

/** Reads a sheet: its lines, then what the rest is once all other lines are known. */
public final class SheetReader {

    private final RecordsView records;
    private final EnclosureLegs legs;
    private final List<Statement> statements = new ArrayList<>();
    private final List<Mistake> mistakes = new ArrayList<>();
    private final NamedEnds named;

    private SheetReader(RecordsView records, int enclosure) {
        this.records = records;
        this.legs = new EnclosureLegs(records, enclosure);
        this.named = new NamedEnds(new EndNames(records), mistakes);
    }

    /**
     * Reads lines.
     *
     * @param enclosure identity of the enclosure
     */
    public static SheetRead read(RecordsView records, int enclosure, List<String> lines) {
        return new SheetReader(records, enclosure).read(lines);
    }

    private SheetRead read(List<String> lines) {
        LineReader reader = new LineReader(legs);
        List<LineSaid> rests = new ArrayList<>();
        for (int index = 0; index < lines.size(); index++) {
            try {
                LineSaid said = reader.read(index + 1, lines.get(index));
                if (said instanceof LineSaid.Whole whole) {
                    whole.statements().forEach(this::take);
                } else {
                    rests.add(said);
                }
            } catch (MistakeFound found) {
                mistakes.add(found.mistake());
            }
        }
        RestOfLegs rest = new RestOfLegs(records, legs, named);
        for (LineSaid said : rests) {
            try {
                rest.expand(said).forEach(this::take);
            } catch (MistakeFound found) {
                mistakes.add(found.mistake());
            }
        }
        statements.sort(Comparator.comparingInt(statement -> statement.place().line()));
        mistakes.sort(
                Comparator.comparingInt((Mistake mistake) -> mistake.place().line())
                        .thenComparing(mistake -> mistake.place().column()));
        return new SheetRead(statements, mistakes);
    }

    private void take(Statement statement) {
        if (named.take(statement)) {
            statements.add(statement);
        }
    }
}
