package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import stirwright.correlation.Correlation;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.rheology.Bingham;
import stirwright.rheology.Carreau;
import stirwright.rheology.Casson;
import stirwright.rheology.Cross;
import stirwright.rheology.FluidModel;
import stirwright.rheology.HerschelBulkley;
import stirwright.rheology.Newtonian;
import stirwright.rheology.PowerLaw;

/** The power-based average takes up the power per volume, whatever the fluid. */
class PowerBasedShearTest {
    private static final Correlation NP = Invented.constant(Quantity.POWER_NUMBER, "np.five", 5);
    private static final Correlation KS = Invented.correlation(Quantity.SHEAR_RATE_CONSTANT, "ks.laminar")
            .atMost(Measure.REYNOLDS, 100).value("ks", 10).build();
    private static final CrossCheck CHECK = new CrossCheck(Invented.catalogue(KS, NP));
    private static final double TIGHT = 1e-11;

    private final Random random = new Random(19570103);

    private double anyOf(double least, double most) {
        return least * Math.exp(random.nextDouble() * Math.log(most / least));
    }

    private static CandidateResult pick(double speed, FluidModel model) {
        return CHECK.check(Invented.at(speed, model)).pick().orElseThrow();
    }

    @Test
    void newtonian() {
        for (int i = 0; i < 200; i++) {
            double mu = anyOf(1e-4, 1e3);
            CandidateResult pick = pick(anyOf(0.01, 20), new Newtonian(mu));
            same(Math.sqrt(pick.powerPerVolume() / mu), pick.powerBasedShearRate());
        }
    }

    @Test
    void powerLaw() {
        for (int i = 0; i < 200; i++) {
            double k = anyOf(1e-3, 1e3);
            double n = anyOf(0.05, 1.9);
            CandidateResult pick = pick(anyOf(0.01, 20), new PowerLaw(k, n));
            same(Math.pow(pick.powerPerVolume() / k, 1 / (n + 1)), pick.powerBasedShearRate());
        }
    }

    @Test
    void stressTimesRateIsThePowerPerVolumeOfEveryModel() {
        for (int i = 0; i < 100; i++) {
            List<FluidModel> models = new ArrayList<>();
            models.add(new Bingham(anyOf(1e-3, 1e3), anyOf(1e-3, 10)));
            models.add(new HerschelBulkley(anyOf(1e-3, 1e3), anyOf(1e-2, 1e2), anyOf(0.1, 1.5)));
            models.add(new Casson(anyOf(1e-3, 1e3), anyOf(1e-3, 10)));
            double thin = anyOf(1e-4, 1e-1);
            models.add(new Cross(anyOf(1, 1e3), thin, anyOf(1e-3, 1e3), anyOf(0.1, 0.9)));
            models.add(new Carreau(anyOf(1, 1e3), thin, anyOf(1e-3, 1e3), anyOf(0.1, 0.9)));
            for (FluidModel model : models) {
                CandidateResult pick = pick(anyOf(0.01, 20), model);
                double rate = pick.powerBasedShearRate();
                same(pick.powerPerVolume(), model.stress(rate) * rate);
            }
        }
    }

    private static void same(double expected, double actual) {
        assertEquals(expected, actual, TIGHT * expected);
    }

    @Test
    void beyondTheConstantsReynoldsNumbersTheNoteNamesIt() {
        CaseResult beyond = CHECK.check(Invented.at(2, new Newtonian(0.001)));
        assertTrue(beyond.notes().stream().anyMatch(n -> n.contains("invented.ks.laminar is beyond its range")
                && n.contains("power-based") && n.contains("whole liquid volume") && n.contains("At the impeller")),
                beyond.notes().toString());
        // 1000 * 2 * 0.5^2/10 = 50
        CaseResult within = CHECK.check(Invented.at(2, new Newtonian(10)));
        assertFalse(within.notes().stream().anyMatch(n -> n.contains("power-based")), within.notes().toString());
    }
}
