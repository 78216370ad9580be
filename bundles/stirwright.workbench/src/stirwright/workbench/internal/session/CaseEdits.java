package stirwright.workbench.internal.session;

import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import java.util.function.Consumer;
import java.util.function.Function;
import org.eclipse.emf.common.util.EList;
import stirwright.core.Choices;
import stirwright.correlation.Quantity;
import stirwright.exchange.CaseFields;
import stirwright.rheology.ModelKind;
import stirwright.study.Amount;
import stirwright.study.Amounts;
import stirwright.study.Case;
import stirwright.study.Fluid;
import stirwright.study.Impeller;
import stirwright.study.Part;
import stirwright.study.Parts;
import stirwright.study.Picks;
import stirwright.study.Study;
import stirwright.study.StudyFactory;
import stirwright.study.Vessel;
import stirwright.workbench.internal.Messages;

/** The edits that the window makes, each one step for undo. */
public final class CaseEdits {
    private final Session session;

    public CaseEdits(Session session) {
        this.session = session;
    }

    /** Sets or, for NaN, removes an amount; typing on in one field stays one step. */
    public void amount(String label, EList<Amount> owner, String column, double value) {
        if (Double.compare(Amounts.get(owner, column).orElse(Double.NaN), value) == 0) {
            return;
        }
        session.editor().edit(label, List.of(System.identityHashCode(owner), column), () -> {
            if (Double.isNaN(value)) {
                Amounts.remove(owner, column);
            } else {
                Amounts.set(owner, column, value);
            }
        });
    }

    /** Sets what settles the speed; another kind takes the place of the last, and NaN leaves the kind without a value. */
    public void demand(Case one, String column, double value) {
        Amount now = one.getDemand();
        if (now != null && now.getColumn().equals(column) && Double.compare(Demands.value(one), value) == 0) {
            return;
        }
        // Turning to another kind is a step of its own; typing its value is another.
        boolean sameKind = now != null && now.getColumn().equals(column);
        session.editor().edit(Messages.Edit_speed, sameKind ? List.of(System.identityHashCode(one), "demand") : null, () -> {
            Amount demand = StudyFactory.eINSTANCE.createAmount();
            demand.setColumn(column);
            if (!Double.isNaN(value)) {
                demand.setValue(value);
            }
            one.setDemand(demand);
        });
    }

    /** Bounds of a yield stress go with the last model that had one: nothing would show them, and the case would be refused. */
    public void model(Fluid fluid, String modelId) {
        if (!modelId.equals(fluid.getModel())) {
            boolean yields = ModelKind.byId(modelId).filter(ModelKind::yields).isPresent();
            session.editor().edit(Messages.Edit_model, () -> {
                fluid.setModel(modelId);
                if (!yields) {
                    CaseFields.YIELD_BOUNDS.forEach(f -> Amounts.remove(fluid.getAmounts(), f.column()));
                }
            });
        }
    }

    /** Picks made for another family mean nothing for this one and go with it. */
    public void family(Case one, Impeller impeller, String familyId) {
        if (!familyId.equals(impeller.getFamily())) {
            session.editor().edit(Messages.Edit_family, () -> {
                impeller.setFamily(familyId);
                Parts.users(impeller).forEach(user -> settleAnew(user, familyId));
                one.getCompared().remove(familyId);
            });
        }
    }

    /** Picks made for another family mean nothing, nor do constants of correlations that hold for none of those shown. */
    private void settleAnew(Case one, String familyId) {
        one.getPicks().clear();
        Set<String> shown = new HashSet<>(one.getCompared());
        shown.add(familyId);
        one.getConstants().removeIf(constant -> session.catalogue().entry(String.valueOf(constant.getCorrelation()))
                .filter(entry -> shown.stream().noneMatch(entry.correlation()::holdsFor)).isPresent());
    }

    public void compare(Case one, String familyId, boolean shown) {
        if (one.getCompared().contains(familyId) != shown) {
            session.editor().edit(Messages.Edit_compare, () -> {
                if (shown) {
                    one.getCompared().add(familyId);
                } else {
                    one.getCompared().remove(familyId);
                }
            });
        }
    }

