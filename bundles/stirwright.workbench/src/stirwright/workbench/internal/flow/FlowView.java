package stirwright.workbench.internal.flow;

/** What the chart of the flow-curve page draws over the shear rate. */
public enum FlowView {
    STRESS,
    VISCOSITY,
    /** The logarithm of measured over fitted stress, of the selected model. */
    RESIDUALS;

    /** The word on the selector. */
    public String title() {
        return switch (this) {
            case STRESS -> FlowWords.View_stress;
            case VISCOSITY -> FlowWords.View_viscosity;
            case RESIDUALS -> FlowWords.View_residuals;
        };
    }

    /** What is drawn for a stress in Pa at a rate in 1/s, where a model or a measurement says it. */
    double drawn(double rate, double stress) {
        return this == VISCOSITY ? stress / rate : stress;
    }
}
