package spanwright.http;

import io.javalin.http.Context;
import java.math.BigDecimal;
import spanwright.answers.TraceAnswer;
import spanwright.answers.TraceDocument;
import spanwright.answers.TraceQuestion;

/** A glass path end to end, with loss, and where it lies. */
final class TraceRoute {

    private static final int MOST_CIRCUITS = 200;

    private final Answering answering;

    TraceRoute(Answering answering) {
        this.answering = answering;
    }

    void trace(Context ctx) {
        Question question = new Question(
                ctx, "circuit", "port", "fiber", "wavelength", "budget", "margin", Answering.AS_OF, Answering.AS_IF);
        if (question.texts("circuit").size() > MOST_CIRCUITS) {
            throw Question.wrong("circuit", "One question names " + MOST_CIRCUITS + " circuits at most.");
        }
        String budget = question.text("budget");
        TraceQuestion asked = new TraceQuestion(
                question.texts("circuit"),
                false,
                question.text("port"),
                question.text("fiber"),
                question.findDecimal("wavelength")
                        .map(TraceQuestion::wavelength)
                        .orElse(null),
                budget == null ? null : TraceQuestion.budget(budget),
                TraceQuestion.margin(question.findDecimal("margin").orElse(BigDecimal.ZERO)));
        answering.answer(
                ctx,
                answering.view(question),
                (json, view) -> new TraceDocument(TraceAnswer.of(view, asked), true).write(json));
    }
}
