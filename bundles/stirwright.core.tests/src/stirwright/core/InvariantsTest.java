package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import stirwright.rheology.Fluid;
import stirwright.rheology.FluidModel;
import stirwright.rheology.MeasuredWindow;
import stirwright.rheology.ModelKind;
import stirwright.rheology.Newtonian;

/** What must hold in every row whatever the case: definitions, not results. Random cases, fixed seed. */
class InvariantsTest {
    private static final int CASES = 150;
    private static final double TIGHT = 1e-12;
    private static final Catalogue CATALOGUE = Installed.catalogue();

    private final Random random = new Random(20250101);

    @ParameterizedTest
    @EnumSource(ModelKind.class)
    void definitionsHoldInEveryRow(ModelKind kind) {
        int rows = 0;
        for (CaseSpec spec : specs(kind)) {
            CaseResult result = new CrossCheck(CATALOGUE).check(spec);
            double density = spec.fluid().density();
            double d = spec.geometry().get("impeller_diameter");
            for (CandidateResult row : result.candidates()) {
                if (row.state().isEmpty() || Double.isNaN(row.power())) {
                    continue;
                }
                FluidState s = row.state().get();
                double n = s.speed();
                same(2 * Math.PI * n * row.torque(), row.power(), "P = 2 pi N M");
                same(row.powerNumber() * density * n * n * n * d * d * d * d * d, row.power(), "P = Np rho N^3 D^5");
                same(s.shearRateConstant() * n, s.shearRate(), "shear rate = ks N");
                same(spec.fluid().model().stress(s.shearRate()) / s.shearRate(), s.viscosity(), "viscosity = stress/rate");
                same(density * n * d * d / s.viscosity(), s.reynolds(), "Re = rho N D^2/mu");
                same(row.powerPerVolume() * volume(spec), row.power(), "P/V");
                same(row.flowNumber() * n * d * d * d, row.pumping(), "Q = Nq N D^3");
                rows++;
            }
        }
        assertTrue(rows > 5 * CASES, rows + " rows were looked at");
    }

    @ParameterizedTest
    @EnumSource(ModelKind.class)
    void newtonianFluidOfTheApparentViscosityHasTheSamePowerNumber(ModelKind kind) {
        int compared = 0;
        for (CaseSpec spec : specs(kind)) {
            for (CandidateResult row : new CrossCheck(CATALOGUE).check(spec).candidates()) {
                // Far outside its bounds a correlation may give no number at all.
                if (row.state().isEmpty() || Double.isNaN(row.powerNumber())) {
                    continue;
                }
                FluidState s = row.state().get();
                Fluid plain = new Fluid(new Newtonian(s.viscosity()), spec.fluid().density(), MeasuredWindow.UNKNOWN);
                CaseResult newtonian = new CrossCheck(CATALOGUE).check(new CaseSpec("newtonian", spec.familyId(),
                        spec.geometry(), new SpeedDemand.At(s.speed()), plain, Choices.NONE, List.of()));
                CandidateResult same = newtonian.candidates().stream()
                        .filter(c -> c.correlation().equals(row.correlation())).findFirst().orElseThrow();
                same(row.powerNumber(), same.powerNumber(), row.correlation());
                compared++;
            }
        }
        assertTrue(compared > 5 * CASES, compared + " rows were compared");
    }

    @ParameterizedTest
    @EnumSource(ModelKind.class)
    void targetsAreMetByEveryRow(ModelKind kind) {
        int met = 0;
        for (CaseSpec spec : specs(kind)) {
            double[] targets = {3 + 40 * random.nextDouble(), 20 + 500 * random.nextDouble(), 0.5 + 3 * random.nextDouble()};
            for (CandidateResult row : check(spec, new SpeedDemand.ForShearRate(targets[0]))) {
                assertEquals(targets[0], row.state().orElseThrow().shearRate(), 1e-9 * targets[0], row.correlation());
                met++;
            }
            for (CandidateResult row : check(spec, new SpeedDemand.ForPowerPerVolume(targets[1]))) {
                assertEquals(targets[1], row.powerPerVolume(), 1e-9 * targets[1], row.correlation());
                met++;
            }
            for (CandidateResult row : check(spec, new SpeedDemand.ForTipSpeed(targets[2]))) {
                assertEquals(targets[2], row.state().orElseThrow().tipSpeed(), TIGHT * targets[2], row.correlation());
                met++;
            }
        }
        assertTrue(met > 10 * CASES, met + " rows met their target");
    }

    private List<CandidateResult> check(CaseSpec spec, SpeedDemand demand) {
        CaseResult result = new CrossCheck(CATALOGUE).check(new CaseSpec(spec.name(), spec.familyId(), spec.geometry(),
                demand, spec.fluid(), spec.choices(), List.of()));
        assertNotEquals(Status.REFUSED, result.status(), () -> result.refusal().orElseThrow().words() + " " + spec);
        return result.candidates().stream().filter(c -> c.state().isPresent() && !Double.isNaN(c.power())).toList();
    }

    private static void same(double expected, double found, String what) {
        assertEquals(expected, found, TIGHT * Math.abs(expected), what);
    }

    private static double volume(CaseSpec spec) {
        double t = spec.geometry().get("vessel_diameter");
        return Math.PI / 4 * t * t * spec.geometry().get("liquid_height");
    }

    private List<CaseSpec> specs(ModelKind kind) {
        List<CaseSpec> specs = new ArrayList<>();
        for (int i = 0; i < CASES; i++) {
            specs.add(spec(kind, i));
        }
        return specs;
    }

    private CaseSpec spec(ModelKind kind, int i) {
        double t = logUniform(0.1, 4);
        Map<String, Double> geometry = new HashMap<>();
        geometry.put("vessel_diameter", t);
        geometry.put("impeller_diameter", t * (0.2 + 0.5 * random.nextDouble()));
        geometry.put("liquid_height", t * (1.2 + 0.5 * random.nextDouble()));
        geometry.put("blade_count", (double) (3 + random.nextInt(4)));
        geometry.put("baffle_count", random.nextInt(3) == 0 ? 0.0 : 4.0);
        geometry.put("impeller_count", 1.0 + random.nextInt(2));
        String family = i % 2 == 0 ? "discturbine" : "pitchedblade";
        if (family.equals("pitchedblade")) {
            geometry.put("blade_angle", Math.toRadians(30 + 60 * random.nextDouble()));
        }
        Fluid fluid = new Fluid(model(kind), 700 + 1500 * random.nextDouble(), MeasuredWindow.UNKNOWN);
        return new CaseSpec("case " + i, family, geometry, new SpeedDemand.At(logUniform(0.1, 10)), fluid,
                Choices.NONE, List.of());
    }

    private FluidModel model(ModelKind kind) {
        double n = 0.2 + 0.75 * random.nextDouble();
        return switch (kind) {
            case NEWTONIAN -> kind.create(logUniform(1e-3, 100));
            case POWER_LAW -> kind.create(logUniform(0.05, 100), n);
            case BINGHAM, CASSON -> kind.create(logUniform(0.1, 100), logUniform(1e-3, 10));
            case HERSCHEL_BULKLEY -> kind.create(logUniform(0.1, 100), logUniform(0.05, 50), n);
            case SISKO -> kind.create(logUniform(1e-3, 0.1), logUniform(1, 100), n);
            case CROSS, CARREAU -> kind.create(logUniform(1, 100), logUniform(1e-3, 0.1), logUniform(0.01, 100), n);
        };
    }

    private double logUniform(double least, double most) {
        return least * Math.pow(most / least, random.nextDouble());
    }
}
