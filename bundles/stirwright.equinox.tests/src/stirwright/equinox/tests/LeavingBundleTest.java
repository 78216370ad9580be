package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Proxy;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import stirwright.conformance.InstalledBundles;

/** A bundle that goes while somebody reads what all of them bring. */
class LeavingBundleTest {

    /** What holds up the others is there, whenever it goes. */
    @ParameterizedTest
    @ValueSource(doubles = {0, 0.5, 1})
    void takesNothingElseAlong(double share) throws Exception {
        List<String> before = proofs(Framework.context());
        int looks = InstalledBundles.subjects(Framework.context()).size() + 2;
        Bundle bundle = Framework.install("leaving", TinyBundle.named("wanderer.leaving").component(Wanderer.class).jar());
        assertTrue(Framework.becomes(() -> Framework.catalogue().family("wanderer").isPresent()));
        int[] look = {1 + (int) (share * (looks - 1))};
        BundleContext watched = (BundleContext) Proxy.newProxyInstance(getClass().getClassLoader(), new Class<?>[] {BundleContext.class},
                (proxy, method, arguments) -> {
                    try {
                        Object answer = method.invoke(Framework.context(), arguments);
                        if (method.getName().equals("getServiceReferences") && --look[0] == 0) {
                            bundle.uninstall();
                        }
                        return answer;
                    } catch (InvocationTargetException thrown) {
                        throw thrown.getCause();
                    }
                });
        assertEquals(before, proofs(watched));
        assertEquals(Bundle.UNINSTALLED, bundle.getState(), "it was there to the end");
    }

    private static List<String> proofs(BundleContext context) {
        return InstalledBundles.proofs(context).stream().map(proof -> proof.correlation().id()).filter(id -> !id.startsWith("wanderer"))
                .toList();
    }
}
