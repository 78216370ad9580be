package stirwright.study;

/** An invented study that uses every kind of element and is bent by the tests. */
final class Invented {

    private Invented() {}

    static Study study() {
        Study study = StudyFactory.eINSTANCE.createStudy();
        study.setName("broth & <stock>");
        study.setNotes("Everything is invented.\nSecond line,\ttabbed; \"quoted\" & <tagged>.");
        Fluid broth = StudyFactory.eINSTANCE.createFluid();
        broth.setName("broth");
        broth.setModel("power-law");
        Amounts.set(broth.getAmounts(), "density_kg_m3", 1035);
        Amounts.set(broth.getAmounts(), "consistency_Pa_sn", 0.1 + 0.2);
        Amounts.set(broth.getAmounts(), "flow_index", 0.61);
        broth.setModelReason("fits best & \"looks\" right");
        broth.getCurves().add(curve());
        Vessel kettle = StudyFactory.eINSTANCE.createVessel();
        kettle.setName("kettle");
        Amounts.set(kettle.getAmounts(), "vessel_diameter_m", 1.5);
        Amounts.set(kettle.getAmounts(), "baffle_count", 0);
        Impeller blades = StudyFactory.eINSTANCE.createImpeller();
        blades.setName("blades");
        blades.setFamily("blades");
        Amounts.set(blades.getAmounts(), "impeller_diameter_m", 0.5);
        study.getFluids().add(broth);
        study.getVessels().add(kettle);
        study.getImpellers().add(blades);
        study.getCases().add(newCase("simmer", broth, kettle, blades));
        return study;
    }

    private static Curve curve() {
        Curve curve = Curves.of("first up", new double[] {0.1, 1, 1e-7}, new double[] {0.1 + 0.2, 3, 0});
        curve.setSource("broth <25>.txt");
        curve.setSha256("00ff".repeat(16));
        curve.setBlock("2 of 3");
        curve.setRamp("up");
        curve.setReplicate(1);
        curve.setTemperature(0);
        curve.setUsed(false);
        curve.getDropped().add("line 7: no stress");
        curve.getDropped().add("line 7: no stress");
        curve.getReadAs().add("viscosity in mPa s");
        return curve;
    }

    private static Case newCase(String name, Fluid fluid, Vessel vessel, Impeller impeller) {
        Case one = StudyFactory.eINSTANCE.createCase();
        one.setName(name);
        one.setFluid(fluid);
        one.setVessel(vessel);
        one.setImpeller(impeller);
        one.setDemand(Amounts.of("speed_rpm", 90));
        Amounts.set(one.getAmounts(), "shear_rate_constant", 11.5);
        Picks.choose(one, "power-number", "blades.np.narrow", "measured\non site");
        Picks.give(one, "flow-number", 0.75, "");
        one.getCompared().add("propeller");
        one.getLeftOut().add("clearance");
        OwnConstants.set(one, "blades.np.narrow", "a", 0.1 + 0.2);
        return one;
    }
}
