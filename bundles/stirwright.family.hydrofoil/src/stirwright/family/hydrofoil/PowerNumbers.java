package stirwright.family.hydrofoil;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Power numbers of the laminar and of the turbulent regime. */
final class PowerNumbers {

    /** Baffles of T/12 and T/10, with the slack of rounded drawings. */
    private static final double NARROW_BAFFLE = 0.0813;
    private static final double WIDE_BAFFLE = 0.1025;

    private PowerNumbers() {}

    static Correlation laminarNarrow() {
        return Correlation.of("hydrofoil.np.tables-laminar-narrow", Quantity.POWER_NUMBER,
                        "handbook tables, three narrow blades, laminar")
                .families(Hydrofoil.ID)
                .cite(Citation.withoutLocator("tables of laminar power constants in handbooks; which of them is not recalled"))
                .transcription(Transcription.UNSURE)
                .atMost(Measure.REYNOLDS, 10)
                .notStated(Classifier.BAFFLING, "recalled without it; in laminar flow baffles do not act")
                .oneOf(Measure.BLADE_COUNT, Hydrofoil.NARROW)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData()
                .overReynolds("KL", 55)
                .remark("Conflict: by the analogy with the gap between cylinders a shear-rate constant of 10 goes with 35 "
                        + "to 45, and a propeller of square pitch has 41.")
                .build();
    }

    static Correlation narrow() {
        return turbulent("hydrofoil.np.tables-narrow", "handbook tables, three narrow blades, turbulent")
                .oneOf(Measure.BLADE_COUNT, Hydrofoil.NARROW)
                .scatter(0.05)
                .value("Np", 0.315)
                .remark("The tables have 0.30 to 0.33; the middle and the scatter are ours.")
                .remark("Grenville's blend time equals the one of Fasano, Bakker and Penney (1994) for this impeller at a "
                        + "power number of 0.312.")
                .build();
    }

    static Correlation wide() {
        return turbulent("hydrofoil.np.tables-wide", "handbook tables, four wide blades, turbulent")
                .oneOf(Measure.BLADE_COUNT, Hydrofoil.WIDE)
                .scatter(0.2)
                .value("Np", 0.75)
                .remark("The tables have 0.6 to 0.9 by solidity, pumping downwards; the middle and the scatter are ours.")
                .remark("A problem in Doran, Bioprocess Engineering Principles, has 70 W for six wide blades, 0.42 m at "
                        + "1.5 rev/s in water, which is a power number of 1.59: more blades than here.")
                .build();
    }

    private static CorrelationBuilder turbulent(String id, String title) {
        return Correlation.of(id, Quantity.POWER_NUMBER, title)
                .families(Hydrofoil.ID)
                .cite(Citation.withoutLocator("tables of turbulent power numbers in handbooks, headed: four baffles of T/12 to "
                        + "T/10, D and C about T/3; which of them is not recalled"))
                .transcription(Transcription.FROM_MEMORY)
                .atLeast(Measure.REYNOLDS, 1e4)
                .baffled()
                .oneOf(Measure.BAFFLE_COUNT, 4)
                .range(Measure.B_OVER_T, NARROW_BAFFLE, WIDE_BAFFLE, "T/12 to T/10")
                .notStated(Measure.D_OVER_T, "about 1/3 by the tables' heading, without a range")
                .newtonianData();
    }
}
