package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.osgi.framework.Bundle;
import stirwright.core.Catalogue;
import stirwright.core.Library;

/** Families arrive and leave while the workbench runs. */
class DiscoveryTest {
    private static final String FAMILY = "wanderer";
    private static final String CORRELATION = "wanderer.np.invented";

    private final List<Bundle> bundles = new ArrayList<>();

    @AfterEach
    void leave() throws Exception {
        for (Bundle bundle : bundles) {
            if (bundle.getState() != Bundle.UNINSTALLED) {
                bundle.uninstall();
            }
        }
        assertTrue(Framework.becomes(() -> !present()), "the family stays after its bundle has gone");
        assertEquals(List.of(), Framework.catalogue().problems());
    }

    @Test
    void aComponentArrivesAndLeaves() throws Exception {
        assertFalse(present());
        Bundle bundle = install(TinyBundle.named("wanderer.component").component(Wanderer.class));
        assertTrue(Framework.becomes(DiscoveryTest::present), "the family has not arrived");
        Catalogue before = Framework.catalogue();
        assertEquals("wanderer.component 1.0.0", before.entry(CORRELATION).orElseThrow().origin());
        bundle.stop();
        assertTrue(Framework.becomes(() -> !present()), "the family has not left");
        assertTrue(before.family(FAMILY).isPresent(), "a snapshot changed under its reader");
        bundle.start();
        assertTrue(Framework.becomes(DiscoveryTest::present), "the family has not come back");
    }

    @Test
    void whoListensIsToldOfArrivalsAndDepartures() throws Exception {
        AtomicInteger told = new AtomicInteger();
        Library library = Framework.library();
        Bundle bundle;
        try (Library.Listening listening = library.listen(told::incrementAndGet)) {
            bundle = install(TinyBundle.named("wanderer.component").component(Wanderer.class));
            assertTrue(Framework.becomes(() -> told.get() == 1), "nobody told of the arrival");
            assertTrue(present(), "told before the family was there");
            bundle.stop();
            assertTrue(Framework.becomes(() -> told.get() == 2), "nobody told of the departure");
        }
        bundle.start();
        assertTrue(Framework.becomes(DiscoveryTest::present), "the family has not come back");
        assertEquals(2, told.get(), "told after the listening ended");
    }

    @Test
    void anActivatorWillDo() throws Exception {
        install(TinyBundle.named("wanderer.activator").holding(Wanderer.class)
                .header("Bundle-Activator", Wanderer.class.getName()));
        assertTrue(Framework.becomes(DiscoveryTest::present), "the family has not arrived");
    }

    @Test
    void ofTwoWithOneIdTheFirstIsKeptAndBothAreNamed() throws Exception {
        Bundle first = install(TinyBundle.named("wanderer.first").component(Wanderer.class));
        install(TinyBundle.named("wanderer.second").component(Wanderer.class));
        assertTrue(Framework.becomes(() -> Framework.catalogue().problems().size() == 2),
                () -> "problems: " + Framework.catalogue().problems());
        Catalogue both = Framework.catalogue();
        assertEquals("wanderer.first 1.0.0", both.entry(CORRELATION).orElseThrow().origin());
        assertEquals("wanderer.first 1.0.0", both.originOf(both.family(FAMILY).orElseThrow()));
        for (String id : List.of(FAMILY, CORRELATION)) {
            assertTrue(both.problems().stream().anyMatch(p -> p.contains("'" + id + "'")
                    && p.contains("wanderer.first 1.0.0") && p.contains("wanderer.second 1.0.0")),
                    () -> "problems: " + both.problems());
        }
        first.uninstall();
        assertTrue(Framework.becomes(() -> Framework.catalogue().problems().isEmpty()), "the problem outlives its cause");
        assertEquals("wanderer.second 1.0.0", Framework.catalogue().entry(CORRELATION).orElseThrow().origin());
    }

    @Test
    void whoFailsIsLeftOutByName() throws Exception {
        int correlations = Framework.catalogue().entries().size();
        install(TinyBundle.named("wanderer.refuser").component(Refuser.class));
        assertTrue(Framework.becomes(() -> !Framework.catalogue().problems().isEmpty()), "nothing is told");
        assertEquals(1, Framework.catalogue().problems().size());
        String problem = Framework.catalogue().problems().get(0);
        assertTrue(problem.contains("wanderer.refuser 1.0.0") && problem.contains("not today"), problem);
        assertEquals(correlations, Framework.catalogue().entries().size(), "others went with it");
    }

    private Bundle install(TinyBundle tiny) throws Exception {
        Bundle bundle = Framework.install("discovery-" + bundles.size(), tiny.jar());
        bundles.add(bundle);
        return bundle;
    }

    private static boolean present() {
        return Framework.catalogue().family(FAMILY).isPresent()
                && Framework.catalogue().entry(CORRELATION).isPresent();
    }
}
