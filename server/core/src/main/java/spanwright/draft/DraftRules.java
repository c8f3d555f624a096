package spanwright.draft;

import java.time.Instant;
import java.util.Optional;
import java.util.function.IntFunction;
import org.jspecify.annotations.Nullable;
import spanwright.records.Refusal;

/** What may be done to a draft, and what it then is; the same for every book. */
public final class DraftRules {

    /** How many versions of a draft are kept to go back to. */
    public static final int MOST_VERSIONS = 1_000;

    private static final int LONGEST_SHEET = 200_000;

    private DraftRules() {}

    /** Why a draft cannot begin so; nothing where it can. */
    public static Optional<Refusal> refuse(DraftStart start) {
        if (start.author().isBlank()) {
            return Optional.of(refusal("draft-by-nobody", "author", "A draft has an author: say who writes."));
        }
        return refuse(start.text());
    }

    private static Optional<Refusal> refuse(DraftText text) {
        int letters = text.lines().stream().mapToInt(String::length).sum();
        return letters <= LONGEST_SHEET
                ? Optional.empty()
                : Optional.of(refusal(
                        "draft-too-long",
                        "lines",
                        "A sheet is " + LONGEST_SHEET + " characters long at most; write ranges, or several sheets."));
    }

    /** Why a step cannot be taken; nothing where it can. */
    public static Optional<Refusal> refuse(Draft draft, DraftStep step) {
        if (step instanceof DraftStep.Save save) {
            return draft.state() == DraftState.WRITING ? refuse(save.text()) : notNow(draft, "written on");
        }
        if (step instanceof DraftStep.Undo) {
            return draft.canUndo() ? Optional.empty() : notNow(draft, "undone");
        }
        if (step instanceof DraftStep.Redo) {
            return draft.canRedo() ? Optional.empty() : notNow(draft, "redone");
        }
        if (step instanceof DraftStep.Submit) {
            return draft.state() == DraftState.WRITING ? Optional.empty() : notNow(draft, "submitted");
        }
        if (step instanceof DraftStep.Withdraw || step instanceof DraftStep.Posted) {
            String what = step instanceof DraftStep.Withdraw ? "withdrawn" : "posted";
            return draft.state() == DraftState.SUBMITTED ? Optional.empty() : notNow(draft, what);
        }
        return draft.state().open() ? Optional.empty() : notNow(draft, "dropped");
    }

    private static Optional<Refusal> notNow(Draft draft, String what) {
        String why = draft.state() == DraftState.WRITING
                ? "there is nothing to be " + what
                : "it is " + draft.state().word()
                        + (draft.state() == DraftState.SUBMITTED ? "; withdraw it first" : "; begin another");
        return Optional.of(
                refusal("draft-not-" + what.replace(' ', '-'), null, "Draft " + draft.id() + ": " + why + "."));
    }

    private static Refusal refusal(String code, @Nullable String column, String sentence) {
        return new Refusal(code, sentence, column, null, null);
    }

    /** The draft as it begins. */
    public static Draft begin(int id, DraftStart start, Instant now) {
        return new Draft(
                id,
                start.enclosure(),
                start.author(),
                now,
                now,
                1,
                start.base(),
                Draft.Steps.FIRST,
                DraftState.WRITING,
                null,
                null,
                null,
                start.text());
    }

    /**
     * The draft once a step was taken that is not refused.
     *
     * @param versions gives the text of a version
     */
    public static Draft after(Draft draft, DraftStep step, Instant now, IntFunction<DraftText> versions) {
        Draft.Steps at = draft.steps();
        if (step instanceof DraftStep.Save save) {
            boolean same = save.text().says(draft.text());
            int next = at.at() + 1;
            Draft.Steps steps =
                    same ? at : new Draft.Steps(Math.max(at.oldest(), next - MOST_VERSIONS + 1), next, next);
            return moved(draft, now, steps, save.base(), save.text());
        }
        if (step instanceof DraftStep.Undo || step instanceof DraftStep.Redo) {
            int to = at.at() + (step instanceof DraftStep.Undo ? -1 : 1);
            Draft.Steps steps = new Draft.Steps(at.oldest(), to, at.newest());
            return moved(draft, now, steps, draft.base(), versions.apply(to));
        }
        if (step instanceof DraftStep.Submit submit) {
            return in(draft, now, DraftState.SUBMITTED, submit.by(), null, null);
        }
        if (step instanceof DraftStep.Posted posted) {
            return in(draft, now, DraftState.POSTED, draft.submittedBy(), posted.posting(), posted.fingerprint());
        }
        DraftState state = step instanceof DraftStep.Withdraw ? DraftState.WRITING : DraftState.DROPPED;
        return in(draft, now, state, null, null, null);
    }

    private static Draft moved(Draft draft, Instant now, Draft.Steps steps, int base, DraftText text) {
        return new Draft(
                draft.id(),
                draft.enclosure(),
                draft.author(),
                draft.begunAt(),
                now,
                draft.revision() + 1,
                base,
                steps,
                draft.state(),
                draft.submittedBy(),
                draft.posting(),
                draft.fingerprint(),
                text);
    }

    private static Draft in(
            Draft draft,
            Instant now,
            DraftState state,
            @Nullable String by,
            @Nullable Integer posting,
            @Nullable String fingerprint) {
        return new Draft(
                draft.id(),
                draft.enclosure(),
                draft.author(),
                draft.begunAt(),
                now,
                draft.revision() + 1,
                draft.base(),
                draft.steps(),
                state,
                by,
                posting,
                fingerprint,
                draft.text());
    }
}
