package stirwright.core.internal;

import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.CopyOnWriteArrayList;
import org.osgi.framework.ServiceReference;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.osgi.service.component.annotations.ReferenceCardinality;
import org.osgi.service.component.annotations.ReferencePolicy;
import stirwright.core.Arrival;
import stirwright.core.Catalogue;
import stirwright.core.Library;
import stirwright.correlation.Contribution;

/** Collects contributions as their bundles come and go; the bundle installed first comes first. */
@Component
public final class ContributionRegistry implements Library {

    private static final Comparator<ServiceReference<Contribution>> INSTALLED_FIRST =
            Comparator.<ServiceReference<Contribution>>comparingLong(r -> number(r, "service.bundleid"))
                    .thenComparingLong(r -> number(r, "service.id"));

    private final Map<ServiceReference<Contribution>, Arrival> arrivals =
            new TreeMap<>(INSTALLED_FIRST);
    private final List<Runnable> listeners = new CopyOnWriteArrayList<>();
    private Catalogue current;

    @Reference(cardinality = ReferenceCardinality.MULTIPLE, policy = ReferencePolicy.DYNAMIC)
    void addContribution(Contribution contribution, ServiceReference<Contribution> reference) {
        Arrival arrival = Arrival.of(contribution, Arrival.origin(reference.getBundle()));
        synchronized (this) {
            arrivals.put(reference, arrival);
            current = null;
        }
        listeners.forEach(Runnable::run);
    }

    void removeContribution(ServiceReference<Contribution> reference) {
        synchronized (this) {
            arrivals.remove(reference);
            current = null;
        }
        listeners.forEach(Runnable::run);
    }

    @Override
    public Listening listen(Runnable listener) {
        // A wrapper, so that each listening ends by itself even when one listener is given twice.
        Runnable own = listener::run;
        listeners.add(own);
        return () -> listeners.remove(own);
    }

    @Override
    public synchronized Catalogue catalogue() {
        if (current == null) {
            current = Catalogue.of(List.copyOf(arrivals.values()));
        }
        return current;
    }

    private static long number(ServiceReference<?> reference, String property) {
        return (Long) reference.getProperty(property);
    }
}
