package freshet.http.problem;

/** Thrown where a request meets a problem that is not a fault of its inputs. */
public final class ProblemException extends RuntimeException {

    private static final long serialVersionUID = 1L;

    private final transient Problem problem;

    /** Ends the request with a problem. */
    public ProblemException(Problem problem) {
        super(problem.detail(), null, false, false);
        this.problem = problem;
    }

    /** The problem. */
    public Problem problem() {
        return problem;
    }
}
