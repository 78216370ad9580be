package stirwright.conformance;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URL;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.Stream;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.InvalidSyntaxException;
import org.osgi.framework.ServiceReference;
import stirwright.core.Arrival;
import stirwright.core.Catalogue;
import stirwright.correlation.Contribution;

/** Makes subjects of the bundles that publish contributions in a running framework. */
public final class InstalledBundles {
    private static final String FOLDER = "reference";
    private static final String FILES = "*.csv";

    /** Declarative Services logs the cause and tells nobody else. */
    private static final String NOT_CREATED = "an error when its component is created, so it needs a public constructor"
            + " without parameters that does not fail";

    private InstalledBundles() {}

    /** One for each bundle that publishes a contribution at this moment, the bundle installed first first. */
    public static List<Subject> subjects(BundleContext context) {
        return bundles(context).map(bundle -> subject(context, bundle)).toList();
    }

    /** The bundles that publish a contribution at this moment, the one installed first first. */
    static Stream<Bundle> bundles(BundleContext context) {
        return references(context).stream().map(ServiceReference::getBundle).filter(Objects::nonNull).distinct();
    }

    /** What holds up the correlations that are published at this moment. */
    public static List<Proof> proofs(BundleContext context) {
        return bundles(context).flatMap(bundle -> proofs(context, bundle)).toList();
    }

    private static Stream<Proof> proofs(BundleContext context, Bundle bundle) {
        try {
            return subject(context, bundle).proofs().stream();
        } catch (IllegalStateException | UncheckedIOException failure) {
            if (bundle.getState() == Bundle.UNINSTALLED) {
                // It left while it was read, so nobody asks for what it brought.
                return Stream.empty();
            }
            throw failure;
        }
    }

    /** What one bundle publishes, amid what the others publish. */
    public static Subject subject(BundleContext context, Bundle bundle) {
        List<Arrival> own = new ArrayList<>();
        List<Arrival> others = new ArrayList<>();
        for (ServiceReference<Contribution> reference : references(context)) {
            Bundle publisher = reference.getBundle();
            // None once the service is gone.
            if (publisher != null) {
                (bundle.equals(publisher) ? own : others).add(ask(context, reference, Arrival.origin(publisher)));
            }
        }
        return Subject.of(Arrival.origin(bundle), own, referenceFiles(bundle), Catalogue.of(others));
    }

    private static Arrival ask(BundleContext context, ServiceReference<Contribution> reference, String origin) {
        Contribution contribution = context.getService(reference);
        if (contribution == null) {
            return new Arrival(origin, List.of(), List.of(), Optional.of(NOT_CREATED));
        }
        try {
            return Arrival.of(contribution, origin);
        } finally {
            context.ungetService(reference);
        }
    }

    private static List<ServiceReference<Contribution>> references(BundleContext context) {
        try {
            Collection<ServiceReference<Contribution>> found = context.getServiceReferences(Contribution.class, null);
            // Kept aside, since a reference loses its bundle when the service goes.
            Map<ServiceReference<Contribution>, Long> ids = new LinkedHashMap<>();
            found.forEach(reference -> Optional.ofNullable(reference.getBundle())
                    .ifPresent(bundle -> ids.put(reference, bundle.getBundleId())));
            return ids.entrySet().stream().sorted(Map.Entry.comparingByValue()).map(Map.Entry::getKey).toList();
        } catch (InvalidSyntaxException impossible) {
            throw new IllegalStateException("no filter was given", impossible);
        }
    }

    private static List<ReferenceFile> referenceFiles(Bundle bundle) {
        var entries = bundle.findEntries(FOLDER, FILES, true);
        return entries == null ? List.of() : Collections.list(entries).stream().map(InstalledBundles::read)
                .sorted(Comparator.comparing(ReferenceFile::name)).toList();
    }

    private static ReferenceFile read(URL entry) {
        try (InputStream in = entry.openStream()) {
            return new ReferenceFile(entry.getPath().replaceFirst("^/", ""),
                    new String(in.readAllBytes(), StandardCharsets.UTF_8));
        } catch (IOException failure) {
            throw new UncheckedIOException("cannot read " + entry, failure);
        }
    }
}
