package stirwright.core.internal;

import java.util.ArrayList;
import java.util.List;
import stirwright.core.CaseSpec;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.core.Role;
import stirwright.core.SpeedDemand;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Figures;
import stirwright.correlation.FluidClass;
import stirwright.correlation.Quantity;

/** What a reader must know before using the pick: what flags the case, and what is worth a note. */
final class Doubts {
    private final CaseSpec spec;
    private final VesselGeometry vessel;
    private final ResultAssembly.Row row;
    private final FluidState state;
    private final boolean anyQualifies;
    private final DefaultsUsed defaults;

    Doubts(CaseSpec spec, VesselGeometry vessel, ResultAssembly.Row pickRow, boolean anyQualifies) {
        this.spec = spec;
        this.vessel = vessel;
        this.row = pickRow;
        this.state = pickRow.power().trial().state().orElseThrow();
        this.anyQualifies = anyQualifies;
        this.defaults = new DefaultsUsed(spec, vessel, pickRow, restsOnConstant());
    }

    List<String> flags() {
        List<String> flags = new ArrayList<>();
        pickDoubts(flags);
        if (restsOnConstant()) {
            row.constants().pick().filter(c -> !c.sound()).ifPresent(c -> flags.add(constantInDoubt(c)));
        }
        defaults.assumedThatMatter().ifPresent(words -> flags.add("assumed: " + words));
        factorsLeftOut(flags);
        outsideWindow(flags);
        levelNearBlades(flags);
        bafflesNearBlades(flags);
        return List.copyOf(flags);
    }

    private void pickDoubts(List<String> flags) {
        Selection.Ranked pick = row.power();
        if (pick.role() == Role.EXCLUDED) {
            flags.add("nothing is recommended: no candidate qualifies; the nearest is " + pick.id() + ", "
                    + pick.why());
        } else if (pick.trial().assessment().verdict().fails()) {
            flags.add("the chosen " + pick.id() + " is not within its bounds: "
                    + String.join("; ", pick.trial().assessment().failed()));
        } else if (pick.role() == Role.CHOSEN && !pick.sound()) {
            flags.add("the chosen " + pick.id() + " does not qualify: " + pick.trial().assessment().obstacle());
        }
        if (!anyQualifies && pick.role() == Role.CHOSEN) {
            flags.add("nothing is recommended: no candidate qualifies");
        }
    }

    /** With a constant viscosity and a speed that does not follow from it, it changes nothing but its own column. */
    private boolean restsOnConstant() {
        return state.fluid() != FluidClass.NEWTONIAN || spec.speed() instanceof SpeedDemand.ForShearRate;
    }

    /** The case may leave out what it likes, but then its numbers are not those that the sources lead to. */
    private void factorsLeftOut(List<String> flags) {
        if (spec.choices().effectsLeftOut().isEmpty()) {
            return;
        }
        row.picks().stream().filter(c -> restsOnConstant() || !c.quantity().equals(Quantity.SHEAR_RATE_CONSTANT))
                .flatMap(c -> c.factors(new Point().at(state), state).stream())
                .filter(f -> f.leftOut() && f.value() != 1)
                .forEach(f -> flags.add("effect left out in the case, " + f.effect().title() + ": the " + f.factor().quantity().title()
                        + " lacks a factor of " + Figures.show(f.value())));
    }

    private static String constantInDoubt(Selection.Ranked constant) {
        return "shear-rate constant " + constant.id() + " does not qualify: " + constant.trial().assessment().obstacle();
    }

    private void outsideWindow(List<String> flags) {
        WindowUse.outside(spec.fluid().window(), "shear rate", state.shearRate()).ifPresent(flags::add);
    }

    /** Common practice, no source: side loads grow once less than half a diameter of liquid covers a blade. */
    private void levelNearBlades(List<String> flags) {
        double top = vessel.get(Dimensions.CLEARANCE)
                + (vessel.get(Dimensions.IMPELLER_COUNT) - 1) * vessel.get(Dimensions.IMPELLER_SPACING);
        double cover = vessel.get(Dimensions.LIQUID_HEIGHT) - top;
        if (cover < vessel.get(Dimensions.IMPELLER_DIAMETER) / 2) {
            flags.add("caution: liquid level " + Figures.show(cover) + " m above the uppermost impeller's centre, less"
                    + " than D/2: side loads, vibration and air entrainment are not estimated; keep to the equipment"
                    + " maker's minimum submergence");
        }
    }

    private void bafflesNearBlades(List<String> flags) {
        if (vessel.get(Dimensions.BAFFLE_WIDTH) >= vessel.get(Dimensions.WALL_GAP)) {
            flags.add("caution: baffles of " + Figures.show(vessel.get(Dimensions.BAFFLE_WIDTH)) + " m do not fit into the gap of "
                    + Figures.show(vessel.get(Dimensions.WALL_GAP)) + " m between blade tip and wall; unless they end above or"
                    + " below the impeller, blades hit them");
        }
    }

    List<String> notes() {
        List<String> notes = new ArrayList<>(spec.remarks());
        defaults.others().ifPresent(words -> notes.add("defaults: " + words));
        row.constants().pick().ifPresent(c -> {
            if (c.role() == Role.CHOSEN) {
                notes.add("shear-rate constant " + (c.id().equals(Candidate.GIVEN) ? "given in the case" : "chosen in the case"));
            } else if (!c.sound() && !restsOnConstant()) {
                notes.add(constantInDoubt(c) + "; the power does not rest on it");
            }
        });
        row.flows().pick().filter(f -> !f.sound()).ifPresent(f -> notes.add(
                "flow number " + f.id() + " does not qualify: " + f.trial().assessment().obstacle()));
        for (Candidate.Part part : row.power().trial().candidate().parts()) {
            part.correlation().remarks().forEach(remark -> notes.add(part.correlation().id() + ": " + remark));
        }
        if (state.fluid() == FluidClass.YIELD_STRESS) {
            notes.add("yield stress: torque to start a product at rest can exceed the running torque and is not"
                    + " estimated; whether the product moves at the wall is not checked here");
        }
        return List.copyOf(notes);
    }
}
