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
import java.util.List;
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
        return references(context).stream().map(ServiceReference::getBundle).distinct();
    }

    /** What holds up the correlations that are published at this moment. */
    public static List<Proof> proofs(BundleContext context) {
        return subjects(context).stream().flatMap(subject -> subject.proofs().stream()).toList();
    }

    /** What one bundle publishes, amid what the others publish. */
    public static Subject subject(BundleContext context, Bundle bundle) {
        List<Arrival> own = new ArrayList<>();
        List<Arrival> others = new ArrayList<>();
        for (ServiceReference<Contribution> reference : references(context)) {
            (bundle.equals(reference.getBundle()) ? own : others).add(ask(context, reference));
        }
        return Subject.of(Arrival.origin(bundle), own, referenceFiles(bundle), Catalogue.of(others));
    }

    private static Arrival ask(BundleContext context, ServiceReference<Contribution> reference) {
        String origin = Arrival.origin(reference.getBundle());
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
            return found.stream().filter(reference -> reference.getBundle() != null)
                    .sorted(Comparator.comparingLong(reference -> reference.getBundle().getBundleId())).toList();
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
