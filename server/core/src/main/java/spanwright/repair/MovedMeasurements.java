package spanwright.repair;

import java.util.List;
import java.util.function.Consumer;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.plant.Cable;
import spanwright.plant.Pass;
import spanwright.records.CableLay;
import spanwright.records.RecordsEditor;
import spanwright.splicing.Measurement;

/**
 * The measurements that name a cable which becomes two and a piece: those of an end go with its side. Those of a whole
 * fiber are of glass that is there no longer; the journal keeps them.
 */
final class MovedMeasurements {

    private final RecordsEditor records;
    private final CableLay lay;
    private final int second;
    private final Pattern end;
    private final List<Measurement> measurements;
    private final List<Pass> passes;

    /** Of a cable as it is now; {@code second} is the first row beyond the cut. */
    MovedMeasurements(RecordsEditor records, CableLay lay, int second) {
        String code = lay.cable().code();
        this.records = records;
        this.lay = lay;
        this.second = second;
        this.end = Pattern.compile(Pattern.quote(code) + "( (back|ahead) .* @ (\\S+))");
        this.measurements = records.measurements()
                .list()
                .filter(each ->
                        each.what().startsWith(code + " ") || each.what().startsWith(code + ":"))
                .toList();
        this.passes = records.passesOf(lay.cable().id());
    }

    /** Takes them off, before the cable gives up its code. */
    void remove(Consumer<Change> apply) {
        measurements.forEach(each -> apply.accept(Change.remove(each)));
    }

    /** What is not entered again, as it was written. */
    List<String> left() {
        return measurements.stream()
                .map(Measurement::what)
                .filter(what -> !end.matcher(what).matches())
                .distinct()
                .toList();
    }

    /** Enters those of ends under the code of their side. */
    void enter(Cable start, Cable beyond, Consumer<Change> apply) {
        for (Measurement each : measurements) {
            Matcher matcher = end.matcher(each.what());
            if (matcher.matches()) {
                Cable part = row(matcher.group(3), matcher.group(2).equals("ahead")) < second ? start : beyond;
                apply.accept(Change.add(new Measurement(
                        records.newIdentity(RecordKind.MEASUREMENT),
                        part.code() + matcher.group(1),
                        each.wavelength(),
                        each.direction(),
                        each.loss(),
                        each.on(),
                        each.by(),
                        each.file())));
            }
        }
    }

    /** In the enclosure of a ring the first row leaves ahead, the last back. */
    private int row(String enclosure, boolean ahead) {
        int id = records.enclosures().find(enclosure).orElseThrow().id();
        List<Pass> there =
                passes.stream().filter(pass -> pass.enclosure() == id).toList();
        return lay.index(there.get(ahead ? 0 : there.size() - 1).runRow());
    }
}
