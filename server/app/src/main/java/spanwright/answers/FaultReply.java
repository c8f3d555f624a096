package spanwright.answers;

import java.util.Locale;
import java.util.Objects;
import spanwright.answers.Unanswerable.Kind;
import spanwright.fault.FaultAnswer;
import spanwright.fault.FaultFinder;
import spanwright.fault.FaultPlaces;
import spanwright.fault.NotPlaced;
import spanwright.fault.Reading;

/**
 * Where a distance read on an OTDR lies.
 *
 * @param view the view that it was asked of
 * @param reading the distance, and how it was taken
 * @param found the places
 */
public record FaultReply(View view, Reading reading, FaultPlaces found) {

    /** Answers a question. */
    public static FaultReply of(View view, FaultQuestion question) {
        References references = new References(view.records());
        EndReferences ends = new EndReferences(view.records());
        long start = question.port() != null
                ? references.front(question.port())
                : ends.end(Objects.requireNonNull(question.from()), "from");
        Long to = question.to() == null ? null : Long.valueOf(ends.portOrEnd(question.to(), "to"));
        Reading reading = question.reading(references);
        FaultFinder finder = new FaultFinder(view.snapshot());
        FaultQuestion.Far far = question.far();
        FaultAnswer answer = far == null
                ? finder.find(start, to, reading)
                : finder.find(start, to, reading, references.front(far.port(), "far_port"), question.farReading(far));
        if (answer instanceof NotPlaced refused) {
            throw refused(refused, question);
        }
        return new FaultReply(view, reading, (FaultPlaces) answer);
    }

    private static Unanswerable refused(NotPlaced refused, FaultQuestion question) {
        String text = refused.sentence();
        String sentence = text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1) + ".";
        return switch (refused.part()) {
            case START -> new Unanswerable(Kind.BAD_REFERENCE, sentence, question.port() == null ? "from" : "port");
            case TO -> new Unanswerable(Kind.BAD_REFERENCE, sentence, "to");
            case DISTANCE -> new Unanswerable(Kind.BAD_REQUEST, sentence, "distance");
            case WAVELENGTH -> new Unanswerable(Kind.WAVELENGTH_OUT_OF_RANGE, sentence, "wavelength");
            case EVENT -> new Unanswerable(Kind.BAD_REQUEST, sentence, "event");
            case FAR -> new Unanswerable(Kind.BAD_REQUEST, sentence, "far_port");
        };
    }
}
