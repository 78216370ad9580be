package stirwright.exchange.internal.curves;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Pattern;
import stirwright.exchange.UnusableFileException;
import stirwright.exchange.internal.table.Grid;
import stirwright.exchange.internal.table.Numbers;
import stirwright.exchange.internal.table.Row;
import stirwright.exchange.internal.table.Separator;

/**
 * Which two columns of a table hold the curve.
 *
 * @param rate position of the shear rate
 * @param stress position of the shear stress
 */
record CurveColumns(int rate, int stress) {
    private static final Pattern RATE = Pattern.compile("(.*_)?(shear_?rate|rate|gamma_?dot)(_.*)?");
    private static final Pattern STRESS = Pattern.compile("(.*_)?(shear_?stress|stress|tau)(_.*)?");

    /** Units other than 1/s and Pa, as headers write them. */
    private static final Pattern FOREIGN_UNIT =
            Pattern.compile(".*_(mpa|kpa|hpa|dyn|dyne|lbf?|psf|psi|rpm|min|1_min|min_1|h|hz)(_.*)?");

    static boolean isName(String header) {
        String name = plain(header);
        return RATE.matcher(name).matches() || STRESS.matcher(name).matches();
    }

    /** @throws UnusableFileException when the header has only one of them, or another unit */
    static CurveColumns of(Grid grid, boolean headed) {
        List<String> names = grid.header().names();
        Optional<Integer> rate = named(names, RATE);
        Optional<Integer> stress = named(names, STRESS);
        if (rate.isPresent() && stress.isPresent()) {
            requireUnit(grid, names.get(rate.get()), "1/s");
            requireUnit(grid, names.get(stress.get()), "Pa");
            return new CurveColumns(rate.get(), stress.get());
        }
        if (rate.isPresent() || stress.isPresent()) {
            throw new UnusableFileException(grid.file().path(), "the header on line " + grid.header().line()
                    + " has no column for the shear " + (rate.isPresent() ? "stress, for instance shear_stress_Pa"
                    : "rate, for instance shear_rate_1_s"));
        }
        return firstNumeric(grid, headed);
    }

    private static Optional<Integer> named(List<String> names, Pattern pattern) {
        for (int i = 0; i < names.size(); i++) {
            if (pattern.matcher(plain(names.get(i))).matches()) {
                return Optional.of(i);
            }
        }
        return Optional.empty();
    }

    private static void requireUnit(Grid grid, String name, String unit) {
        if (FOREIGN_UNIT.matcher(plain(name)).matches()) {
            throw new UnusableFileException(grid.file().path(), "column '" + name + "' is not in " + unit
                    + "; convert it and name the unit in the header");
        }
    }

    private static CurveColumns firstNumeric(Grid grid, boolean headed) {
        int[] found = new int[2];
        int count = 0;
        Row first = grid.rows().get(0);
        for (int i = 0; i < first.cells().size() && count < 2; i++) {
            if (Numbers.isNumber(first.cell(i))) {
                found[count++] = i;
            }
        }
        if (count < 2) {
            throw new UnusableFileException(grid.file().path(), "line " + first.line() + " holds " + count
                    + " number(s); a shear rate and a shear stress are expected, separated by comma, semicolon or tab");
        }
        // 0,1,5,2 without a header may be two numbers with decimal commas, or four.
        if (!headed && grid.separator() == Separator.COMMA && first.cells().size() > 2 && grid.decimalUnseen()) {
            throw new UnusableFileException(grid.file().path(), "line " + first.line() + " has " + first.cells().size()
                    + " cells and no decimal point; name the columns in a header, or use another separator");
        }
        return new CurveColumns(found[0], found[1]);
    }

    private static String plain(String header) {
        return header.toLowerCase(Locale.ROOT).replaceAll("[^a-z0-9]+", "_").replaceAll("^_|_$", "");
    }
}
