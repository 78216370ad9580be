package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;
import stirwright.correlation.Verdict;
import stirwright.rheology.PowerLaw;

/** What a window asks of a computed case beyond its result. */
class OpenCaseTest {
    private static final Correlation KS = Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.ten", 10);
    private static final Correlation POWER = Invented.correlation(Quantity.POWER_NUMBER, "np.laminar")
            .range(Measure.REYNOLDS, 1000, 2000).notStated(Measure.D_OVER_T, "no column for it").overReynolds("a", 70).build();
    private static final Correlation DOUBLE = Correlation.modifier(
                    "invented.np.double", Quantity.POWER_NUMBER, Effect.CLEARANCE, "twice")
            .families(Invented.FAMILY).cite(Invented.SOURCE).transcription(Transcription.FROM_MEMORY)
            .atLeast(Measure.REYNOLDS, 1e-6).value("f", 2).build();

    private static OpenCase open(CaseSpec spec) {
        return new CrossCheck(Invented.catalogue(KS, DOUBLE, POWER)).open(spec);
    }

    @Test
    void namesEveryBoundWithWhatTheCaseHas() {
        OpenCase open = open(Invented.at(2, new PowerLaw(80, 0.5)));
        List<BoundFinding> bounds = open.bounds(Quantity.POWER_NUMBER, "invented.np.laminar");
        BoundFinding reynolds = bounds.stream().filter(b -> b.bound().startsWith("Reynolds number 1000 to 2000"))
                .findFirst().orElseThrow();
        assertEquals(Verdict.OUTSIDE, reynolds.verdict());
        assertTrue(open.result().pick().orElseThrow().failedBounds().get(0).startsWith(reynolds.found()), reynolds::toString);
        assertTrue(bounds.stream().anyMatch(b -> b.verdict() == Verdict.NOT_STATED && b.bound().contains("no column for it")));
        assertTrue(bounds.stream().anyMatch(b -> b.verdict() == Verdict.INSIDE
                && b.bound().startsWith("invented.np.double: Reynolds number at least 1e-6")), bounds::toString);
    }

    @Test
    void showsHowBlanksWereFilled() {
        OpenCase open = open(Invented.at(2, new PowerLaw(80, 0.5)));
        VesselGeometry vessel = open.vessel().orElseThrow();
        assertTrue(vessel.defaulted().contains(Dimensions.LIQUID_VOLUME));
        double t = vessel.get(Dimensions.VESSEL_DIAMETER);
        assertEquals(Math.PI / 4 * t * t * vessel.get(Dimensions.LIQUID_HEIGHT), vessel.get(Dimensions.LIQUID_VOLUME), 1e-12);
    }

    @Test
    void aRefusedCaseSaysWhyToWhoeverAsksForCurves() {
        CaseSpec spec = Invented.at(2, new PowerLaw(80, 0.5));
        OpenCase open = open(new CaseSpec(spec.name(), spec.familyId(), Map.of(), spec.speed(), spec.fluid(), spec.choices(),
                List.of()));
        Refusal refusal = open.result().refusal().orElseThrow();
        assertEquals(refusal, assertThrows(CaseRefusedException.class,
                () -> open.slice(Quantity.POWER_NUMBER, "invented.np.laminar", Variable.REYNOLDS)).refusal());
        assertEquals(refusal, assertThrows(CaseRefusedException.class,
                () -> open.bounds(Quantity.POWER_NUMBER, "invented.np.laminar")).refusal());
    }

    @Test
    void anotherSpeedChangesNothingElse() {
        CaseSpec spec = Invented.at(2, new PowerLaw(80, 0.5));
        CaseSpec faster = spec.with(new SpeedDemand.At(4));
        assertEquals(new SpeedDemand.At(4), faster.speed());
        assertEquals(spec, faster.with(spec.speed()));
    }
}
