package stirwright.exchange.internal.write;

import java.util.List;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import java.util.function.ToIntFunction;

/**
 * A column of a table, and the member of the same name in JSON: written down once for both.
 *
 * @param <R> what a row is made from
 */
public sealed interface Column<R> {

    String name();

    /** The cell of a row, with a decimal point and every digit. */
    String cell(R row);

    record Text<R>(String name, Function<R, String> of) implements Column<R> {
        @Override
        public String cell(R row) {
            return of.apply(row);
        }
    }

    /** What is not finite means nothing: an empty cell, {@code null} in JSON. */
    record Number<R>(String name, ToDoubleFunction<R> of) implements Column<R> {
        @Override
        public String cell(R row) {
            return cell(of.applyAsDouble(row));
        }

        String cell(double value) {
            return Double.isFinite(value) ? Double.toString(value) : "";
        }
    }

    /** A count; a negative one means nothing. */
    record Count<R>(String name, ToIntFunction<R> of) implements Column<R> {
        @Override
        public String cell(R row) {
            int value = of.applyAsInt(row);
            return value < 0 ? "" : Integer.toString(value);
        }
    }

    /** Several entries: joined in a cell, an array in JSON. */
    record Words<R>(String name, Function<R, List<String>> of, String joint) implements Column<R> {
        @Override
        public String cell(R row) {
            return String.join(joint, of.apply(row));
        }
    }

    static <R> Column<R> text(String name, Function<R, String> of) {
        return new Text<>(name, of);
    }

    static <R> Column<R> number(String name, ToDoubleFunction<R> of) {
        return new Number<>(name, of);
    }

    static <R> Column<R> count(String name, ToIntFunction<R> of) {
        return new Count<>(name, of);
    }

    static <R> Column<R> words(String name, Function<R, List<String>> of) {
        return new Words<>(name, of, "; ");
    }

    /** Joined by blanks, as a case table takes them. */
    static <R> Column<R> entries(String name, Function<R, List<String>> of) {
        return new Words<>(name, of, " ");
    }

    static List<String> names(List<? extends Column<?>> columns) {
        return columns.stream().<String>map(Column::name).toList();
    }
}
