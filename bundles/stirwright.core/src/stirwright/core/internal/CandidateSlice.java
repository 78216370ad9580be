package stirwright.core.internal;

import java.util.Arrays;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.core.Slice;
import stirwright.correlation.Variable;
import stirwright.correlation.Verdict;

/** A candidate swept over one variable from the state of the pick. */
final class CandidateSlice implements Slice {
    private final Candidate candidate;
    private final FluidState state;
    private final Point point;
    private final Variable over;

    CandidateSlice(Candidate candidate, FluidState state, Point point, Variable over) {
        this.candidate = candidate;
        this.state = state;
        this.point = point;
        this.over = over;
    }

    @Override
    public void evaluate(double[] values, double[] into, Verdict[] verdicts) {
        if (values.length != into.length || values.length != verdicts.length) {
            throw new IllegalArgumentException(values.length + " values into room for " + into.length + " and "
                    + verdicts.length);
        }
        // What a failing code leaves untouched.
        Arrays.fill(into, Double.NaN);
        Arrays.fill(verdicts, Verdict.OUTSIDE);
        candidate.foreign().call(() -> sweep(values, into, verdicts), false);
    }

    private boolean sweep(double[] values, double[] into, Verdict[] verdicts) {
        boolean overReynolds = over.equals(Variable.REYNOLDS);
        for (int i = 0; i < values.length; i++) {
            double reynolds = overReynolds ? values[i] : state.reynolds();
            point.set(over, values[i]);
            into[i] = candidate.product(point, state, reynolds);
            verdicts[i] = candidate.worst(point, state, reynolds);
        }
        return true;
    }
}
