package stirwright.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Link;
import org.eclipse.swt.widgets.Text;
import org.junit.jupiter.api.Test;
import org.osgi.framework.FrameworkUtil;
import org.osgi.framework.ServiceRegistration;
import stirwright.correlation.Citation;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;
import stirwright.workbench.internal.session.Session;

/** Work that takes long: the window stays alive, says so, and can be told to stop. */
class SlowTest {
    private static final String FAMILY = "sluggish";

    /** What one evaluation sleeps. */
    private static volatile int nap;

    /** An invented family whose power number takes its time. */
    private static final class Sluggish implements Contribution {
        @Override
        public List<Family> families() {
            return List.of(Family.of(FAMILY, "sluggish paddle").description("invented for a test")
                    .regimes(RegimeLimits.IN_GENERAL).build());
        }

        @Override
        public List<Correlation> correlations() {
            return List.of(
                    Correlation.of(FAMILY + ".np", Quantity.POWER_NUMBER, "sluggish").families(FAMILY)
                            .cite(Citation.of("invented for a test", "p. 1")).transcription(Transcription.CHECKED_AGAINST_SOURCE)
                            .range(Measure.REYNOLDS, 1, 1e6).constant("c", 3).formula("Np = {c}")
                            .relation((geometry, constants) -> point -> slowly(constants.get("c"))).build(),
                    Correlation.of(FAMILY + ".ks", Quantity.SHEAR_RATE_CONSTANT, "sluggish").families(FAMILY)
                            .cite(Citation.of("invented for a test", "p. 1")).transcription(Transcription.CHECKED_AGAINST_SOURCE)
                            .range(Measure.REYNOLDS, 1, 1e6).value("k", 11).build());
        }

        private static double slowly(double value) {
            try {
                Thread.sleep(nap);
            } catch (InterruptedException woken) {
                Thread.currentThread().interrupt();
            }
            return value;
        }
    }

    @Test
    void longWorkIsToldAndCanBeStopped() throws Exception {
        nap = 0;
        ServiceRegistration<Contribution> service = FrameworkUtil.getBundle(Session.class).getBundleContext()
                .registerService(Contribution.class, new Sluggish(), null);
        try {
            OpenWindow.use(List.of("demo", "--window"), window -> {
                window.choose("Family", "sluggish paddle");
                double before = window.outcome().rows().get(0).power();
                nap = 20;
                long start = System.nanoTime();
                window.run(() -> window.find(Text.class, "Speed, rev/min").setText("250"));
                window.run(() -> {
                    // The window answers although the numbers are not there yet.
                });
                assertTrue(System.nanoTime() - start < 400_000_000L, "the window stands still");
                OpenWindow.await("the word that it takes long", () -> line(window).contains("Calculating"));
                window.run(() -> window.all(Link.class, l -> l.getText().contains("Calculating")).get(0)
                        .notifyListeners(SWT.Selection, new Event()));
                window.settle();
                assertEquals(before, window.outcome().rows().get(0).power(), 0.0, "the numbers before stay");
                assertTrue(window.on(() -> window.all(Link.class, l -> l.getText().contains("numbers are those before")).size() == 1),
                        "old numbers pass as new ones");
                assertFalse(window.on(() -> window.all(Button.class, b -> b.getText().equals("Pick this")).get(0).isEnabled()));
                nap = 0;
                window.type("Speed, rev/min", "251");
                assertTrue(window.outcome().rows().get(0).power() > before);
            });
        } finally {
            nap = 0;
            service.unregister();
        }
    }

    private static String line(OpenWindow window) {
        String[] text = {""};
        window.display().syncExec(() -> window.all(Link.class, l -> l.getText().contains("Calculating"))
                .forEach(l -> text[0] = l.getText()));
        return text[0];
    }
}
