package stirwright.workbench.internal.session;

import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;

/** Gives work up whose outcome nobody waits for any more. */
final class Stale {

    private Stale() {}

    /** @throws CancellationException when the work is stale */
    static void check(BooleanSupplier stale) {
        if (stale.getAsBoolean()) {
            throw new CancellationException();
        }
    }
}
