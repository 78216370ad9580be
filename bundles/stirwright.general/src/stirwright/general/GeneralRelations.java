package stirwright.general;

import java.util.List;
import org.osgi.service.component.annotations.Component;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;

/** Correlations and modifiers that belong to no single family. It describes no family itself. */
@Component
public final class GeneralRelations implements Contribution {

    @Override
    public List<Correlation> correlations() {
        return List.of(
                PaddlePower.unbaffledPitchedBlade(),
                PaddlePower.unbaffledFlatBlade(),
                PaddlePower.unbaffledDiscTurbine(),
                PaddlePower.baffledPitchedBlade(),
                PaddlePower.baffledFlatBlade(),
                PaddlePower.baffledDiscTurbine(),
                FullyBaffled.hiraoka(),
                FullyBaffled.kameiFlatBlade(),
                NagataPaddle.unbaffledFlatBlade(),
                NagataPaddle.unbaffledPitchedBlade(),
                NagataPaddle.baffledFlatBlade(),
                NagataPaddle.baffledPitchedBlade(),
                AnchorPower.paddleForm(),
                CalderbankMooYoung.turbine(),
                FlowNumberRule.sevenTimes(),
                AverageShear.kellyGigas(),
                AverageShear.bowen(),
                BladeShear.wichterle(),
                BladeShear.robertsonUlbrecht(),
                BladeShear.bowen(),
                CalderbankMooYoung.anchor(),
                CouetteAnalogy.constant(),
                SeveralImpellers.power(),
                SeveralImpellers.powerOfDiscTurbines(),
                SeveralImpellers.flow(),
                CloseImpellers.discTurbines(),
                CloseImpellers.pitchedBlades(),
                Clearance.discTurbine(),
                Clearance.pitchedBlade(),
                LiquidDepth.pitchedBlade(),
                PartialBaffling.pitchedBlade(),
                BlendTime.turbulent(),
                BlendTime.transitional());
    }
}
