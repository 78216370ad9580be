package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import stirwright.core.CandidateResult;
import stirwright.core.CaseRefusedException;
import stirwright.core.CaseSpec;
import stirwright.core.Catalogue;
import stirwright.core.Choices;
import stirwright.core.CrossCheck;
import stirwright.core.Entry;
import stirwright.core.Point;
import stirwright.core.SpeedDemand;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Family;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Quantity;
import stirwright.correlation.ReynoldsDefinition;
import stirwright.correlation.Variable;
import stirwright.rheology.Fluid;
import stirwright.rheology.MeasuredWindow;
import stirwright.rheology.Newtonian;

/** No factor is applied to what contains its effect already, over every installed family and many odd vessels. */
class VesselEffectsTest {
    private static final Pattern APPLIED = Pattern.compile(": power number times \\S+ by (\\S+)");

    /** What a formula reads, it contains. */
    private static final Map<GeometryParameter, Effect> READ = Map.of(
            Dimensions.CLEARANCE, Effect.CLEARANCE, Dimensions.LIQUID_HEIGHT, Effect.LIQUID_DEPTH,
            Dimensions.BAFFLE_COUNT, Effect.BAFFLES, Dimensions.BAFFLE_WIDTH, Effect.BAFFLES,
            Dimensions.BLADE_THICKNESS, Effect.THICKNESS, Dimensions.IMPELLER_COUNT, Effect.SEVERAL_IMPELLERS,
            Dimensions.IMPELLER_SPACING, Effect.SEVERAL_IMPELLERS);

    private final Catalogue catalogue = Framework.catalogue();
    private final Set<String> applied = new TreeSet<>();
    private int withheld;

    @Test
    void aFactorIsAppliedWhereItsEffectIsLackingAndNowhereElse() {
        for (Family family : catalogue.families()) {
            for (Map<String, Double> dimensions : vessels()) {
                vessel(family, dimensions).ifPresent(vessel -> check(family, dimensions, vessel));
            }
        }
        Set<String> installed = new TreeSet<>();
        catalogue.entries().stream().map(Entry::correlation)
                .filter(c -> c.modifierFor().isPresent() && c.quantity().equals(Quantity.POWER_NUMBER))
                .forEach(c -> installed.add(c.id()));
        assertEquals(installed, applied, "the vessels here must call for every factor once at least");
        assertTrue(withheld > 100, withheld + " factors were withheld");
    }

    /** Empty where such a vessel does not exist for a family. */
    private static Optional<Geometry> vessel(Family family, Map<String, Double> dimensions) {
        try {
            return Optional.of(VesselGeometry.resolve(family, dimensions));
        } catch (CaseRefusedException impossible) {
            return Optional.empty();
        }
    }

    private void check(Family family, Map<String, Double> dimensions, Geometry vessel) {
        for (double viscosity : new double[] {1e-3, 100}) {
            CaseSpec spec = new CaseSpec("case", family.id(), dimensions, new SpeedDemand.At(2),
                    new Fluid(new Newtonian(viscosity), 1000, MeasuredWindow.UNKNOWN),
                    new Choices(Map.of(), Map.of(Quantity.SHEAR_RATE_CONSTANT, 11.0)), List.of());
            new CrossCheck(catalogue).check(spec).candidates().forEach(row -> check(row, vessel, family, dimensions));
        }
    }