    public void rename(String label, Part part, String name) {
        if (!name.equals(part.getName())) {
            session.editor().edit(label, List.of(System.identityHashCode(part), "name"), () -> part.setName(name));
        }
    }

    public void rename(Case one, String name) {
        if (!name.equals(one.getName())) {
            session.editor().edit(Messages.Edit_name, List.of(System.identityHashCode(one), "name"), () -> one.setName(name));
        }
    }

    /** Uses a correlation by hand, with the reason for it; a value given for the quantity goes. */
    public void pick(Case one, Quantity quantity, String correlationId, String reason) {
        session.editor().edit(Messages.bind(Messages.Edit_pick, quantity.title()), () -> {
            Picks.choose(one, quantity.id(), correlationId, reason);
            Amounts.remove(one.getAmounts(), Choices.givenField(quantity));
        });
    }

    /** Leaves a quantity to the recommendation again. */
    public void unpick(Case one, Quantity quantity) {
        session.editor().edit(Messages.bind(Messages.Edit_unpick, quantity.title()), () -> {
            Picks.remove(one, quantity.id());
            Amounts.remove(one.getAmounts(), Choices.givenField(quantity));
        });
    }

    public void use(Case one, Fluid fluid) {
        if (one.getFluid() != fluid) {
            session.editor().edit(Messages.Edit_fluid, () -> one.setFluid(fluid));
        }
    }

    public void use(Case one, Vessel vessel) {
        if (one.getVessel() != vessel) {
            session.editor().edit(Messages.Edit_vessel, () -> one.setVessel(vessel));
        }
    }

    public void use(Case one, Impeller impeller) {
        if (one.getImpeller() != impeller) {
            String before = session.familyId();
            session.editor().edit(Messages.Edit_impeller, () -> {
                one.setImpeller(impeller);
                // Picks made for another family mean nothing for this one.
                if (!before.equals(impeller.getFamily())) {
                    settleAnew(one, String.valueOf(impeller.getFamily()));
                }
            });
        }
    }

    /** A copy of the case that shares its fluid, vessel and impeller, and turns to it. */
    public void duplicateCase(Case one) {
        Case copy = Parts.copy(one);
        copy.setName(unused(one.getName(), study().getCases(), Case::getName));
        session.editor().edit(Messages.Edit_duplicateCase, () -> {
            study().getCases().add(study().getCases().indexOf(one) + 1, copy);
        });
        session.turnTo(copy);
    }

    public void removeCase(Case one) {
        session.editor().edit(Messages.Edit_removeCase, () -> study().getCases().remove(one));
    }

    /** Gives the case a fluid, vessel or impeller of its own, equal to the one it had. */
    public void copyFluid(Case one) {
        copy(one.getFluid(), study().getFluids(), Messages.Edit_fluid, one::setFluid);
    }

    public void copyVessel(Case one) {
        copy(one.getVessel(), study().getVessels(), Messages.Edit_vessel, one::setVessel);
    }

    public void copyImpeller(Case one) {
        copy(one.getImpeller(), study().getImpellers(), Messages.Edit_impeller, one::setImpeller);
    }

    private <P extends Part> void copy(P part, EList<P> all, String label, Consumer<P> use) {
        P copy = Parts.copy(part);
        copy.setName(unused(part.getName(), all, Part::getName));
        session.editor().edit(label, () -> {
            all.add(all.indexOf(part) + 1, copy);
            use.accept(copy);
        });
    }

    private Study study() {
        return session.editor().study();
    }

    /** "name 2" and on, whichever is free. */
    private static <T> String unused(String name, List<T> all, Function<T, String> nameOf) {
        int count = 2;
        while (true) {
            String candidate = name + " " + count;
            if (all.stream().noneMatch(one -> Objects.equals(nameOf.apply(one), candidate))) {
                return candidate;
            }
            count++;
        }
    }
}
