package stirwright.core.internal;

import java.util.Optional;
import stirwright.core.FluidState;

/**
 * A candidate evaluated at a state.
 *
 * @param state empty when no state could be found; then the obstacle of the assessment says why
 */
record Trial(Candidate candidate, Optional<FluidState> state, double value, Assessment assessment) {

    /** Whether its number means anything, qualified or not. */
    boolean usable() {
        return state.isPresent() && value > 0 && value < Double.POSITIVE_INFINITY;
    }

    /** Whether it may be recommended; a given value is no candidate for that. */
    boolean qualifies() {
        return candidate.correlation().isPresent() && usable() && assessment.qualifies();
    }

    /** Whether none can be nearer: trusted and within every stated bound, though it may not qualify. */
    boolean isNearest() {
        return usable() && candidate.doubts() == 0 && assessment.failureCount() == 0 && assessment.distance() == 0;
    }

    /** Whether its digits, its source and its standing would allow to recommend it elsewhere. */
    boolean trustworthy() {
        return candidate.correlation().map(Trust::in).orElse(true);
    }
}
