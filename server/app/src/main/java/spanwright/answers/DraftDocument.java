package spanwright.answers;

import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.draft.Draft;
import spanwright.draft.SheetCheck;
import spanwright.draft.Slip;
import spanwright.draft.TouchedCircuit;
import spanwright.draft.TubeConflict;
import spanwright.plant.Enclosure;
import spanwright.sheet.PastedBlock;
import spanwright.sheet.SheetHeader;
import spanwright.sheet.TextPlace;

/** Drafts of sheets, and what a check finds in them. */
public final class DraftDocument {

    private final View view;

    /** Written by the codes and in the zone of a view of the records as they are. */
    public DraftDocument(View view) {
        this.view = view;
    }

    /** A draft with its text, and the other open drafts of its enclosure. */
    public void one(Json json, Draft draft, List<Draft> beside) {
        head(json, draft);
        SheetHeader header = draft.text().header();
        json.texts("lines", draft.text().lines());
        json.object(
                "header",
                item -> item.text("job", header.job())
                        .text("spliced_by", header.splicedBy())
                        .date("spliced_on", header.splicedOn())
                        .text("source", header.source())
                        .text("note", header.note()));
        json.object(
                "cursor",
                item -> item.whole("line", draft.text().cursorLine())
                        .whole("column", draft.text().cursorColumn()));
        json.list(
                "answers",
                draft.text().answers(),
                (item, answer) -> item.text("rule", answer.rule())
                        .text("line", answer.line())
                        .text("reason", answer.reason()));
        json.flag("can_undo", draft.canUndo()).flag("can_redo", draft.canRedo());
        json.list("beside", beside, this::head);
    }

    /** A draft without its text. */
    public void head(Json json, Draft draft) {
        json.whole("draft", draft.id()).text("enclosure", enclosure(draft));
        json.text("author", draft.author()).text("state", draft.state().word());
        json.whole("revision", draft.revision()).whole("base", draft.base());
        json.text("begun_at", view.time(draft.begunAt())).text("saved_at", view.time(draft.savedAt()));
        json.text("job", draft.text().header().job()).text("submitted_by", draft.submittedBy());
        json.whole("posting", draft.posting());
    }

    private @Nullable String enclosure(Draft draft) {
        return view.records()
                .enclosures()
                .find(draft.enclosure())
                .map(Enclosure::code)
                .orElse(null);
    }

    /** What a check found. */
    public void check(Json json, Draft draft, SheetCheck check) {
        json.whole("draft", draft.id()).whole("revision", draft.revision());
        json.whole("posting", view.posting());
        json.list("findings", check.slips(), (item, slip) -> slip(item, slip, SheetCheck.answer(slip, draft.text())));
        json.flag("ready", check.open(draft.text()).isEmpty());
        json.list("understood", check.read().statements(), (item, statement) -> {
            place(item, statement.place());
            item.texts("ends", statement.ends().stream().map(view.names()::ends).toList());
        });
        json.texts("before", check.before()).texts("after", check.after());
        json.whole("changes", check.changes().size());
        json.list("circuits", check.circuits(), DraftDocument::circuit);
        json.whole("circuits_total", check.circuitsTotal()).flag("second_person", check.touchesPriority());
    }

    private static void place(Json json, TextPlace place) {
        json.whole("line", place.line()).whole("column", place.column()).whole("length", place.length());
    }

    private static void slip(Json json, Slip slip, @Nullable String answer) {
        place(json, slip.place());
        json.text("weight", slip.weight().word()).text("rule", slip.rule());
        json.text("text", slip.text()).text("mend", slip.mend()).text("answer", answer);
    }

    private static void circuit(Json json, TouchedCircuit touched) {
        json.text("circuit", touched.circuit().code())
                .whole("priority", touched.circuit().priority())
                .whole("customers_served", touched.circuit().customersServed());
        json.number("wavelength_nm", touched.wavelength().exactNanometres());
        json.flag("whole_before", touched.wholeBefore()).flag("whole_after", touched.wholeAfter());
        json.decibels("loss_before_db", touched.lossBefore()).decibels("loss_after_db", touched.lossAfter());
    }

    /** What a pasted block was understood to say. */
    public static void pasted(Json json, PastedBlock block) {
        json.texts("lines", block.lines());
        json.list(
                "doubts",
                block.doubts(),
                (item, doubt) -> item.whole("row", doubt.row())
                        .whole("column", doubt.column())
                        .text("text", doubt.text())
                        .text("mend", doubt.mend()));
    }

    /** A tube that was changed meanwhile. */
    public static void conflict(Json json, TubeConflict tube) {
        place(json, tube.place());
        json.text("leg", tube.leg()).text("tube", tube.tube()).text("numbers", tube.numbers());
        json.text("was", tube.was()).text("is", tube.is()).text("said", tube.said());
    }
}
