package spanwright.http;

import io.javalin.http.Context;
import java.math.BigDecimal;
import java.util.List;
import spanwright.answers.FaultDocument;
import spanwright.answers.FaultQuestion;
import spanwright.answers.FaultReply;

/** Where a distance read on an OTDR lies. */
final class FaultRoute {

    /** The parameters of a shot, and those of every view. */
    static final List<String> PARAMETERS = List.of(
            "port",
            "from",
            "to",
            "distance",
            "index",
            "launch",
            "wavelength",
            "event",
            "far_port",
            "far_distance",
            "far_launch",
            Answering.AS_OF,
            Answering.AS_IF);

    private static final int MOST_EVENTS = 200;

    private final Answering answering;

    FaultRoute(Answering answering) {
        this.answering = answering;
    }

    void fault(Context ctx) {
        Question question = new Question(ctx, PARAMETERS.toArray(String[]::new));
        FaultQuestion asked = asked(question);
        answering.answer(
                ctx,
                answering.view(question),
                (json, view) -> new FaultDocument(FaultReply.of(view, asked)).write(json));
    }

    /** The question that the parameters ask. */
    static FaultQuestion asked(Question question) {
        List<String> events = question.texts("event");
        if (events.size() > MOST_EVENTS) {
            throw Question.wrong("event", "One question names " + MOST_EVENTS + " events at most.");
        }
        FaultQuestion.Shot shot = new FaultQuestion.Shot(
                question.findDecimal("distance")
                        .orElseThrow(() -> Question.wrong("distance", "The parameter distance is needed.")),
                question.findDecimal("launch").orElse(BigDecimal.ZERO),
                question.findDecimal("index").orElse(null),
                question.findDecimal("wavelength").orElse(null));
        return new FaultQuestion(
                question.text("port"),
                question.text("from"),
                question.text("to"),
                shot,
                events,
                FaultQuestion.Far.of(
                        question.text("far_port"),
                        question.findDecimal("far_distance").orElse(null),
                        question.findDecimal("far_launch").orElse(null)));
    }
}
