package stirwright.exchange;

import stirwright.study.Amounts;
import stirwright.study.Case;
import stirwright.study.Fluid;
import stirwright.study.Impeller;
import stirwright.study.Study;
import stirwright.study.StudyFactory;
import stirwright.study.Vessel;

/** The good case of {@link Sheet} as a study, to be bent by a test. */
final class InventedStudy {
    final Study study = StudyFactory.eINSTANCE.createStudy();
    final Fluid fluid = StudyFactory.eINSTANCE.createFluid();
    final Vessel vessel = StudyFactory.eINSTANCE.createVessel();
    final Impeller impeller = StudyFactory.eINSTANCE.createImpeller();
    final Case good = StudyFactory.eINSTANCE.createCase();

    InventedStudy() {
        fluid.setName("broth");
        fluid.setModel("newtonian");
        Amounts.set(fluid.getAmounts(), "density_kg_m3", 1000);
        Amounts.set(fluid.getAmounts(), "viscosity_Pa_s", 0.1);
        vessel.setName("kettle");
        Amounts.set(vessel.getAmounts(), "vessel_diameter_m", 1.5);
        Amounts.set(vessel.getAmounts(), "baffle_count", 4);
        impeller.setName("stirrer");
        impeller.setFamily("blades");
        Amounts.set(impeller.getAmounts(), "impeller_diameter_m", 0.5);
        good.setName("A");
        good.setFluid(fluid);
        good.setVessel(vessel);
        good.setImpeller(impeller);
        good.setDemand(Amounts.of("speed_rev_s", 2));
        study.getFluids().add(fluid);
        study.getVessels().add(vessel);
        study.getImpellers().add(impeller);
        study.getCases().add(good);
    }

    CaseEntry entry() {
        return StudyCases.entry(good, Invented.CATALOGUE);
    }
}
