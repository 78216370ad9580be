package stirwright.study;

import java.util.Optional;
import org.eclipse.emf.common.util.EList;

/** Reads and changes what was settled by hand in a case, by the id of the quantity. */
public final class Picks {

    /** Stands in place of a correlation's id where the pick is a value. */
    public static final String GIVEN = "given";

    private Picks() {}

    /** The pick for a quantity; empty when it is left to the recommendation. */
    public static Optional<Pick> get(Case of, String quantity) {
        return of.getPicks().stream().filter(p -> quantity.equals(p.getQuantity())).findFirst();
    }

    /** Picks a correlation in place of whatever was picked for the quantity. */
    public static void choose(Case of, String quantity, String correlation, String reason) {
        put(of, quantity, correlation, 0, reason);
    }

    /**
     * Gives a value in place of whatever was picked for the quantity.
     *
     * @param value in the quantity's SI unit
     * @throws IllegalArgumentException when the value is not finite: no file could hold it
     */
    public static void give(Case of, String quantity, double value, String reason) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException(quantity + " " + value + " is not a finite number");
        }
        put(of, quantity, GIVEN, value, reason);
    }

    /** Leaves the quantity to the recommendation again. */
    public static void remove(Case of, String quantity) {
        of.getPicks().removeIf(p -> quantity.equals(p.getQuantity()));
    }

    /** Whether a pick is a value instead of a correlation. */
    public static boolean isGiven(Pick pick) {
        return GIVEN.equals(pick.getCorrelation());
    }

    private static void put(Case of, String quantity, String correlation, double value, String reason) {
        EList<Pick> picks = of.getPicks();
        Pick pick = get(of, quantity).orElseGet(() -> {
            Pick added = StudyFactory.eINSTANCE.createPick();
            added.setQuantity(quantity);
            picks.add(added);
            return added;
        });
        pick.setCorrelation(correlation);
        pick.setValue(value);
        pick.setReason(reason);
    }
}
