package stirwright.conformance.internal;

import java.time.Duration;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.Stream;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleException;
import org.osgi.framework.Constants;
import org.osgi.framework.ServiceReference;
import stirwright.correlation.Contribution;

/** What a framework says of a bundle, in words that a contributor can act on. */
public final class BundleErrors {
    private static final String UNRESOLVED = "Unresolved requirement:";
    private static final String COMPONENTS = "Service-Component";

    private BundleErrors() {}

    /** The missing requirements when that is why, else the message of the first cause. */
    public static String words(BundleException failure) {
        List<String> missing = String.valueOf(failure.getMessage()).lines().map(String::strip)
                .filter(line -> line.startsWith(UNRESOLVED))
                .map(line -> line.substring(UNRESOLVED.length()).strip()).distinct().toList();
        if (!missing.isEmpty()) {
            return "cannot be resolved; nothing that is installed provides " + String.join(" and ", missing);
        }
        Optional<Throwable> cause = Stream.<Throwable>iterate(failure, Objects::nonNull, Throwable::getCause)
                .reduce((outer, inner) -> inner);
        return "cannot be started: " + cause.orElse(failure);
    }

    /** Why a bundle that started has published nothing that can be used. */
    public static String nothingPublished(Bundle bundle, Duration waited) {
        String start = bundle.getSymbolicName() + " " + bundle.getVersion() + " started and published no service "
                + Contribution.class.getName() + " within " + waited.toSeconds() + " s; ";
        ServiceReference<?>[] services = bundle.getRegisteredServices();
        if (services != null && Stream.of(services).anyMatch(BundleErrors::isOfAnotherCopy)) {
            return start + "it published one of another copy of the contract: import the package, do not embed it";
        }
        return bundle.getHeaders().get(COMPONENTS) == null
                ? start + "its manifest has no " + COMPONENTS + " header: annotate the class with @Component and build the"
                        + " jar with a tool that writes the component's description"
                : start + "its " + COMPONENTS + " is " + bundle.getHeaders().get(COMPONENTS)
                        + ": the file must be in the jar, and every reference of the component satisfied";
    }

    private static boolean isOfAnotherCopy(ServiceReference<?> service) {
        String[] names = (String[]) service.getProperty(Constants.OBJECTCLASS);
        return Stream.of(names).anyMatch(Contribution.class.getName()::equals);
    }
}
