package stirwright.core.internal;

import java.util.Optional;
import stirwright.core.CandidateResult;
import stirwright.correlation.Figures;
import stirwright.correlation.Measure;

/** What to use instead where a shear-rate constant is beyond the Reynolds numbers for which its source gives it. */
final class ShearRateUse {
    private final ResultAssembly.Row row;
    private final CandidateResult pick;

    ShearRateUse(ResultAssembly.Row pickRow, CandidateResult pick) {
        this.row = pickRow;
        this.pick = pick;
    }

    Optional<String> note() {
        return row.constants().pick()
                .filter(c -> c.trial().assessment().fails(Measure.REYNOLDS) && !Double.isNaN(pick.powerBasedShearRate()))
                .map(c -> "shear-rate constant " + c.id() + " is beyond its range of the Reynolds number; the power-based"
                        + " average shear rate is " + Figures.show(pick.powerBasedShearRate()) + " 1/s, the uniform one at"
                        + " which the whole liquid volume would take up the power. At the impeller the shear rate is"
                        + " higher, away from it lower");
    }
}
