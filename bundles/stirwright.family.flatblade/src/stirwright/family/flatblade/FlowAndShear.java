package stirwright.family.flatblade;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;

/** Discharge flow number of the turbulent regime, and the average shear rate over speed. */
final class FlowAndShear {

    private FlowAndShear() {}

    static Correlation flow() {
        return Correlation.of("flatblade.nq.six-blades", Quantity.FLOW_NUMBER, "tables, six open blades, turbulent")
                .families(FlatBlade.ID)
                .cite(Citation.withoutLocator("tables of pumping numbers in handbooks; which of them prints it is not at hand"))
                .transcription(Transcription.FROM_MEMORY)
                .scatter(0.067)
                .flow(FlowKind.DISCHARGE)
                .turbulent()
                .notStated(Classifier.BAFFLING, "recalled without it")
                .oneOf(Measure.BLADE_COUNT, 6)
                .notStated(Measure.W_OVER_D, "recalled without it")
                .notStated(Measure.D_OVER_T, "recalled for about 1/3, without a range")
                .newtonianData()
                .value("Nq", 0.75)
                .remark("The middle of 0.7 to 0.8, whose ends are the scatter.")
                .build();
    }

    static Correlation twoBlades() {
        return Correlation.of("flatblade.ks.two-blades", Quantity.SHEAR_RATE_CONSTANT, "two-blade paddle, compilations")
                .families(FlatBlade.ID)
                .cite(Citation.of("compilations of shear-rate constants, among them A. H. P. Skelland, Non-Newtonian Flow and "
                        + "Heat Transfer, Wiley (1967), and R. P. Chhabra and J. F. Richardson, Non-Newtonian Flow and Applied "
                        + "Rheology, 2nd ed., Butterworth-Heinemann (2008)",
                        "Tables 9.1 and 8.1; from memory, which of them prints it is not checked"))
                .transcription(Transcription.FROM_MEMORY)
                .atMost(Measure.REYNOLDS, RegimeLimits.IN_GENERAL.turbulentFrom())
                .notStated(Classifier.BAFFLING, "recalled without it")
                .oneOf(Measure.BLADE_COUNT, 2)
                .notStated(Measure.W_OVER_D, "recalled without it")
                .range(Measure.D_OVER_T, 0.333, 0.5, "T/D 2 to 3")
                .notStated(Classifier.FLUID, "recalled for non-Newtonian fluids, not of which kind")
                .value("ks", 10)
                .remark("The constant is defined by Metzner and Otto's procedure, whose abstract says laminar and transition "
                        + "regions; the end of the transition is the family's limit, not theirs.")
                .remark("The flow between two cylinders of the same torque has 10.8 at n 0.5 for W/D 1/5 and D/T 1/2.")
                .build();
    }
}
