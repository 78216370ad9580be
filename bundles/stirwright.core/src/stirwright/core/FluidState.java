package stirwright.core;

import stirwright.correlation.FluidClass;
import stirwright.correlation.ReynoldsDefinition;

/**
 * The product at the impeller, by one shear-rate constant at one speed.
 *
 * @param speed rev/s
 * @param shearRateConstant effective value per revolution
 * @param shearRate average at the impeller, 1/s: the constant times the speed
 * @param viscosity apparent viscosity at that shear rate, Pa s
 * @param flowIndex local, d ln stress/d ln rate
 * @param density kg/m3
 * @param diameter impeller diameter, m
 * @param yieldStress Pa
 */
public record FluidState(
        double speed, double shearRateConstant, double shearRate, double viscosity, double flowIndex,
        double density, double diameter, double yieldStress, FluidClass fluid) {

    /** Standard gravity, m/s2 (ISO 80000-3). */
    public static final double GRAVITY = 9.80665;

    /** rho N D^2/mu, mu at the average shear rate. */
    public double reynolds() {
        return density * speed * diameter * diameter / viscosity;
    }

    /** By another definition; NaN for one that is not known here. */
    public double reynolds(ReynoldsDefinition definition) {
        if (definition.equals(ReynoldsDefinition.METZNER_OTTO)) {
            return reynolds();
        }
        if (definition.equals(ReynoldsDefinition.POWER_LAW)) {
            // Apparent viscosity K g^(n-1), so K = mu g^(1-n); rho N^(2-n) D^2/K follows.
            return reynolds() * Math.pow(shearRate / speed, flowIndex - 1);
        }
        return Double.NaN;
    }

    /** N^2 D/g, with {@link #GRAVITY}. */
    public double froude() {
        return speed * speed * diameter / GRAVITY;
    }

    /** Yield stress over rho N^2 D^2. */
    public double yieldNumber() {
        return yieldStress / (density * speed * speed * diameter * diameter);
    }

    public double tipSpeed() {
        return Math.PI * speed * diameter;
    }

    /** Power in W of this power number: Np rho N^3 D^5. */
    public double power(double powerNumber) {
        return powerNumber * density * Math.pow(speed, 3) * Math.pow(diameter, 5);
    }

    /** Flow in m3/s of this flow number: Nq N D^3. */
    public double pumping(double flowNumber) {
        return flowNumber * speed * Math.pow(diameter, 3);
    }
}
