package spanwright.http;

import io.javalin.http.Context;
import spanwright.answers.SparesDocument;
import spanwright.answers.SparesReply;
import spanwright.planning.SpareQuestion;

/** Spare fibers from one structure to another. */
final class SparesRoute {

    private static final int LONGEST_CODE = 200;

    private final Answering answering;

    SparesRoute(Answering answering) {
        this.answering = answering;
    }

    void spares(Context ctx) {
        Question question = new Question(
                ctx, "from", "to", "fibers", "same_tube", "avoid_circuit", Answering.AS_OF, Answering.AS_IF);
        SparesReply.Asked asked = new SparesReply.Asked(
                question.needed("from", LONGEST_CODE),
                question.needed("to", LONGEST_CODE),
                question.findWhole("fibers", 1, SpareQuestion.MOST_FIBERS)
                        .orElseThrow(() -> Question.wrong("fibers", "The parameter fibers is needed.")),
                question.yes("same_tube"),
                question.text("avoid_circuit"));
        answering.answer(
                ctx,
                answering.view(question),
                (json, view) -> new SparesDocument(SparesReply.of(view, asked)).write(json));
    }
}
