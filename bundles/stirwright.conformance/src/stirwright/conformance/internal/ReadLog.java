package stirwright.conformance.internal;

import java.util.LinkedHashSet;
import java.util.Set;
import stirwright.correlation.FluidClass;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.OperatingPoint;
import stirwright.correlation.Variable;

/** Passes a situation on and notes what was asked of it. */
final class ReadLog implements Geometry, OperatingPoint {
    private final Situation situation;
    private final Set<GeometryParameter> dimensions = new LinkedHashSet<>();
    private final Set<Variable> variables = new LinkedHashSet<>();
    private boolean fluidRead;

    ReadLog(Situation situation) {
        this.situation = situation;
    }

    @Override
    public double get(GeometryParameter parameter) {
        dimensions.add(parameter);
        return situation.get(parameter);
    }

    @Override
    public double get(Variable variable) {
        variables.add(variable);
        return situation.get(variable);
    }

    @Override
    public FluidClass fluid() {
        fluidRead = true;
        return situation.fluid();
    }

    Set<GeometryParameter> dimensions() {
        return dimensions;
    }

    Set<Variable> variables() {
        return variables;
    }

    boolean fluidRead() {
        return fluidRead;
    }
}
