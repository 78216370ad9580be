package stirwright.correlation;

import org.osgi.annotation.versioning.ProviderType;

/** The state at which a bound correlation is evaluated. */
@ProviderType
public interface OperatingPoint {

    /** The value of a variable in its SI unit; NaN when it is not known here. */
    double get(Variable variable);

    /** The kind of fluid. */
    FluidClass fluid();

    /** Short for the variable that nearly every correlation reads. */
    default double reynolds() {
        return get(Variable.REYNOLDS);
    }
}
