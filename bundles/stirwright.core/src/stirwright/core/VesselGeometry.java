package stirwright.core;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import stirwright.core.internal.GeometryRules;
import stirwright.correlation.Fallback;
import stirwright.correlation.Family;
import stirwright.correlation.Figures;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;

/** A vessel and impeller in which every parameter of the family has a value. Immutable. */
public final class VesselGeometry implements Geometry {

    /**
     * How a blank was filled.
     *
     * @param restsOn the parameters, blank as well, whose values went into it
     */
    private record Filled(Fallback by, Set<GeometryParameter> restsOn) {}

    private final GeometryParameter[] parameters;
    private final double[] values;
    /** Null where the value was given. */
    private final Filled[] filled;

    private VesselGeometry(Family family) {
        parameters = family.parameters().toArray(GeometryParameter[]::new);
        values = new double[parameters.length];
        Arrays.fill(values, Double.NaN);
        filled = new Filled[parameters.length];
    }

    /**
     * Takes all that was given, fills each blank in the family's order with the first of its
     * fallbacks that gives a finite number, and checks hard limits.
     *
     * @param given by parameter id, in SI units; ids that the family does not have are passed over
     * @throws CaseRefusedException naming the column and the value
     */
    public static VesselGeometry resolve(Family family, Map<String, Double> given) {
        VesselGeometry geometry = new VesselGeometry(family);
        geometry.take(given);
        for (int i = 0; i < geometry.parameters.length; i++) {
            GeometryParameter parameter = geometry.parameters[i];
            if (!given.containsKey(parameter.id()) && !geometry.fill(i)) {
                throw new CaseRefusedException(parameter.column(), "",
                        "is blank; family " + family.id() + " has no default for the " + parameter.title()
                        + (parameter.fallbacks().isEmpty() ? "" : " that follows from what was given"));
            }
        }
        GeometryRules.checkTogether(family, geometry, given.keySet());
        geometry.defaulted().forEach(p -> GeometryRules.checkLimits(p, geometry.get(p)));
        return geometry;
    }

    private void take(Map<String, Double> given) {
        for (int i = 0; i < parameters.length; i++) {
            Double value = given.get(parameters[i].id());
            if (value != null) {
                GeometryRules.checkLimits(parameters[i], value);
                values[i] = value;
            }
        }
    }

    private boolean fill(int at) {
        for (Fallback fallback : parameters[at].fallbacks()) {
            Set<GeometryParameter> restsOn = new LinkedHashSet<>();
            double value = fallback.value(recordingDefaults(restsOn));
            if (Double.isFinite(value)) {
                values[at] = value;
                filled[at] = new Filled(fallback, restsOn);
                return true;
            }
        }
        return false;
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
            if (filled[i] != null) {
                list.add(parameters[i]);
            }
        }
        return list;
    }

    /** The kind of the fallback that stands in for a parameter; none when it was given or is not of this family. */
    public GeometryParameter.Default defaultKind(GeometryParameter parameter) {
        int at = indexOf(parameter);
        return at < 0 || filled[at] == null ? GeometryParameter.Default.NONE : filled[at].by().kind();
    }

    /** What stands in for a parameter that nobody gave, in words, for instance "blade_width_m = 0.122 (D/5)". */
    public String defaultInWords(GeometryParameter parameter) {
        return parameter.column() + " = " + defaultValueInWords(parameter);
    }

    /** The same without the name, for instance "0.122 (D/5)". */
    public String defaultValueInWords(GeometryParameter parameter) {
        int at = indexOf(parameter);
        String value = Figures.show(parameter.toColumn(values[at]));
        String words = filled[at].by().words();
        return value + (words.startsWith(value) ? "" : " (" + words + ")");
    }

    /**
     * A view that records in a set which parameters that nobody gave were read through it, and on
     * which others their values rest.
     */
    public Geometry recordingDefaults(Set<GeometryParameter> read) {
        // Read over and over in loops, and to be told once.
        boolean[] told = new boolean[parameters.length];
        return parameter -> {
            int at = indexOf(parameter);
            if (at < 0) {
                return Double.NaN;
            }
            if (filled[at] != null && !told[at]) {
                told[at] = true;
                read.add(parameters[at]);
                read.addAll(filled[at].restsOn());
            }
            return values[at];
        };
    }

    /** In loops it is nearly always the very object, so that is looked for first. */
    private int indexOf(GeometryParameter parameter) {
        for (int i = 0; i < parameters.length; i++) {
            if (parameters[i] == parameter) {
                return i;
            }
        }
        for (int i = 0; i < parameters.length; i++) {
            if (parameters[i].equals(parameter)) {
                return i;
            }
        }
        return -1;
    }
}
