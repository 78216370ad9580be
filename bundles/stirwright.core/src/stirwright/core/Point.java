package stirwright.core;

import java.util.Arrays;
import stirwright.correlation.FluidClass;
import stirwright.correlation.OperatingPoint;
import stirwright.correlation.Variable;

/** A reusable operating point: set its variables, evaluate, set them again. Not thread-safe. */
public final class Point implements OperatingPoint {
    /** What every state has, in the order in which {@link #at} fills it in. */
    private static final Variable[] OF_STATE = {
        Variable.REYNOLDS, Variable.FROUDE, Variable.FLOW_INDEX, Variable.YIELD_NUMBER, Variable.SPEED,
        Variable.DENSITY, Variable.VISCOSITY, Variable.SHEAR_RATE_CONSTANT
    };
    private static final int ROOM = OF_STATE.length + 4;

    private Variable[] variables = Arrays.copyOf(OF_STATE, ROOM);
    private double[] values = new double[ROOM];
    private int size = OF_STATE.length;
    private FluidClass fluid = FluidClass.NEWTONIAN;

    /** A point at which nothing is known. */
    public Point() {
        Arrays.fill(values, 0, size, Double.NaN);
    }

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
        values[0] = state.reynolds();
        values[1] = state.froude();
        values[2] = state.flowIndex();
        values[3] = state.yieldNumber();
        values[4] = state.speed();
        values[5] = state.density();
        values[6] = state.viscosity();
        values[7] = state.shearRateConstant();
        return fluid(state.fluid());
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
