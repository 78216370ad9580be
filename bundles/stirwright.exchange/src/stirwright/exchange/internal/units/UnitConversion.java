package stirwright.exchange.internal.units;

import java.math.BigDecimal;
import java.math.MathContext;
import javax.measure.Dimension;
import javax.measure.IncommensurableException;
import javax.measure.Unit;
import tech.units.indriya.function.Calculus;
import tech.units.indriya.function.DefaultNumberSystem;
import tech.units.indriya.function.RationalNumber;

/** From a typed unit to the unit of a column. */
final class UnitConversion {
    /** Far beyond a double's 17 digits, so that rounding to it is the one rounding that counts. */
    private static final MathContext FORTY = new MathContext(40);

    static {
        // Left alone, the library looks for this default of its own with the thread's class loader, which in a
        // framework of bundles does not find it.
        Calculus.setCurrentNumberSystem(new DefaultNumberSystem());
    }

    private UnitConversion() {}

    /**
     * @param to the column's unit, which is of this kind
     * @throws UnitRefusedException when the typed unit is unknown, ambiguous or of another kind
     */
    static double convert(BigDecimal number, String typed, String to, UnitKind kind) throws UnitRefusedException {
        Unit<?> from = UnitGrammar.parse(typed, kind);
        Dimension found = from.getDimension();
        if (kind == UnitKind.ROTATION && measures(UnitKind.SHEAR_RATE, found)) {
            // Behind a speed of rotation 1/s and 1/min count revolutions: rotational frequency, ISO 80000-3.
            from = from.multiply(UnitSymbols.REVOLUTION);
        } else if (!measures(kind, found)) {
            throw new UnitRefusedException(kind == UnitKind.CONSISTENCY && measures(UnitKind.VISCOSITY, found)
                    ? "has the unit of a viscosity, but the unit of a consistency depends on the flow index n; write"
                            + " the number alone, in Pa s^n, or with Pa s^n or mPa s^n"
                    : name(found) + "; " + kind.expected());
        }
        try {
            return rounded(from.getConverterToAny(UnitGrammar.parse(to, kind)).convert(RationalNumber.of(number)));
        } catch (IncommensurableException impossible) {
            throw new IllegalStateException(typed + " to " + to, impossible);
        }
    }

    private static boolean measures(UnitKind kind, Dimension dimension) throws UnitRefusedException {
        return dimension(kind).equals(dimension);
    }

    private static Dimension dimension(UnitKind kind) throws UnitRefusedException {
        return UnitGrammar.parse(kind.unit(), kind).getDimension();
    }

    private static String name(Dimension dimension) throws UnitRefusedException {
        for (UnitKind kind : UnitKind.values()) {
            if (measures(kind, dimension)) {
                return "is " + kind.words();
            }
        }
        return "measures something else";
    }

    private static double rounded(Number exact) {
        return exact instanceof RationalNumber ratio
                ? new BigDecimal(ratio.getDividend()).divide(new BigDecimal(ratio.getDivisor()), FORTY).doubleValue()
                : new BigDecimal(exact.toString()).doubleValue();
    }
}
