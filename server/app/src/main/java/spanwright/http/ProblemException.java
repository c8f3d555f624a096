package spanwright.http;

import java.io.Serial;
import java.util.List;
import spanwright.incident.Written;
import spanwright.records.Refusal;

/** Carries a problem from where a request is found wrong to the one place that answers it. */
final class ProblemException extends RuntimeException {

    @Serial
    private static final long serialVersionUID = 1;

    private final transient Problem problem;

    ProblemException(Problem problem) {
        super(problem.detail(), null, false, false);
        this.problem = problem;
    }

    Problem problem() {
        return problem;
    }

    /** What was kept; where nothing was, the problem that says why. */
    static <T> T unlessRefused(Written<T> written) {
        if (written instanceof Written.Refused<T> refused) {
            List<Refusal> refusals = refused.refusals();
            throw new ProblemException(Problem.refused(refusals.stream()
                    .map(refusal -> new Problem.Fault(0, refusal.column(), refusal.sentence()))
                    .toList()));
        }
        return ((Written.Kept<T>) written).kept();
    }
}
