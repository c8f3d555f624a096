package spanwright.exchange;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import spanwright.journal.Change;
import spanwright.quantity.Loss;
import spanwright.splicing.Splitter;

/** Enters {@code splitter_outputs.csv}: the losses of unequal taps, which belong to their splitters. */
final class TapLoad implements TableLoad {

    static final int ENCLOSURE = Table.SPLITTER_OUTPUTS.column("enclosure");
    static final int SPLITTER = Table.SPLITTER_OUTPUTS.column("splitter");
    static final int OUTPUT = Table.SPLITTER_OUTPUTS.column("output");
    static final int LOSS = Table.SPLITTER_OUTPUTS.column("loss_db");

    /** A tap read, and the line it stands on. */
    private record Tap(Loss loss, int line) {}

    private final Entering entering;
    private final Map<Integer, Map<Integer, Tap>> bySplitter = new LinkedHashMap<>();

    TapLoad(Entering entering) {
        this.entering = entering;
    }

    @Override
    public void enter(Row row) {
        int enclosure = entering.refs().enclosures.find(row, ENCLOSURE);
        Optional<Splitter> splitter = enclosure == 0 ? Optional.empty() : splitter(row, enclosure);
        Integer output = row.whole(OUTPUT, 1, splitter.map(Splitter::outputs).orElse(SplitterRows.MOST_OUTPUTS));
        Loss loss = row.decibels(LOSS, Row.Bound.FROM_ZERO);
        if (splitter.isEmpty() || output == null || loss == null) {
            return;
        }
        Tap earlier = bySplitter
                .computeIfAbsent(splitter.get().id(), any -> new LinkedHashMap<>())
                .putIfAbsent(output, new Tap(loss, row.line()));
        if (earlier != null) {
            row.fault(
                    OUTPUT,
                    row.named(OUTPUT) + " of splitter " + row.text(SPLITTER)
                            + " stands twice; write one row an output (the earlier is "
                            + row.table().file() + ":"
                            + earlier.line + ")");
        } else if (splitter.get().outputLosses().containsKey(output)) {
            row.fault(
                    OUTPUT,
                    row.named(OUTPUT) + " of splitter " + row.text(SPLITTER)
                            + " has a loss already; write one row an output (it is in the records file already)");
        }
    }

    private Optional<Splitter> splitter(Row row, int enclosure) {
        String code = row.text(SPLITTER);
        Optional<Splitter> found = entering.view().findSplitter(enclosure, code);
        String where = row.text(ENCLOSURE);
        if (found.isEmpty() && !row.blank(SPLITTER) && !entering.doubts().cover(Table.SPLITTERS, where + "/" + code)) {
            row.fault(
                    SPLITTER,
                    "splitter: there is no splitter '" + Texts.shown(code) + "' in enclosure " + where
                            + "; enter it in splitters.csv, or name one that is there");
        }
        return found;
    }

    @Override
    public void end() {
        bySplitter.forEach((id, taps) -> {
            Splitter before = entering.view().splitters().get(id);
            Map<Integer, Loss> losses = new HashMap<>(before.outputLosses());
            taps.forEach((output, tap) -> losses.put(output, tap.loss));
            Splitter after = withTaps(before, losses);
            int line = taps.values().iterator().next().line;
            entering.apply(Table.SPLITTER_OUTPUTS, line, Change.replace(before, after));
        });
    }

    /** Writes the row of one tap. */
    static void write(Codes codes, Splitter splitter, int output, Cells cells) {
        cells.put(ENCLOSURE, codes.enclosure(splitter.enclosure()));
        cells.put(SPLITTER, splitter.code());
        cells.put(OUTPUT, output);
        cells.put(LOSS, splitter.outputLosses().get(output));
    }

    /** A splitter with other losses of its taps. */
    static Splitter withTaps(Splitter splitter, Map<Integer, Loss> losses) {
        return new Splitter(
                splitter.id(),
                splitter.enclosure(),
                splitter.code(),
                splitter.inputs(),
                splitter.outputs(),
                splitter.loss(),
                losses);
    }
}
