package stirwright.start;

import java.util.Map;
import java.util.Optional;

/** The two ways to start: which application runs, and what has to be there for it. */
enum Way {
    /** The window, alone or with a study or the demo. */
    WINDOW("org.eclipse.e4.ui.workbench.swt.E4Application", "stirwright.workbench"),
    /** A command, which needs no display. */
    CONSOLE("stirwright.console.application", "stirwright.console");

    private final String application;
    private final String bundle;

    Way(String application, String bundle) {
        this.application = application;
        this.bundle = bundle;
    }

    /**
     * The way that {@code arguments} ask for. Only what the window can open as it stands is the window's; everything
     * else, wrong use of {@code open} included, is for the command line, which knows how to say what is wrong.
     */
    static Way of(String... arguments) {
        boolean window = switch (arguments.length) {
            case 0 -> true;
            case 1 -> arguments[0].equals("open");
            case 2 -> arguments[0].equals("open") && !arguments[1].startsWith("-")
                    || arguments[0].equals("demo") && arguments[1].equals("--window");
            default -> false;
        };
        return window ? WINDOW : CONSOLE;
    }

    /** The application's id in the platform's registry. */
    String application() {
        return application;
    }

    /** The product that names the window's model; none for the command line. */
    Optional<String> product() {
        return this == WINDOW ? Optional.of("stirwright.workbench.product") : Optional.empty();
    }

    /** The bundle without which this way leads nowhere. */
    String bundle() {
        return bundle;
    }

    /** Why this way cannot be taken on such a system, in a sentence; empty when it can. */
    Optional<String> obstacle(String system, Map<String, String> environment) {
        boolean blind = this == WINDOW && system.equals("Linux")
                && environment.getOrDefault("DISPLAY", "").isEmpty()
                && environment.getOrDefault("WAYLAND_DISPLAY", "").isEmpty();
        return blind
                ? Optional.of("there is no display for the window (neither DISPLAY nor WAYLAND_DISPLAY is set);"
                        + " 'stirwright help' lists the commands that need none")
                : Optional.empty();
    }

    /** What to say where {@link #bundle()} is not installed or cannot be used. */
    String missing() {
        return this == WINDOW
                ? "this installation has no window; 'stirwright help' lists the commands that it has"
                : "the installation is incomplete; unpack it again";
    }
}
