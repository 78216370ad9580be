package stirwright.workbench.internal.app;

import stirwright.exchange.CaseFields;
import stirwright.rheology.ModelKind;
import stirwright.study.Amount;
import stirwright.study.Case;
import stirwright.study.Fluid;
import stirwright.study.Impeller;
import stirwright.study.Study;
import stirwright.study.StudyFactory;
import stirwright.study.Vessel;
import stirwright.workbench.internal.Messages;

/** A study to begin with: one case whose numbers are still to be typed. */
final class Blank {

    private Blank() {}

    /** @param family id of the impeller's family; may be empty */
    static Study study(String family) {
        StudyFactory make = StudyFactory.eINSTANCE;
        Fluid fluid = make.createFluid();
        fluid.setName(Messages.Blank_fluid);
        fluid.setModel(ModelKind.POWER_LAW.id());
        Vessel vessel = make.createVessel();
        vessel.setName(Messages.Blank_vessel);
        Impeller impeller = make.createImpeller();
        impeller.setName(Messages.Blank_impeller);
        impeller.setFamily(family);
        Amount demand = make.createAmount();
        demand.setColumn(CaseFields.SPEED_RPM.column());
        Case first = make.createCase();
        first.setName(Messages.Blank_case);
        first.setFluid(fluid);
        first.setVessel(vessel);
        first.setImpeller(impeller);
        first.setDemand(demand);
        Study study = make.createStudy();
        study.setName(Messages.Blank_study);
        study.getFluids().add(fluid);
        study.getVessels().add(vessel);
        study.getImpellers().add(impeller);
        study.getCases().add(first);
        return study;
    }
}
