package spanwright.answers;

import org.jspecify.annotations.Nullable;
import spanwright.repair.RepairMade;

/** What a repair made, or would make. */
public final class RepairDocument {

    private final RepairMade made;
    private final @Nullable Integer posting;

    /**
     * Of a repair.
     *
     * @param posting the number of its posting; null where it is a preview, of which nothing is kept
     */
    public RepairDocument(RepairMade made, @Nullable Integer posting) {
        this.made = made;
        this.posting = posting;
    }

    /** Writes its members. */
    public void write(Json json) {
        json.flag("preview", posting == null).whole("posting", posting);
        json.texts("parts", made.parts()).text("part_of", made.partOf());
        json.whole("fibers", made.fibers()).whole("joints", made.joints()).whole("changes", made.changes());
        json.metres("piece_m", made.piece()).metres("route_m", made.route());
        json.metres("coils_removed_m", made.coilsRemoved());
        json.list("joined", made.seams(), this::seam);
        json.texts("circuits", made.circuits()).texts("left_in_journal", made.leftInJournal());
    }

    private void seam(Json json, RepairMade.Seam seam) {
        String fibers = made.fibers() == 1 ? "1" : "1-" + made.fibers();
        json.text("enclosure", seam.enclosure()).text("structure", seam.structure());
        json.text("a", seam.back() + " back " + fibers).text("b", seam.ahead() + " ahead " + fibers);
        json.whole("count", made.fibers());
        json.metres("slack_before_m", seam.before()).metres("slack_after_m", seam.after());
    }
}
