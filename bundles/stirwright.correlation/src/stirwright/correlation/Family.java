package stirwright.correlation;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A kind of impeller with its geometry parameters and regime limits. */
public final class Family {
    private final String id;
    private final String title;
    private final String description;
    private final List<GeometryParameter> parameters;
    private final RegimeLimits regimes;

    private Family(Builder builder) {
        this.id = builder.id;
        this.title = builder.title;
        this.description = builder.description;
        this.parameters = List.copyOf(builder.parameters);
        this.regimes = builder.regimes;
    }

    /** Starts a family with the parameters that every vessel has. */
    public static Builder of(String id, String title) {
        return new Builder(id, title);
    }

    public String id() {
        return id;
    }

    public String title() {
        return title;
    }

    public String description() {
        return description;
    }

    /** In the order in which defaults build on each other. */
    public List<GeometryParameter> parameters() {
        return parameters;
    }

    public Optional<GeometryParameter> parameter(String parameterId) {
        return parameters.stream().filter(p -> p.id().equals(parameterId)).findFirst();
    }

    public RegimeLimits regimes() {
        return regimes;
    }

    /** Collects a family; {@link #build} checks that nothing is missing. */
    public static final class Builder {
        private final String id;
        private final String title;
        private String description = "";
        private final List<GeometryParameter> parameters = new ArrayList<>(Dimensions.VESSEL);
        private RegimeLimits regimes;

        private Builder(String id, String title) {
            this.id = id;
            this.title = title;
        }

        /** What it looks like, in words that no maker owns. */
        public Builder description(String text) {
            this.description = text;
            return this;
        }

        /** Adds a parameter, or replaces the one of the same id in its place. */
        public Builder parameter(GeometryParameter parameter) {
            int at = parameters.indexOf(parameter);
            if (at < 0) {
                parameters.add(parameter);
            } else {
                parameters.set(at, parameter);
            }
            return this;
        }

        public Builder regimes(RegimeLimits limits) {
            this.regimes = limits;
            return this;
        }

        public Family build() {
            if (!id.matches("[a-z][a-z0-9]*")) {
                throw new ContractException("family id '" + id + "': expected lower-case letters and digits");
            }
            if (regimes == null || description.isBlank()) {
                throw new ContractException("family '" + id + "' needs a description and regime limits");
            }
            return new Family(this);
        }
    }
}
