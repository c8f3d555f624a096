package spanwright.repair;

import java.util.ArrayList;
import java.util.List;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.plant.Cable;
import spanwright.plant.RunRow;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.records.CableLay;

/** The runs of the three parts of a cable that is cut, with all that lies along them. */
final class RepairRuns {

    private final RepairEntry entry;
    private final RepairOrder order;
    private final RepairSite site;
    private final CableLay lay;
    private final RepairMarks marks;

    RepairRuns(RepairEntry entry, RepairOrder order, RepairSite site, RepairMarks marks) {
        this.entry = entry;
        this.order = order;
        this.site = site;
        this.lay = site.lay();
        this.marks = marks;
    }

    /** Rows from the second on go to the part toward the end, with their marks, enclosures, joints and states of ends. */
    List<RunRow> moveEnd(Cable end) {
        List<RunRow> moved = new ArrayList<>();
        for (int row = site.second(); row < lay.rows().size(); row++) {
            moved.add(entry.add(endRow(row, end)));
        }
        MovedEnds ends = new MovedEnds(entry.records(), entry::apply);
        for (int index = 0; index < moved.size(); index++) {
            ends.move(lay.rows().get(site.second() + index), moved.get(index), end.id());
        }
        ends.finish();
        ends.giveUp();
        for (int index = 0; index < moved.size(); index++) {
            marks.move(site.second() + index, moved.get(index));
        }
        return moved;
    }

    private RunRow endRow(int row, Cable end) {
        RunRow was = lay.rows().get(row);
        boolean first = row == site.second();
        boolean drawn = first && site.drawn(row);
        return new RunRow(
                entry.next(RecordKind.RUN_ROW),
                end.id(),
                row - site.second(),
                was.structure(),
                first ? null : was.span(),
                drawn ? site.left(row) : was.slack(),
                was.slackTrust(),
                drawn ? order.on() : was.slackOn(),
                was.duct());
    }

    /** The part toward the start loses all rows beyond the first, and what was drawn from its coil. */
    RunRow shorten() {
        for (int row = site.second() - 1; row > site.first(); row--) {
            marks.remove(row);
        }
        for (int row = lay.rows().size() - 1; row > site.first(); row--) {
            entry.apply(Change.remove(lay.rows().get(row)));
        }
        marks.shorten();
        int last = site.first();
        RunRow row = lay.rows().get(last);
        if (!site.drawn(last)) {
            return row;
        }
        RunRow shorter = new RunRow(
                row.id(),
                row.cable(),
                row.seq(),
                row.structure(),
                row.span(),
                site.left(last),
                row.slackTrust(),
                order.on(),
                row.duct());
        entry.apply(Change.replace(row, shorter));
        return shorter;
    }

    /** The piece lies along the route between the two; what of it is over is coiled at the second. */
    List<RunRow> layPiece(Cable piece) {
        List<RunRow> rows = new ArrayList<>();
        Length rest = site.pieceLength().minus(site.route());
        for (int row = site.first(); row <= site.second(); row++) {
            RunRow like = lay.rows().get(row);
            rows.add(entry.add(new RunRow(
                    entry.next(RecordKind.RUN_ROW),
                    piece.id(),
                    row - site.first(),
                    like.structure(),
                    row == site.first() ? null : like.span(),
                    row == site.second() ? rest : Length.ZERO,
                    Trust.REPORTED,
                    order.on(),
                    like.duct())));
        }
        return rows;
    }
}
