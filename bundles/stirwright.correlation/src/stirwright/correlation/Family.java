package stirwright.correlation;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;

/** A kind of impeller with its geometry parameters, the hard limits between them, and its regime limits. Immutable. */
public final class Family {
    private final String id;
    private final String title;
    private final String description;
    private final List<GeometryParameter> parameters;
    private final List<GeometryRule> rules;
    private final RegimeLimits regimes;

    private Family(Builder builder) {
        this.id = builder.id;
        this.title = builder.title;
        this.description = builder.description;
        this.parameters = List.copyOf(builder.parameters);
        this.rules = builder.rules.stream().filter(r -> parameters.containsAll(r.parameters())).toList();
        this.regimes = builder.regimes;
    }

    /**
     * Starts a family with the parameters that every vessel has and the limits between dimensions
     * that are common to impellers: D &lt; T, C &lt; H, B &lt; T/2, W &lt; D, L &lt; D, t &lt; D/10, no baffles
     * of zero width, blades above the bottom, the uppermost impeller below the surface, a volume that
     * the vessel can hold.
     */
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

    /** In the order in which blanks are filled. */
    public List<GeometryParameter> parameters() {
        return parameters;
    }

    /** The hard limits between dimensions that this family has. */
    public List<GeometryRule> rules() {
        return rules;
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
        private final List<GeometryRule> rules = new ArrayList<>();
        private RegimeLimits regimes;

        private Builder(String id, String title) {
            this.id = id;
            this.title = title;
            VesselRules.addTo(this);
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

        /**
         * One dimension stays below a share of another; a second limit on the same two replaces the
         * first. Without effect while the family lacks one of them.
         */
        public Builder below(GeometryParameter smaller, GeometryParameter larger, double share) {
            GeometryRule rule = GeometryRule.below(smaller, larger, share);
            rules.removeIf(r -> r.parameters().equals(rule.parameters()));
            rules.add(rule);
            return this;
        }

        /**
         * Any other hard limit.
         *
         * @param named the parameter whose value is refused when the limit is broken; without effect
         *     while the family lacks it
         * @param words what that parameter must be, as said after "is not"
         * @param holds whether a geometry keeps to it; stateless, may be called from several threads
         *     at once
         */
        public Builder rule(GeometryParameter named, String words, Predicate<Geometry> holds) {
            rules.add(GeometryRule.of(named, words, holds));
            return this;
        }

        public Builder regimes(RegimeLimits limits) {
            this.regimes = limits;
            return this;
        }

        /**
         * The family as told so far; it does not change when the builder is used further. What is
         * demanded here never grows stricter in a minor version of the contract.
         *
         * @throws ContractException naming the family and what is missing
         */
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
