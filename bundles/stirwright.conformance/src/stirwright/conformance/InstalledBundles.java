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
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.InvalidSyntaxException;
import org.osgi.framework.ServiceReference;
import stirwright.core.Arrival;
import stirwright.core.Catalogue;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;

/** Makes subjects of the bundles that publish contributions in a running framework. */
public final class InstalledBundles {
    private static final String FOLDER = "reference";
    private static final String FILES = "*.csv";

    private InstalledBundles() {}

    /** One for each bundle that publishes a contribution at this moment, the bundle installed first first. */
    public static List<Subject> subjects(BundleContext context) {
        return references(context).stream().map(ServiceReference::getBundle).distinct()
                .map(bundle -> subject(context, bundle)).toList();
    }

    /** What one bundle publishes, amid what the others publish. */
    public static Subject subject(BundleContext context, Bundle bundle) {
        List<Contribution> own = new ArrayList<>();
        List<Arrival> others = new ArrayList<>();
        List<ServiceReference<Contribution>> references = references(context);
        try {
            for (ServiceReference<Contribution> reference : references) {
                Contribution contribution = context.getService(reference);
                if (reference.getBundle() == bundle) {
                    own.add(contribution == null ? new Unavailable() : contribution);
                } else if (contribution != null) {
                    others.add(new Arrival(contribution, origin(reference.getBundle())));
                }
            }
            return Subject.of(origin(bundle), own, referenceFiles(bundle), Catalogue.of(others));
        } finally {
            references.forEach(context::ungetService);
        }
    }

    /** Symbolic name and version, as the catalogue's messages name a bundle. */
    static String origin(Bundle bundle) {
        return bundle == null ? "a bundle that has left" : bundle.getSymbolicName() + " " + bundle.getVersion();
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

    /** Stands in for a service that its component could not create; Declarative Services logs the cause. */
    private static final class Unavailable implements Contribution {
        @Override
        public List<Correlation> correlations() {
            throw new IllegalStateException("the component that publishes the contribution could not be created; it needs"
                    + " a public constructor without parameters that does not fail");
        }
    }
}
