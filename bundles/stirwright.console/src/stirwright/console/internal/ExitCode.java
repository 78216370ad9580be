package stirwright.console.internal;

import stirwright.core.Status;

/** What the process says to scripts, as the contract page fixes it. */
final class ExitCode {
    static final int OK = 0;
    static final int FLAGGED = 1;
    static final int REFUSED = 2;
    /** The command line or a file could not be used. */
    static final int UNUSABLE = 3;

    private ExitCode() {}

    static int of(Status worst) {
        return switch (worst) {
            case OK -> OK;
            case FLAGGED -> FLAGGED;
            case REFUSED -> REFUSED;
        };
    }
}
