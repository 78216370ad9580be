package stirwright.study;

import java.util.List;
import java.util.Random;
import org.eclipse.emf.common.util.EList;

/** One to three changes of a study of every kind that the window makes; each run draws new ones. */
final class RandomChange implements Runnable {
    private final Study study;
    private final Random random;

    RandomChange(Study study, Random random) {
        this.study = study;
        this.random = random;
    }

    @Override
    public void run() {
        for (int i = random.nextInt(3); i >= 0; i--) {
            changeOnce();
        }
    }

    private void changeOnce() {
        switch (random.nextInt(13)) {
            case 0 -> study.setNotes("note " + random.nextInt(5));
            case 1 -> part(study.getFluids()).setName("name " + random.nextInt(5));
            case 2 -> add(study.getVessels(), StudyFactory.eINSTANCE.createVessel());
            case 3 -> add(study.getFluids(), Parts.copy(part(study.getFluids())));
            case 4 -> add(study.getCases(), Parts.copy(part(study.getCases())));
            case 5 -> study.getCases().move(random.nextInt(study.getCases().size()), part(study.getCases()));
            case 6 -> removeAny(random.nextBoolean() ? study.getFluids() : study.getVessels());
            case 7 -> amounts();
            case 8 -> picks(part(study.getCases()));
            case 9 -> use(part(study.getCases()));
            case 10 -> correlations(part(study.getCases()));
            case 11 -> curves(part(study.getFluids()));
            default -> shorten(study.getCases());
        }
    }

    private <T> T part(List<T> list) {
        return list.get(random.nextInt(list.size()));
    }

    private <T> void add(EList<T> list, T added) {
        list.add(random.nextInt(list.size() + 1), added);
    }

    private void removeAny(EList<? extends Part> parts) {
        if (parts.size() > 1) {
            Parts.remove(part(parts));
        }
    }

    private void shorten(EList<?> list) {
        if (list.size() > 1) {
            list.remove(random.nextInt(list.size()));
        }
    }

    private void amounts() {
        EList<Amount> amounts = part(study.getFluids()).getAmounts();
        if (random.nextInt(4) == 0) {
            Amounts.remove(amounts, "flow_index");
        } else {
            Amounts.set(amounts, random.nextBoolean() ? "flow_index" : "density_kg_m3", random.nextInt(4));
        }
    }

    private void picks(Case one) {
        switch (random.nextInt(3)) {
            case 0 -> Picks.choose(one, "power-number", "np." + random.nextInt(3), "because");
            case 1 -> Picks.give(one, "power-number", 1 + random.nextInt(3), "told so");
            default -> Picks.remove(one, "power-number");
        }
    }

    private void correlations(Case one) {
        String name = random.nextBoolean() ? "a" : "b";
        switch (random.nextInt(4)) {
            case 0 -> OwnConstants.set(one, "np." + random.nextInt(2), name, random.nextInt(3));
            case 1 -> OwnConstants.remove(one, "np." + random.nextInt(2), name);
            case 2 -> one.getLeftOut().remove("effect " + random.nextInt(2));
            default -> one.getLeftOut().add("effect " + random.nextInt(2));
        }
    }

    private void curves(Fluid fluid) {
        EList<Curve> curves = fluid.getCurves();
        switch (random.nextInt(4)) {
            case 0 -> add(curves, Curves.of("curve " + random.nextInt(3), new double[] {1, 2}, new double[] {3, random.nextInt(9)}));
            case 1 -> curves.stream().skip(random.nextInt(3)).findFirst().ifPresent(c -> c.setUsed(!c.isUsed()));
            case 2 -> curves.stream().findFirst().ifPresent(c -> c.getPoints().add(new MeasuredPoint(random.nextInt(3), 1)));
            default -> shorten(curves);
        }
    }

    private void use(Case one) {
        one.setFluid(random.nextInt(3) == 0 ? null : part(study.getFluids()));
        one.setVessel(part(study.getVessels()));
        one.setDemand(random.nextInt(4) == 0 ? null : Amounts.of("speed_rpm", random.nextInt(300)));
        one.getCompared().add("family " + random.nextInt(3));
    }
}
