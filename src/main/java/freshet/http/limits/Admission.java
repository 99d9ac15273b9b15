package freshet.http.limits;

import freshet.http.problem.Problem;
import freshet.http.problem.ProblemException;
import freshet.http.problem.ProblemType;
import java.util.concurrent.Semaphore;

/** How many calculations may run at once; one more is turned away at once rather than made to wait. */
public final class Admission {

    private final Semaphore places;

    /** Room for {@code atOnce} calculations. */
    public Admission(int atOnce) {
        places = new Semaphore(atOnce);
    }

    /**
     * Takes a place, to be given back by {@link #leave()}.
     *
     * @throws ProblemException if there is none
     */
    public void enter() {
        if (!places.tryAcquire()) {
            throw new ProblemException(
                    Problem.of(ProblemType.BUSY, "As many calculations are running as the service takes at once."));
        }
    }

    /** Gives the place back. */
    public void leave() {
        places.release();
    }
}