    private void check(CandidateResult row, Geometry vessel, Family family, Map<String, Double> dimensions) {
        String where = row.correlation() + " of " + family.id() + " in " + dimensions + ": " + row.notes();
        Correlation base = correlation(row.correlation());
        Set<Effect> covered = new HashSet<>(base.contains());
        List<Correlation> factors = row.notes().stream().flatMap(note -> APPLIED.matcher(note).results())
                .map(found -> correlation(found.group(1))).toList();
        double product = value(base, vessel, row);
        for (Correlation factor : factors) {
            assertTrue(covered.add(factor.modifierFor().orElseThrow()), "twice for one effect: " + where);
            covered.addAll(factor.contains());
            assertTrue(factor.appliesTo(vessel), factor + " has nothing to say here: " + where);
            product *= value(factor, vessel, row);
            applied.add(factor.id());
        }
        if (base.reynoldsDefinition().equals(ReynoldsDefinition.METZNER_OTTO)) {
            assertEquals(product, row.powerNumber(), 1e-9 * Math.abs(product), where);
        }
        for (Correlation factor : catalogue.modifiers(Quantity.POWER_NUMBER, family.id())) {
            if (factor.appliesTo(vessel)) {
                Effect effect = factor.modifierFor().orElseThrow();
                assertTrue(covered.contains(effect), factor + " is forgotten: " + where);
                withheld += base.contains().contains(effect) ? 1 : 0;
            }
        }
    }

    @Test
    void whatAFormulaReadsItContains() {
        List<String> silent = new ArrayList<>();
        int read = 0;
        for (Entry entry : catalogue.entries()) {
            Correlation correlation = entry.correlation();
            if (correlation.modifierFor().isPresent() || !correlation.quantity().equals(Quantity.POWER_NUMBER)) {
                continue;
            }
            for (Effect effect : effectsRead(correlation)) {
                read++;
                if (!correlation.contains().contains(effect)) {
                    silent.add(correlation + " reads what makes " + effect.title() + ", and does not say that it contains it");
                }
            }
        }
        assertEquals(List.of(), silent);
        assertFalse(read < 10, "only " + read + " were found");
    }

    private Set<Effect> effectsRead(Correlation correlation) {
        Set<Effect> effects = new LinkedHashSet<>();
        if (correlation.reads().contains(Variable.FROUDE)) {
            effects.add(Effect.FROUDE);
        }
        for (Family family : catalogue.families()) {
            if (correlation.holdsFor(family.id())) {
                // Close to the wall only a vessel of the family's own exists.
                Geometry vessel = vessel(family, vessels().get(0)).orElseGet(
                        () -> VesselGeometry.resolve(family, Map.of("impeller_diameter", 0.3)));
                Geometry watched = parameter -> {
                    READ.entrySet().stream().filter(e -> e.getKey().equals(parameter)).forEach(e -> effects.add(e.getValue()));
                    return vessel.get(parameter);
                };
                correlation.bind(watched).at(new Point().set(Variable.REYNOLDS, 100).set(Variable.FROUDE, 0.1));
            }
        }
        return effects;
    }

    private Correlation correlation(String id) {
        return catalogue.entry(id).orElseThrow(() -> new AssertionError("no correlation " + id)).correlation();
    }

    private static double value(Correlation correlation, Geometry vessel, CandidateResult row) {
        return correlation.bind(vessel).at(new Point().at(row.state().orElseThrow()));
    }

    /** The first is the standard vessel; each other is odd in at least one way. */
    private static List<Map<String, Double>> vessels() {
        List<Map<String, Double>> all = new ArrayList<>();
        for (double impellers : new double[] {1, 2, 3}) {
            for (double clearance : new double[] {0.3, 0.09, 0.16}) {
                for (double depth : new double[] {0.9, 1.6}) {
                    for (double spacing : new double[] {0.3, 0.45}) {
                        for (double[] baffles : new double[][] {{4, 0.09}, {2, 0.045}, {0, 0}}) {
                            Map<String, Double> vessel = new LinkedHashMap<>(Map.of("impeller_diameter", 0.3, "vessel_diameter", 0.9,
                                    "impeller_count", impellers, "clearance", clearance, "liquid_height", depth,
                                    "impeller_spacing", spacing, "baffle_count", baffles[0], "baffle_width", baffles[1]));
                            all.add(vessel);
                            Map<String, Double> fourBlades = new LinkedHashMap<>(vessel);
                            fourBlades.put("blade_count", 4.0);
                            all.add(fourBlades);
                        }
                    }
                }
            }
        }
        return all;
    }
}
