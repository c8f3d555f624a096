package spanwright.cli;

import java.nio.file.Path;
import java.util.function.BiFunction;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Option;
import spanwright.answers.View;
import spanwright.answers.Views;
import spanwright.journal.Posting;
import spanwright.network.Ledger;

/** What every command that answers takes. */
final class ViewOptions {

    @Option(names = "--records", required = true, paramLabel = "FILE", description = "The records file.")
    private Path records;

    @Option(
            names = "--as-of",
            paramLabel = "POSTING|TIME",
            description = "Answer from the records as they stood: a posting's number, that posting included, or a time"
                    + " such as 2026-03-31T14:05-05:00; without an offset it is in the records' own zone,"
                    + " and a date lasts through that day.")
    private @Nullable String asOf;

    @Option(
            names = "--as-if",
            paramLabel = "JOB",
            description = "Answer as if the planned joints of this job were built.")
    private @Nullable String asIf;

    /** Answers from the view that is asked for. */
    <T> T answer(Program program, Function<View, T> answer) {
        return answer(program, (view, posting) -> answer.apply(view));
    }

    /** Answers from the view that is asked for and its last posting, null where there is none. */
    <T> T answer(Program program, Dated<T> answer) {
        try (Ledger ledger = program.open(records)) {
            View view = new Views(ledger).of(asOf, asIf);
            return answer.of(view, ledger.findPosting(view.posting()).orElse(null));
        }
    }

    /** Answers from the view that is asked for, and from where it is. */
    <T> T answerWithin(Program program, BiFunction<Views, View, T> answer) {
        try (Ledger ledger = program.open(records)) {
            Views views = new Views(ledger);
            return answer.apply(views, views.of(asOf, asIf));
        }
    }

    /**
     * Answers from a view and its last posting.
     *
     * @param <T> the answer's type
     */
    interface Dated<T> {
        /** Answers. */
        T of(View view, @Nullable Posting posting);
    }
}
