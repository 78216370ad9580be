package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What a column holds is told by its name or its unit; a header is never overruled by where a column stands. Invented tables. */
class HeadersTest {
    private static final double[] RATES = {0.5, 1, 10, 100, 200, 400};
    private static final double[] STRESSES = {5, 8, 20, 50, 70, 90};

    private static CurveImport read(String text) {
        return CurveImport.of(CurveSource.clipboard(text), ImportChoice.DETECT);
    }

    private static String rows(String extra, double rateIn, double valueIn, boolean viscosity, boolean valueFirst) {
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < RATES.length; i++) {
            double value = STRESSES[i] / valueIn / (viscosity ? RATES[i] : 1);
            double rate = RATES[i] / rateIn;
            text.append(extra.isEmpty() ? "" : extra.replace("#", String.valueOf(i + 1)) + ";")
                    .append(valueFirst ? value + ";" + rate : rate + ";" + value).append('\n');
        }
        return text.toString();
    }

    private static void assertRead(String text) {
        CurveImport read = read(text);
        assertArrayEquals(RATES, read.requireCurves().get(0).points().shearRates(), 1e-12, text);
        assertArrayEquals(STRESSES, read.curves().get(0).points().stresses(), 1e-9, text);
        assertEquals(List.of(), read.curves().get(0).measurement().warnings());
        assertTrue(read.counts().addUp(), read.counts().words());
    }

    private static void assertRefused(String text, String... words) {
        CurveImport read = read(text);
        assertEquals(List.of(), read.curves(), text);
        for (String word : words) {
            assertTrue(read.messages().toString().contains(word), read.messages().toString());
        }
        assertTrue(read.messages().stream().anyMatch(m -> m.weight() == ImportMessage.Weight.PROBLEM));
        assertTrue(read.counts().addUp(), read.counts().words());
    }

    @Test
    void aNameThatIsNotKnownIsToldByItsUnit() {
        assertRead("Shear rate (1/s);app. visc. (cP)\n" + rows("", 1, 1e-3, true, false));
        assertRead("Visc. (mPa.s);SR (1/s)\n" + rows("", 1, 1e-3, true, true));
        assertRead("Lp;SR [1/s];SS [kPa]\n" + rows("#", 1, 1e3, false, false));
        assertRead("rpm;SR 1/s;SS D/cm2\n" + rows("#", 1, 0.1, false, false));
        assertRead("Szybko\u015B\u0107 \u015Bcinania [1/min];Lepko\u015B\u0107 [mPa\u00B7s]\n" + rows("", 1 / 60.0, 1e-3, true, false));
        assertRead("SR;Visc\n1/s;mPas\n" + rows("", 1, 1e-3, true, false));
        assertRead("\u65F6\u95F4 [s];\u526A\u5207\u901F\u7387 [1/s];\u526A\u5207\u5E94\u529B [Pa]\n" + rows("#", 1, 1, false, false));
    }

    @ParameterizedTest
    @ValueSource(strings = {
        "RPM;Dial reading (lb/100ft2)", "Torque (mN.m);Speed (rpm)", "log shear rate;log shear stress", "x;y", "speed;reading",
        "Angular frequency (rad/s);Storage modulus (Pa)", "\u03C9 [1/s];G' [Pa]", "Frequency [1/s];G'' [Pa]",
        "Shear rate (1/s);Kinematic viscosity (mm2/s)", "Shear rate (1/s);Paint A", "SR;SS", "Lp;SS [Pa]"})
    void aHeaderIsNotOverruledByPosition(String header) {
        assertRefused(header + "\n" + rows("", 1, 1, false, false), "the header on line 1 has no column for the shear", "choose the column");
    }

    @Test
    void twoUnitsOfOneKindAreAsked() {
        assertRefused("Shear rate [1/s];P1 [Pa];P2 [Pa]\n1;2;3\n2;3;4\n3;4;5\n", "several columns", "P1 [Pa]", "P2 [Pa]");
    }

    @Test
    void positionAloneIsADoubtUnlessThereAreTwoColumns() {
        assertRead(rows("", 1, 1, false, false));
        CurveImport read = read("1;0.5;2\n2;10;3\n3;100;4\n4;200;5\n");
        assertTrue(read.requireCurves().get(0).measurement().warnings().toString().contains("no column has a name"), read.messages().toString());
    }

    @ParameterizedTest
    @ValueSource(strings = {
        "Viscosity (MPa s)", "Viscosity (kilopoise)", "Viscosity (mPa/s)", "Shear stress (Dynes)", "Shear stress (mmHg)",
        "Viscosity x 1000 [Pa s]", "Viscosity \u00D7 10\u00B3 (Pa s)", "Shear stress (Pa)[dyn/cm2]", "Viscosity (LV2)", "Shear stress (furlong per week)"})
    void aBracketThatMayBeAUnitIsNotARemark(String header) {
        assertRefused("Shear rate (1/s);" + header + "\n" + rows("", 1, 1, false, false), "is not known for a", "no column for the shear stress");
    }

    @Test
    void aRateInAnUnknownUnitIsNotRead() {
        assertRefused("Shear rate (revs per min);Shear stress (Pa)\n" + rows("", 1, 1, false, false), "'revs per min' is not known", "shear rate");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "Viscosity (mPa x s)|1e-3", "Viscosity (centipoises)|1e-3", "Viscosity (mPa sec)|1e-3", "Viscosity (milli Pascal sec)|1e-3",
        "Viscosity (25 \u00B0C) mPa.s|1e-3", "Viscosity (LV2) [cP]|1e-3", "Viscosity (10^-3 Pa\u00B7s)|1e-3", "Viscosity [10\u207B\u00B3 Pa s]|1e-3",
        "Viscosity mPas 20\u00B0C|1e-3", "Viscosity (mPa.s at 25 \u00B0C)|1e-3", "Viscosity / mPa s (20 \u00B0C)|1e-3", "Viscosity (apparent) [Pa s]|1",
        "Viscosity (measured)|1", "Viscosity (mean) in mPas|1e-3", "Viscosity (1e-3 Pa s)|1e-3", "Viscosity (cP, spindle 4)|1e-3"})
    void everyBracketIsTriedForAUnit(String header, double scale) {
        assertRead("Shear rate (1/s);" + header + "\n" + rows("", 1, scale, true, false));
    }

    @Test
    void aTemperatureInANameTellsSamplesApart() {
        CurveImport read = read("Shear rate 1/s;Viscosity mPas 20\u00B0C;Viscosity mPas 40\u00B0C\n1;2000;1000\n10;1000;500\n100;500;250\n");
        assertEquals(List.of(20.0, 40.0), read.curves().stream().map(c -> c.measurement().temperature()).toList());
        assertEquals(25, read.curves().get(1).points().stress(2), 1e-12);
    }

    @Test
    void aNumberInTheHeaderDoesNotHideIt() {
        CurveImport read = read("Shear rate (1/s);Viscosity (mPa.s);;batch;1234\n1;2000;;;\n10;1000;;;\n100;500;;;\n");
        assertArrayEquals(new double[] {2, 10, 50}, read.requireCurves().get(0).points().stresses(), 1e-12);
        assertRefused("Shear rate (1/s);1;2;3\n0.1;13.4;14.7;16.1\n0.3;14.3;15.7;17.1\n1;16.5;17.6;19.2\n", "has no column for the shear stress");
        assertRefused("sr;1;2;3\n0.1;13.4;14.7;16.1\n0.3;14.3;15.7;17.1\n1;16.5;17.6;19.2\n", "has no column for the shear rate");
    }
}
