package stirwright.family.hydrofoil;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Discharge flow numbers of the turbulent regime. */
final class FlowNumbers {

    private static final Citation TABLES =
            Citation.withoutLocator("tables of flow numbers in handbooks; which of them is not recalled");

    private FlowNumbers() {}

    static Correlation narrow() {
        return discharge("hydrofoil.nq.tables-narrow", "handbook tables, three narrow blades")
                .cite(TABLES)
                .oneOf(Measure.BLADE_COUNT, Hydrofoil.NARROW)
                .value("Nq", 0.55)
                .remark("0.55 and 0.56 are both listed.")
                .remark("Conflict: McCabe, Smith and Harriott have 0.5.")
                .build();
    }

    static Correlation mccabe() {
        return discharge("hydrofoil.nq.mccabe", "McCabe, Smith and Harriott")
                .cite(Citation.of("W. L. McCabe, J. C. Smith and P. Harriott, Unit Operations of Chemical Engineering, "
                        + "5th ed., McGraw-Hill (1993)", "chapter 9, list of flow numbers"))
                .notStated(Measure.BLADE_COUNT, "recalled without it")
                .value("Nq", 0.5)
                .remark("Conflict: other tables have 0.55 for narrow and 0.73 for wide blades.")
                .build();
    }

    static Correlation wide() {
        return discharge("hydrofoil.nq.tables-wide", "handbook tables, four wide blades")
                .cite(TABLES)
                .oneOf(Measure.BLADE_COUNT, Hydrofoil.WIDE)
                .value("Nq", 0.73)
                .build();
    }

    private static CorrelationBuilder discharge(String id, String title) {
        return Correlation.of(id, Quantity.FLOW_NUMBER, title)
                .families(Hydrofoil.ID)
                .transcription(Transcription.FROM_MEMORY)
                .flow(FlowKind.DISCHARGE)
                .turbulent()
                .notStated(Classifier.BAFFLING, "recalled without it")
                .notStated(Measure.D_OVER_T, "recalled for about 1/3, without a range")
                .newtonianData();
    }
}
