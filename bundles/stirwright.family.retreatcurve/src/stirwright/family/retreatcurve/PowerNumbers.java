package stirwright.family.retreatcurve;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Power numbers of the laminar regime and, by baffles, of the turbulent one. */
final class PowerNumbers {

    private static final Citation TABLES =
            Citation.withoutLocator("tables of power numbers in handbooks; which of them is not recalled");

    private PowerNumbers() {}

    static Correlation laminar() {
        return Correlation.of("retreatcurve.np.handbook-laminar", Quantity.POWER_NUMBER, "handbook, laminar")
                .families(RetreatCurve.ID)
                .cite(Citation.withoutLocator("E. L. Paul, V. A. Atiemo-Obeng and S. M. Kresta (eds.), Handbook of Industrial "
                        + "Mixing, Wiley (2004)"))
                .transcription(Transcription.UNSURE)
                .atMost(Measure.REYNOLDS, 10)
                .notStated(Classifier.BAFFLING, "recalled without it; in laminar flow baffles do not act")
                .oneOf(Measure.BLADE_COUNT, 3)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData()
                .overReynolds("KL", 60)
                .remark("Recalled as about 50 to 80.")
                .build();
    }

    static Correlation unbaffled() {
        return turbulent("retreatcurve.np.tables-unbaffled", "handbook tables, no baffles, turbulent")
                .transcription(Transcription.UNSURE)
                .unbaffled()
                .scatter(0.33)
                .value("Np", 0.3)
                .remark("Recalled as 0.2 to 0.4, falling as the Reynolds number rises; the middle and the scatter are ours.")
                .build();
    }

    static Correlation oneBaffle() {
        return turbulent("retreatcurve.np.tables-one-baffle", "handbook tables, one beaver-tail baffle, turbulent")
                .transcription(Transcription.UNSURE)
                .baffled()
                .oneOf(Measure.BAFFLE_COUNT, 1)
                .notStated(Measure.B_OVER_T, "a beaver-tail baffle, recalled without its size")
                .scatter(0.067)
                .value("Np", 0.375)
                .remark("The tables have 0.35 to 0.40; the middle and the scatter are ours. Which of the numbers for none, one and four "
                        + "baffles are recalled surely is not known, so all count as unsure.")
                .build();
    }

    static Correlation fourBaffles() {
        return turbulent("retreatcurve.np.tables-four-baffles", "handbook tables, four baffles, turbulent")
                .transcription(Transcription.UNSURE)
                .baffled()
                .oneOf(Measure.BAFFLE_COUNT, 4)
                .notStated(Measure.B_OVER_T, "recalled without it")
                .scatter(0.034)
                .value("Np", 0.725)
                .remark("Recalled as 0.7 to 0.75; the middle and the scatter are ours.")
                .build();
    }

    private static CorrelationBuilder turbulent(String id, String title) {
        return Correlation.of(id, Quantity.POWER_NUMBER, title)
                .families(RetreatCurve.ID)
                .cite(TABLES)
                .turbulent()
                .oneOf(Measure.BLADE_COUNT, 3)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData();
    }
}
