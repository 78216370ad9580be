package stirwright.core.internal;

import java.util.Optional;
import stirwright.core.FluidState;

/** The state that an implicit loop found, or why it found none: an outcome, not an error. */
record Solution(Optional<FluidState> state, String failure) {
    static Solution found(FluidState state) {
        return new Solution(Optional.of(state), "");
    }

    static Solution failed(String failure) {
        return new Solution(Optional.empty(), failure);
    }
}
