package stirwright.core;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Set;
import stirwright.core.internal.GeometryRules;
import stirwright.correlation.Family;
import stirwright.correlation.Figures;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;

/** A vessel and impeller in which every parameter of the family has a value. Immutable. */
public final class VesselGeometry implements Geometry {
    private final GeometryParameter[] parameters;
    private final double[] values;
    private final boolean[] defaulted;

    private VesselGeometry(Family family) {
        parameters = family.parameters().toArray(GeometryParameter[]::new);
        values = new double[parameters.length];
        Arrays.fill(values, Double.NaN);
        defaulted = new boolean[parameters.length];
    }

    /**
     * Fills what was not given with the family's defaults and checks hard limits.
     *
     * @param given by parameter id, in SI units; ids that the family does not have are passed over
     * @throws CaseRefusedException naming the column and the value
     */
    public static VesselGeometry resolve(Family family, Map<String, Double> given) {
        VesselGeometry geometry = new VesselGeometry(family);
        for (int i = 0; i < geometry.parameters.length; i++) {
            GeometryParameter parameter = geometry.parameters[i];
            Double value = given.get(parameter.id());
            if (value != null) {
                geometry.values[i] = value;
                GeometryRules.checkLimits(parameter, value);
            } else if (parameter.defaultKind() == GeometryParameter.Default.NONE) {
                throw new CaseRefusedException(parameter.column(), "",
                        "is blank; family " + family.id() + " has no default for the " + parameter.title());
            } else {
                geometry.values[i] = parameter.defaultValue(geometry);
                geometry.defaulted[i] = true;
            }
        }
        GeometryRules.checkTogether(geometry, given.keySet());
        geometry.defaulted().forEach(p -> GeometryRules.checkLimits(p, geometry.get(p)));
        return geometry;
    }

    @Override
    public double get(GeometryParameter parameter) {
        int at = indexOf(parameter);
        return at < 0 ? Double.NaN : values[at];
    }

    /** The parameters that nobody gave. */
    public List<GeometryParameter> defaulted() {
        List<GeometryParameter> list = new ArrayList<>();
        for (int i = 0; i < parameters.length; i++) {
            if (defaulted[i]) {
                list.add(parameters[i]);
            }
        }
        return list;
    }

    /** The default that stands in for a parameter of this family, in words, for instance "blade_width_m = 0.122 (D/5)". */
    public String defaultInWords(GeometryParameter parameter) {
        int at = indexOf(parameter);
        String value = Figures.show(parameter.toColumn(values[at]));
        String words = parameters[at].defaultWords();
        return parameter.column() + " = " + value + (words.startsWith(value) ? "" : " (" + words + ")");
    }

    /** A view that records in a set which parameters that nobody gave were read through it. */
    public Geometry recordingDefaults(Set<GeometryParameter> read) {
        return parameter -> {
            int at = indexOf(parameter);
            if (at < 0) {
                return Double.NaN;
            }
            if (defaulted[at]) {
                read.add(parameters[at]);
            }
            return values[at];
        };
    }

    private int indexOf(GeometryParameter parameter) {
        for (int i = 0; i < parameters.length; i++) {
            if (parameters[i].equals(parameter)) {
                return i;
            }
        }
        return -1;
    }
}
