package spanwright.answers;

import java.util.Comparator;
import java.util.List;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;
import spanwright.records.CableLay;
import spanwright.records.Relation;

/** What a run row says of itself, wherever it is shown. */
final class RunRowDocument {

    private RunRowDocument() {}

    static void positions(Json json, CableLay lay, RunRow row) {
        json.metres("position_in_m", lay.positions().in(row.seq()));
        json.metres("position_out_m", lay.positions().out(row.seq()));
    }

    static void slack(Json json, RunRow row) {
        json.metres("slack_m", row.slack()).text("slack_trust", row.slackTrust().word());
        json.date("slack_on", row.slackOn());
    }

    /** Every set of marks read here, the one that governs first. */
    static void marks(Json json, View view, RunRow row, String governing) {
        List<SheathMark> marks = view.records()
                .sheathMarks()
                .owned(Relation.RUN_ROW_MARKS, row.id())
                .sorted(Comparator.comparing((SheathMark mark) -> !mark.ink().equals(governing))
                        .thenComparing(SheathMark::ink))
                .toList();
        json.list("marks", marks, (item, mark) -> {
            item.text("ink", mark.ink()).text("unit", mark.unit().symbol());
            item.number("mark_in", mark.markIn()).number("mark_out", mark.markOut());
            item.date("read_on", mark.readOn()).text("trust", mark.trust().word());
            item.flag("governs", mark.ink().equals(governing));
        });
    }
}
