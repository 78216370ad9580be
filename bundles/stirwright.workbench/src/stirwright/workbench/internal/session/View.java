package stirwright.workbench.internal.session;

import stirwright.correlation.Quantity;
import stirwright.workbench.internal.Messages;

/** What the chart draws and the table below it compares. */
public enum View {
    POWER_NUMBER(Quantity.POWER_NUMBER),
    FLOW_NUMBER(Quantity.FLOW_NUMBER),
    SHEAR_RATE_CONSTANT(Quantity.SHEAR_RATE_CONSTANT),
    /** Over the speed, by every power number. */
    POWER(Quantity.POWER_NUMBER),
    /** Over the speed, by every power number. */
    TORQUE(Quantity.POWER_NUMBER);

    private final Quantity quantity;

    View(Quantity quantity) {
        this.quantity = quantity;
    }

    /** The quantity whose candidates are compared. */
    public Quantity quantity() {
        return quantity;
    }

    /** Whether each point of a curve is a case of its own, at another speed. */
    public boolean overSpeed() {
        return this == POWER || this == TORQUE;
    }

    /** The word on the selector. */
    public String title() {
        return switch (this) {
            case POWER_NUMBER -> Messages.View_powerNumber;
            case FLOW_NUMBER -> Messages.View_flowNumber;
            case SHEAR_RATE_CONSTANT -> Messages.View_shearRateConstant;
            case POWER -> Messages.View_power;
            case TORQUE -> Messages.View_torque;
        };
    }
}
