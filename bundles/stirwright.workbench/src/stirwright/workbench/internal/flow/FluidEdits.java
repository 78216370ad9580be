package stirwright.workbench.internal.flow;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import stirwright.exchange.CaseField;
import stirwright.exchange.CaseFields;
import stirwright.rheology.FluidModel;
import stirwright.rheology.MeasuredWindow;
import stirwright.rheology.ModelKind;
import stirwright.rheology.ParameterException;
import stirwright.rheology.YieldRange;
import stirwright.study.Amounts;
import stirwright.study.Curve;
import stirwright.study.Curves;
import stirwright.study.Fluid;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.session.ModelTitles;
import stirwright.workbench.internal.session.Session;

/** The edits that the flow-curve page makes, each one step for undo. */
public final class FluidEdits {
    private static final String YIELD_LOW = CaseFields.YIELD_STRESS_LOW.column();
    private static final String YIELD_HIGH = CaseFields.YIELD_STRESS_HIGH.column();

    private static final MathContext SIX = new MathContext(6);

    private final Session session;

    public FluidEdits(Session session) {
        this.session = session;
    }

    /** Adds curves, each under a label of its own. */
    public void take(Fluid fluid, List<Curve> curves) {
        String label = curves.size() == 1 ? FlowWords.Edit_takeOne : Messages.bind(FlowWords.Edit_take, curves.size());
        session.editor().edit(label, () -> {
            for (Curve curve : curves) {
                curve.setLabel(Curves.freeLabel(fluid, curve.getLabel()));
                fluid.getCurves().add(curve);
            }
        });
    }

    /** Fits models to a curve, or sets it aside. */
    public void use(Curve curve, boolean used) {
        if (curve.isUsed() != used) {
            session.editor().edit(Messages.bind(used ? FlowWords.Edit_use : FlowWords.Edit_setAside, curve.getLabel()), () -> curve.setUsed(used));
        }
    }

    public void remove(Curve curve) {
        if (curve.eContainer() instanceof Fluid fluid) {
            session.editor().edit(Messages.bind(FlowWords.Edit_remove, curve.getLabel()), () -> fluid.getCurves().remove(curve));
        }
    }

    /**
     * Makes a fitted model that of the fluid: its parameters in place of those of the model before, the shear rates between
     * which it was measured, and the range of the yield stress, or none where there is none. All of them in six digits. What
     * was measured after rest stays, since it is of the product and not of a model.
     */
    public void pick(Fluid fluid, FluidModel fitted, MeasuredWindow window, Optional<YieldRange> yield, String reason) {
        FluidModel model = kept(fitted);
        ModelKind kind = ModelKind.of(model);
        session.editor().edit(Messages.bind(FlowWords.Edit_pick, ModelTitles.of(kind)), () -> {
            Arrays.stream(ModelKind.values()).flatMap(k -> CaseFields.model(k).stream()).map(CaseField::column)
                    .forEach(column -> Amounts.remove(fluid.getAmounts(), column));
            fluid.setModel(kind.id());
            double[] values = ModelKind.values(model);
            for (int i = 0; i < values.length; i++) {
                Amounts.set(fluid.getAmounts(), kind.parameters().get(i).column(), values[i]);
            }
            Amounts.set(fluid.getAmounts(), CaseFields.SHEAR_RATE_MIN.column(), kept(window.min()));
            Amounts.set(fluid.getAmounts(), CaseFields.SHEAR_RATE_MAX.column(), kept(window.max()));
            Amounts.remove(fluid.getAmounts(), YIELD_LOW);
            Amounts.remove(fluid.getAmounts(), YIELD_HIGH);
            // A range beside a model without a yield stress, or one that leaves its own out, would be refused.
            yield.filter(y -> kind.yields()).ifPresent(y -> {
                Amounts.set(fluid.getAmounts(), YIELD_LOW, Math.min(kept(y.low()), model.yieldStress()));
                Amounts.set(fluid.getAmounts(), YIELD_HIGH, Math.max(kept(y.high()), model.yieldStress()));
            });
            fluid.setModelReason(reason);
        });
    }

    /** A fitted model as a fluid keeps it: six digits are far beyond every interval, and a field shows them all. */
    static FluidModel kept(FluidModel fitted) {
        return ModelKind.of(fitted).create(Arrays.stream(ModelKind.values(fitted)).map(FluidEdits::kept).toArray());
    }

    private static double kept(double value) {
        return new BigDecimal(value).round(SIX).doubleValue();
    }

    /** Pa; empty where it is not given or out of its limits, which the case says beside its field. */
    static OptionalDouble staticYield(Fluid fluid) {
        OptionalDouble value = Amounts.get(fluid.getAmounts(), CaseFields.STATIC_YIELD_STRESS.column());
        boolean known = value.isPresent() && value.getAsDouble() >= 0 && value.getAsDouble() < Double.POSITIVE_INFINITY;
        return known ? value : OptionalDouble.empty();
    }

    /** The model that a fluid has in the study; empty where a parameter is missing or out of its limits. */
    static Optional<FluidModel> model(Fluid fluid) {
        return Optional.ofNullable(fluid.getModel()).flatMap(ModelKind::byId).flatMap(kind -> {
            List<Double> values = new ArrayList<>();
            for (CaseField field : CaseFields.model(kind)) {
                OptionalDouble value = Amounts.get(fluid.getAmounts(), field.column());
                if (value.isEmpty()) {
                    return Optional.empty();
                }
                values.add(value.getAsDouble());
            }
            try {
                return Optional.of(kind.create(values.stream().mapToDouble(v -> v).toArray()));
            } catch (ParameterException refused) {
                return Optional.empty();
            }
        });
    }
}
