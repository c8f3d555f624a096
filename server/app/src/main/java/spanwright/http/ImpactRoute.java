package spanwright.http;

import io.javalin.http.Context;
import java.util.List;
import spanwright.answers.CutReferences;
import spanwright.answers.ImpactDocument;
import spanwright.answers.View;
import spanwright.outage.Impact;

/** What a cut takes down, in the order to restore. */
final class ImpactRoute {

    private static final int MOST_CUTS = 200;
    private static final String CUT = "cut";
    private static final String FIBERS = "fibers";

    private final Answering answering;

    ImpactRoute(Answering answering) {
        this.answering = answering;
    }

    void impact(Context ctx) {
        Question question = new Question(ctx, CUT, FIBERS, Answering.AS_OF, Answering.AS_IF);
        List<String> cuts = question.texts(CUT);
        if (cuts.isEmpty() || cuts.size() > MOST_CUTS) {
            throw Question.wrong(CUT, "Name what is cut, 1 to " + MOST_CUTS + " things, such as cut=span:S-1.");
        }
        boolean fibers = question.yes(FIBERS);
        View view = answering.view(question);
        answering.answer(
                ctx,
                view,
                (json, of) -> new ImpactDocument(
                                of, Impact.of(of.snapshot(), new CutReferences(of.records()).list(cuts)), fibers)
                        .write(json));
    }
}
