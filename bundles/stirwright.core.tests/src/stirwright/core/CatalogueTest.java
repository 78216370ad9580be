package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Quantity;

class CatalogueTest {

    @Test
    void keepsTheFirstOfTwoWithOneIdAndNamesBothBundles() {
        Correlation first = Invented.constant(Quantity.POWER_NUMBER, "np.same", 1);
        Correlation second = Invented.constant(Quantity.POWER_NUMBER, "np.same", 2);
        Catalogue catalogue = Catalogue.of(List.of(
                Arrival.of(Invented.contribution(first), "bundle.one 1.0.0"),
                Arrival.of(Invented.contribution(second), "bundle.two 2.0.0")));
        assertSame(first, catalogue.entry("invented.np.same").orElseThrow().correlation());
        assertEquals(2, catalogue.problems().size(), "the family and the correlation stand twice");
        for (String problem : catalogue.problems()) {
            assertTrue(problem.contains("bundle.one 1.0.0") && problem.contains("bundle.two 2.0.0"), problem);
        }
    }

    @Test
    void leavesOutAContributionThatFailsAndSaysSo() {
        Contribution failing = () -> {
            throw new IllegalStateException("broken on purpose");
        };
        Catalogue catalogue = Catalogue.of(List.of(
                Arrival.of(failing, "bundle.broken 1.0.0"),
                Arrival.of(Invented.contribution(Invented.constant(Quantity.POWER_NUMBER, "np.good", 1)), "bundle.good 1.0.0")));
        assertTrue(catalogue.family(Invented.FAMILY).isPresent());
        assertEquals(1, catalogue.problems().size());
        assertTrue(catalogue.problems().get(0).contains("bundle.broken 1.0.0"));
        assertTrue(catalogue.problems().get(0).contains("broken on purpose"));
    }

    @Test
    void linkageErrorsOfAForeignBundleDoNotSpread() {
        Contribution stale = () -> {
            throw new NoSuchMethodError("removed");
        };
        assertEquals(1, Catalogue.of(List.of(Arrival.of(stale, "stale 1.0.0"))).problems().size());
    }
}
