package stirwright.start;

import org.eclipse.core.runtime.adaptor.EclipseStarter;

/**
 * Starts the framework, runs the application that the configuration names and ends the process with its exit code.
 * The platform's own launcher is not used: it takes arguments such as {@code -debug} for itself and reports its
 * errors on standard output, where only results may stand.
 */
public final class Main {
    /** The exit code of a run that broke: above those that tell about the user's input. */
    private static final int BROKEN = 70;

    private Main() {
    }

    /** Hands {@code arguments} to the application exactly as they came. */
    public static void main(String[] arguments) {
        System.exit(run(arguments));
    }

    // EclipseStarter is marked as internal, yet it is what the platform's own launcher calls.
    // Everything is caught: what got here must end in words and an exit code, since threads of the framework would
    // keep the process alive after the main thread died.
    @SuppressWarnings("restriction")
    private static int run(String[] arguments) {
        try {
            EclipseStarter.startup(new String[0], null);
            try {
                return EclipseStarter.run(arguments) instanceof Integer code ? code : 0;
            } finally {
                EclipseStarter.shutdown();
            }
        } catch (Throwable failure) {
            System.err.println("stirwright: stopped by an internal error:");
            failure.printStackTrace();
            return BROKEN;
        }
    }
}
