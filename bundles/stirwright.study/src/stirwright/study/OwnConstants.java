package stirwright.study;

import java.util.Optional;
import java.util.OptionalDouble;

/** Reads and changes the values that a case gives to constants of correlations. */
public final class OwnConstants {

    private OwnConstants() {}

    /** The case's own value; empty where it has the correlation's. */
    public static OptionalDouble get(Case of, String correlation, String name) {
        return find(of, correlation, name).map(c -> OptionalDouble.of(c.getValue())).orElse(OptionalDouble.empty());
    }

    /** Whether the case changes any constant of a correlation. */
    public static boolean any(Case of, String correlation) {
        return of.getConstants().stream().anyMatch(c -> correlation.equals(c.getCorrelation()));
    }

    /**
     * Changes the value in its place, or adds it at the end.
     *
     * @throws IllegalArgumentException when the value is not finite: no file could hold it
     */
    public static void set(Case of, String correlation, String name, double value) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException(correlation + " " + name + " " + value + " is not a finite number");
        }
        Constant constant = find(of, correlation, name).orElseGet(() -> {
            Constant added = StudyFactory.eINSTANCE.createConstant();
            added.setCorrelation(correlation);
            added.setName(name);
            of.getConstants().add(added);
            return added;
        });
        constant.setValue(value);
    }

    /** Gives a constant the correlation's value again. */
    public static void remove(Case of, String correlation, String name) {
        find(of, correlation, name).ifPresent(of.getConstants()::remove);
    }

    private static Optional<Constant> find(Case of, String correlation, String name) {
        return of.getConstants().stream()
                .filter(c -> correlation.equals(c.getCorrelation()) && name.equals(c.getName())).findFirst();
    }
}
