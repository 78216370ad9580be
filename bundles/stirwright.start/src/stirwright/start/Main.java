package stirwright.start;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Optional;
import java.util.concurrent.FutureTask;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import org.eclipse.core.runtime.adaptor.EclipseStarter;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;

/**
 * Starts the framework, runs the application that the arguments ask for and ends the process with its exit code.
 * The platform's own launcher is not used: it takes arguments such as {@code -debug} for itself and reports its
 * errors on standard output, where only results may stand.
 */
public final class Main {
    /** What the command line says when it or a file could not be used; see the product's help. */
    private static final int UNUSABLE = 3;

    /** Common practice, no source: the framework ends within a fraction of a second. */
    private static final long END_S = 3;

    private Main() {
    }

    /** Hands {@code arguments} to the application exactly as they came. */
    public static void main(String[] arguments) {
        System.exit(run(arguments));
    }

    // EclipseStarter is marked as internal, yet it is what the platform's own launcher calls.
    @SuppressWarnings("restriction")
    private static int run(String[] arguments) {
        Way way = Way.of(arguments);
        Optional<String> obstacle = way.obstacle(System.getProperty("os.name"), System.getenv());
        if (obstacle.isPresent()) {
            System.err.println("stirwright: " + obstacle.get());
            return UNUSABLE;
        }
        System.setProperty("eclipse.application", way.application());
        way.product().ifPresent(product -> System.setProperty("eclipse.product", product));
        try {
            int code = application(way, EclipseStarter.startup(new String[0], null), arguments);
            shutDown(code);
            return code;
        } catch (Throwable failure) {
            // Everything is caught: what got here must end in words and an exit code, since threads of the framework
            // would keep the process alive after the main thread died.
            return told(failure);
        }
    }

    @SuppressWarnings("restriction")
    private static int application(Way way, BundleContext bundles, String[] arguments) {
        if (!usable(way.bundle(), bundles)) {
            System.err.println("stirwright: " + way.missing());
            return UNUSABLE;
        }
        try {
            return EclipseStarter.run(arguments) instanceof Integer code ? code : 0;
        } catch (Throwable failure) {
            // Everything is caught, for words and an exit code; told before the framework ends, since that may hang.
            return told(failure);
        }
    }

    private static int told(Throwable failure) {
        System.err.println("stirwright: could not be started: " + failure + kept(failure));
        return UNUSABLE;
    }

    /** A bundle whose start or stop hangs would keep the framework for a minute; the command is done by then. */
    @SuppressWarnings("restriction")
    private static void shutDown(int code) throws Exception {
        FutureTask<Void> end = new FutureTask<>(() -> {
            EclipseStarter.shutdown();
            return null;
        });
        Thread ending = new Thread(end, "stirwright-end");
        ending.setDaemon(true);
        ending.start();
        try {
            end.get(END_S, TimeUnit.SECONDS);
        } catch (TimeoutException hanging) {
            // An orderly exit would wait for the same.
            System.out.flush();
            System.err.flush();
            Runtime.getRuntime().halt(code);
        }
    }

    private static boolean usable(String name, BundleContext bundles) {
        return Arrays.stream(bundles.getBundles())
                .anyMatch(bundle -> name.equals(bundle.getSymbolicName()) && bundle.getState() >= Bundle.RESOLVED);
    }

    /** Keeps the details in a file, since they mean nothing to the user. */
    private static String kept(Throwable failure) {
        try {
            Path file = Files.createTempFile("stirwright-start-", ".txt");
            try (PrintWriter details = new PrintWriter(Files.newBufferedWriter(file))) {
                failure.printStackTrace(details);
            }
            return "; details are in " + file;
        } catch (IOException unwritable) {
            return "; details could not be kept: " + unwritable.getMessage();
        }
    }
}
