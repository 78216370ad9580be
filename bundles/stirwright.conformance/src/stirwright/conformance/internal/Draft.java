package stirwright.conformance.internal;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import stirwright.core.CaseRefusedException;
import stirwright.correlation.Family;
import stirwright.correlation.FluidClass;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Variable;

/** A case in the making: what was given, before the family's defaults fill in the rest. */
record Draft(Family family, Map<String, Double> given, Map<Variable, Double> variables, FluidClass fluid) {

    static Draft standard(Family family, Set<Variable> variables) {
        return new Draft(family, StandardCase.given(family, StandardCase.BAFFLES),
                StandardCase.variables(StandardCase.FLUID, variables), StandardCase.FLUID);
    }

    Draft with(GeometryParameter parameter, double value) {
        Map<String, Double> copy = new HashMap<>(given);
        copy.put(parameter.id(), value);
        return new Draft(family, copy, variables, fluid);
    }

    Draft with(Variable variable, double value) {
        Map<Variable, Double> copy = new HashMap<>(variables);
        copy.put(variable, value);
        return new Draft(family, given, copy, fluid);
    }

    Draft with(FluidClass other) {
        Draft draft = with(Variable.FLOW_INDEX, StandardCase.flowIndex(other));
        return new Draft(family, given, draft.variables, other);
    }

    /** Empty when the family does not allow the geometry. */
    Optional<Situation> situation() {
        try {
            return Optional.of(new Situation(StandardCase.dimensions(family, given), variables, fluid));
        } catch (CaseRefusedException refused) {
            return Optional.empty();
        }
    }
}
