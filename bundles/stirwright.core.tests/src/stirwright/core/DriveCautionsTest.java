package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import stirwright.correlation.Correlation;
import stirwright.correlation.Effect;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.rheology.Newtonian;

/** Whoever sizes a drive by the pick is told where sources that qualify as well ask for more. */
class DriveCautionsTest {
    private static final Correlation KS = Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.ten", 10);
    /** Recommended before the others, since it leaves no bound unstated. */
    private static final Correlation PICK = Invented.constant(Quantity.POWER_NUMBER, "np.pick", 5);

    private static List<String> cautions(Correlation... others) {
        Correlation[] all = new Correlation[others.length + 2];
        all[0] = KS;
        all[1] = PICK;
        System.arraycopy(others, 0, all, 2, others.length);
        CaseResult result = new CrossCheck(Invented.catalogue(all)).check(Invented.at(2, new Newtonian(0.001)));
        assertEquals("invented.np.pick", result.pick().orElseThrow().correlation());
        return result.notes().stream().filter(n -> n.startsWith("caution: ")).toList();
    }

    /** One bound less is stated than by the pick. */
    private static Correlation other(String id, double value) {
        return Invented.constant(Quantity.POWER_NUMBER, id, value, b -> b.notStated(Measure.THICKNESS_OVER_D, "not at hand"));
    }

    @Test
    void aSourceThatAsksForMoreThanATenthMoreIsNamed() {
        List<String> cautions = cautions(other("np.six", 6), other("np.low", 4));
        assertEquals(1, cautions.size(), cautions::toString);
        assertTrue(cautions.get(0).contains("invented.np.six qualifies too and has 20 % more power"), cautions.get(0));
    }

    @Test
    void sourcesThatAgreeWithinATenthAndLowerOnesAreNot() {
        assertEquals(List.of(), cautions(other("np.near", 5.4), other("np.low", 3)));
    }

    @Test
    void oneThatDoesNotQualifyIsNot() {
        assertEquals(List.of(), cautions(Invented.constant(Quantity.POWER_NUMBER, "np.unsure", 9,
                b -> b.transcription(Transcription.UNSURE))));
    }

    @Test
    void aFactorThatLowersThePowerIsNamed() {
        Correlation factor = Correlation.modifier("invented.np.lower", Quantity.POWER_NUMBER, Effect.CLEARANCE, "lower")
                .families(Invented.FAMILY).cite(Invented.SOURCE).transcription(Transcription.FROM_MEMORY)
                .notStated(Measure.REYNOLDS, "not at hand").appliesWhen("always", g -> true).value("a", 0.7).build();
        List<String> cautions = cautions(factor);
        assertEquals(1, cautions.size(), cautions::toString);
        assertTrue(cautions.get(0).contains("the factor for clearance above the bottom, 0.7, lowers the power"), cautions.get(0));
    }
}
