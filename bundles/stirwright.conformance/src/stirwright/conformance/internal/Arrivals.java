package stirwright.conformance.internal;

import java.time.Duration;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.Constants;
import org.osgi.framework.InvalidSyntaxException;
import org.osgi.framework.ServiceEvent;
import org.osgi.framework.ServiceListener;
import stirwright.correlation.Contribution;

/** Waits for the service of a bundle. */
public final class Arrivals {

    private Arrivals() {}

    /** Whether the bundle has published a contribution by the time that patience ends. */
    public static boolean await(BundleContext context, Bundle bundle, Duration patience) {
        CountDownLatch arrived = new CountDownLatch(1);
        String filter = "(&(" + Constants.OBJECTCLASS + "=" + Contribution.class.getName() + ")("
                + Constants.SERVICE_BUNDLEID + "=" + bundle.getBundleId() + "))";
        ServiceListener listener = event -> {
            if (event.getType() == ServiceEvent.REGISTERED) {
                arrived.countDown();
            }
        };
        try {
            context.addServiceListener(listener, filter);
            return published(context, filter) || arrived.await(patience.toMillis(), TimeUnit.MILLISECONDS);
        } catch (InvalidSyntaxException impossible) {
            throw new IllegalStateException("filter " + filter, impossible);
        } catch (InterruptedException interrupted) {
            Thread.currentThread().interrupt();
            return false;
        } finally {
            context.removeServiceListener(listener);
        }
    }

    private static boolean published(BundleContext context, String filter) throws InvalidSyntaxException {
        return !context.getServiceReferences(Contribution.class, filter).isEmpty();
    }
}
