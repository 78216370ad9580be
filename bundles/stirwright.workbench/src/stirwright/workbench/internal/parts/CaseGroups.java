package stirwright.workbench.internal.parts;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Composite;
import stirwright.correlation.Family;
import stirwright.exchange.CaseField;
import stirwright.exchange.CaseFields;
import stirwright.rheology.ModelKind;
import stirwright.study.Case;
import stirwright.study.Fluid;
import stirwright.study.Impeller;
import stirwright.study.Part;
import stirwright.study.Vessel;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.flow.FluidEdits;
import stirwright.workbench.internal.flowpage.CurveList;
import stirwright.workbench.internal.flowpage.PageWords;
import stirwright.workbench.internal.session.CaseEdits;
import stirwright.workbench.internal.session.Demands;
import stirwright.workbench.internal.session.ModelTitles;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Form;

/** The groups of fields, from the case's name to the values given in place of correlations. */
final class CaseGroups {
    private final CaseForm fields;
    private final Form form;
    private final Session session;
    private final CaseEdits edits;

    CaseGroups(CaseForm fields, Form form, Session session, CaseEdits edits) {
        this.fields = fields;
        this.form = form;
        this.session = session;
        this.edits = edits;
    }

    void theCase(Case c) {
        Composite head = form.heading(Messages.Case_heading);
        form.looks().link(head, Messages.Case_duplicate, () -> edits.duplicateCase(c));
        if (session.editor().study().getCases().size() > 1) {
            form.looks().link(head, Messages.Case_remove, () -> edits.removeCase(c));
        }
        fields.choice(Messages.Case_case, session.editor().study().getCases(), c, Case::getName, session::turnTo);
        fields.text(Messages.Case_nameOfCase, c::getName, name -> edits.rename(c, name));
    }

    /** Whose fluid it is, where the page is about the fluid. */
    void caseOfFluid(Case c) {
        fields.choice(Messages.Case_case, session.editor().study().getCases(), c, Case::getName, session::turnTo);
    }

    /** The measured curves of the fluid. */
    void curves(Case c) {
        Fluid fluid = c.getFluid();
        if (fluid == null) {
            return;
        }
        Composite head = form.heading(PageWords.Curves_heading);
        if (fluid.getCurves().isEmpty()) {
            form.sentence(PageWords.Curves_none);
            return;
        }
        CurveList list = new CurveList(form, form.looks(), fluid, new FluidEdits(session));
        GridData data = Form.wholeLine();
        data.heightHint = list.height();
        list.control().setLayoutData(data);
        form.looks().link(head, PageWords.Curves_remove, list::remove).setToolTipText(PageWords.Curves_removeTip);
        fields.refreshed(list::refresh);
    }

    void speed(Case c) {
        form.heading(Messages.Case_speed);
        List<CaseField> kinds = CaseFields.SPEEDS;
        CaseField now = Demands.field(c);
        form.choice(Messages.Case_demand, kinds.stream().map(Demands::title).toList(), kinds.indexOf(now),
                i -> edits.demand(c, kinds.get(i).column(), Demands.equivalent(session, c, kinds.get(i))));
        fields.number(CaseForm.capital(now.title()), now,
                () -> Demands.value(c), value -> edits.demand(c, now.column(), value));
    }

    /** @param measured whether the page is about what was measured of the fluid, by whichever model it is described */
    void fluid(Case c, boolean measured) {
        Fluid fluid = c.getFluid();
        Composite head = form.heading(Messages.Case_fluid);
        part(Messages.Case_fluid, session.editor().study().getFluids(), fluid, f -> edits.use(c, f));
        if (fluid == null) {
            return;
        }
        form.looks().link(head, Messages.Case_copy, () -> edits.copyFluid(c));
        fields.text(Messages.Case_nameOfFluid, fluid::getName, name -> edits.rename(Messages.Edit_name, fluid, name));
        List<ModelKind> kinds = Arrays.asList(ModelKind.values());
        Optional<ModelKind> kind = Optional.ofNullable(fluid.getModel()).flatMap(ModelKind::byId);
        form.choice(Messages.Case_model, kinds.stream().map(ModelTitles::of).toList(),
                kind.map(kinds::indexOf).orElse(-1), i -> edits.model(fluid, kinds.get(i).id()));
        kind.ifPresent(k -> CaseFields.model(k).forEach(f -> fields.number(f, fluid.getAmounts())));
        kind.ifPresent(k -> CaseFields.yieldBounds(k).forEach(f -> fields.number(f, fluid.getAmounts())));
        if (measured || kind.filter(ModelKind::yields).isPresent()) {
            fields.number(CaseFields.STATIC_YIELD_STRESS, fluid.getAmounts());
        }
        fields.number(CaseFields.DENSITY, fluid.getAmounts());
        fields.number(Messages.Case_measuredFrom, CaseFields.SHEAR_RATE_MIN, fluid.getAmounts());
        fields.number(Messages.Case_measuredTo, CaseFields.SHEAR_RATE_MAX, fluid.getAmounts());
    }

    void vessel(Case c) {
        Vessel vessel = c.getVessel();
        Composite head = form.heading(Messages.Case_vessel);
        part(Messages.Case_vessel, session.editor().study().getVessels(), vessel, v -> edits.use(c, v));
        if (vessel != null) {
            form.looks().link(head, Messages.Case_copy, () -> edits.copyVessel(c));
            fields.text(Messages.Case_nameOfVessel, vessel::getName, name -> edits.rename(Messages.Edit_name, vessel, name));
            family().ifPresent(f -> CaseFields.vessel(f).forEach(d -> fields.number(d, vessel.getAmounts())));
        }
    }

    void impeller(Case c, List<Family> families) {
        Impeller impeller = c.getImpeller();
        Composite head = form.heading(Messages.Case_impeller);
        part(Messages.Case_impeller, session.editor().study().getImpellers(), impeller, i -> edits.use(c, i));
        if (impeller == null) {
            return;
        }
        form.looks().link(head, Messages.Case_copy, () -> edits.copyImpeller(c));
        fields.text(Messages.Case_nameOfImpeller, impeller::getName, name -> edits.rename(Messages.Edit_name, impeller, name));
        List<String> ids = families.stream().map(Family::id).toList();
        form.wideChoice(Messages.Case_family, families.stream().map(Family::title).toList(), ids.indexOf(session.familyId()),
                i -> edits.family(c, impeller, ids.get(i)));
        family().ifPresent(f -> CaseFields.impeller(f).forEach(d -> fields.number(d, impeller.getAmounts())));
    }

    void compare(Case c, List<Family> families) {
        if (families.size() > 1) {
            form.heading(Messages.Case_compare);
            families.stream().filter(f -> !f.id().equals(session.familyId()))
                    .forEach(f -> form.check(f.title(), c.getCompared().contains(f.id()),
                            on -> edits.compare(c, f.id(), on)));
        }
    }

    void given(Case c) {
        form.heading(Messages.Case_given);
        CaseFields.GIVEN.forEach(f -> fields.number(f, c.getAmounts()));
    }

    private <P extends Part> void part(String title, List<P> all, P current, Consumer<P> use) {
        fields.choice(title, all, current, Part::getName, use);
    }

    private Optional<Family> family() {
        return session.catalogue().family(session.familyId());
    }
}
