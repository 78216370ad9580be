package stirwright.core;

import java.util.Arrays;
import stirwright.correlation.FluidClass;
import stirwright.correlation.OperatingPoint;
import stirwright.correlation.Variable;

/** A reusable operating point: set its variables, evaluate, set them again. Not thread-safe. */
public final class Point implements OperatingPoint {
    private static final int ROOM = 12;

    private Variable[] variables = new Variable[ROOM];
    private double[] values = new double[ROOM];
    private int size;
    private FluidClass fluid = FluidClass.NEWTONIAN;

    /** Sets or replaces a variable, in its SI unit. */
    public Point set(Variable variable, double value) {
        int at = indexOf(variable);
        if (at < 0) {
            if (size == variables.length) {
                variables = Arrays.copyOf(variables, 2 * size);
                values = Arrays.copyOf(values, 2 * size);
            }
            at = size++;
            variables[at] = variable;
        }
        values[at] = value;
        return this;
    }

    public Point fluid(FluidClass value) {
        fluid = value;
        return this;
    }

    /** Takes over a state; the Reynolds number is Metzner and Otto's until set otherwise. */
    public Point at(FluidState state) {
        return set(Variable.REYNOLDS, state.reynolds())
                .set(Variable.FROUDE, state.froude())
                .set(Variable.FLOW_INDEX, state.flowIndex())
                .set(Variable.YIELD_NUMBER, state.yieldNumber())
                .set(Variable.SPEED, state.speed())
                .set(Variable.DENSITY, state.density())
                .set(Variable.VISCOSITY, state.viscosity())
                .set(Variable.SHEAR_RATE_CONSTANT, state.shearRateConstant())
                .fluid(state.fluid());
    }

    @Override
    public double get(Variable variable) {
        int at = indexOf(variable);
        return at < 0 ? Double.NaN : values[at];
    }

    @Override
    public FluidClass fluid() {
        return fluid;
    }

    /** In loops it is nearly always the very object, so that is looked for first. */
    private int indexOf(Variable variable) {
        for (int i = 0; i < size; i++) {
            if (variables[i] == variable) {
                return i;
            }
        }
        for (int i = 0; i < size; i++) {
            if (variables[i].equals(variable)) {
                return i;
            }
        }
        return -1;
    }
}
