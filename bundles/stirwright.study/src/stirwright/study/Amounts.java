package stirwright.study;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.eclipse.emf.common.util.EList;

/** Reads and changes a list of amounts by the names of their columns. */
public final class Amounts {

    private Amounts() {}

    /** The value of a column, in the unit that its name says; empty when there is none. */
    public static OptionalDouble get(List<Amount> amounts, String column) {
        return find(amounts, column).map(a -> OptionalDouble.of(a.getValue())).orElse(OptionalDouble.empty());
    }

    /**
     * Changes the column's value in its place, or adds it at the end.
     *
     * @throws IllegalArgumentException when the value is not finite: no file could hold it
     */
    public static void set(EList<Amount> amounts, String column, double value) {
        find(amounts, column).ifPresentOrElse(a -> a.setValue(finite(column, value)), () -> amounts.add(of(column, value)));
    }

    /** Does nothing when there is no such column. */
    public static void remove(EList<Amount> amounts, String column) {
        amounts.removeIf(a -> column.equals(a.getColumn()));
    }

    /**
     * A new amount that belongs to nothing yet.
     *
     * @throws IllegalArgumentException when the value is not finite: no file could hold it
     */
    public static Amount of(String column, double value) {
        Amount amount = StudyFactory.eINSTANCE.createAmount();
        amount.setColumn(column);
        amount.setValue(finite(column, value));
        return amount;
    }

    private static Optional<Amount> find(List<Amount> amounts, String column) {
        return amounts.stream().filter(a -> column.equals(a.getColumn())).findFirst();
    }

    private static double finite(String column, double value) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException(column + " " + value + " is not a finite number");
        }
        return value;
    }
}
