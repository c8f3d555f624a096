package spanwright.http;

import java.io.Serial;

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
}
