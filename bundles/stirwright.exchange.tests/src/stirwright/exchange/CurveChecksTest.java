package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What is said of curves whose units, ranges or status words cannot be right. */
class CurveChecksTest {

    private static CurveImport read(String text) {
        return CurveImport.of(CurveSource.clipboard(text), ImportChoice.DETECT);
    }

    private static String table(String rate, String stress, String viscosity, int stressPower, int viscosityPower) {
        return rate + ";" + stress + ";" + viscosity + "\n" + InventedCurve.up().stream().map(p -> p.rate().toPlainString() + ";"
                + p.stress().scaleByPowerOfTen(stressPower).toPlainString() + ";"
                + p.viscosity().scaleByPowerOfTen(viscosityPower).toPlainString() + "\n").collect(Collectors.joining());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "Pa    | Pa s  | 0 |  3 | 1000 times larger  | 'says Pa s and may hold mPa s'",
        "Pa    | mPa s | 0 |  0 | 1000 times smaller | 'says mPa s and may hold Pa s'",
        "Pa    | Pa s  | 1 |  0 | 10 times smaller   | 'says Pa and may hold dyn/cm2'",
        "kPa   | Pa s  | 0 |  0 | 1000 times smaller | 'says kPa and may hold Pa'",
        "Pa    | Pa s  | 0 |  1 | 10 times larger    | 'says Pa s and may hold P'",
        "Pa    | mPa s | 0 |  5 | 100 times larger   | 'viscosity'"})
    void aFactorOfTenOrMoreNamesTheSlip(String stressUnit, String viscosityUnit, int stressPower, int viscosityPower, String factor, String slip) {
        CurveImport read = read(table("shear rate [1/s]", "shear stress [" + stressUnit + "]", "viscosity [" + viscosityUnit + "]",
                stressPower, viscosityPower));
        String warnings = read.requireCurves().get(0).measurement().warnings().toString();
        assertTrue(warnings.contains(factor), warnings);
        assertTrue(warnings.contains(slip), warnings);
        // Nothing is corrected: the stress is what its column says.
        double expected = InventedCurve.up().get(0).stress().scaleByPowerOfTen(stressPower + (stressUnit.equals("kPa") ? 3 : 0)).doubleValue();
        assertEquals(expected, read.curves().get(0).points().stress(0));
    }

    @Test
    void columnsThatAgreeAreNotDoubted() {
        CurveImport read = read(table("shear rate [1/s]", "shear stress [kPa]", "viscosity [cP]", -3, 3));
        assertEquals(List.of(), read.requireCurves().get(0).measurement().warnings());
        assertArrayEquals(InventedCurve.curve(InventedCurve.up()).stresses(), read.curves().get(0).points().stresses());
    }

    @Test
    void warnings() {
        assertWarns("1;2;20;50;ok\n2;3;20;50;ok\n3;4;20;50;ok\n4;5;20;50;ok\n5;6;20;50;ok\n", "fewer than 6 points", "less than one decade");
        assertWarns("1;2;20.0;50;ok\n3;3;20.3;50;ok\n9;4;20.4;50;ok\n27;5;20.6;50;ok\n81;6;20.5;50;ok\n243;7;20.2;50;ok\n", "drifts by 0.6");
        assertWarns("1;2;20;0.4;ok\n3;3;20;0.9;ok\n9;4;20;1.2;ok\n27;5;20;5;ok\n81;6;20;9;ok\n243;7;20;12;ok\n", "2 points have a torque below");
        assertWarns("1;2;20;50;ok\n3;3;20;50;ok\n9;4;20;50;?\n27;5;20;50;ok\n81;6;20;50;ok\n243;7;20;50;ok\n", "another status than most: ?");
    }

    private static void assertWarns(String rows, String... words) {
        CurveImport read = read("rate;stress;temperature;torque [%];status\n" + rows);
        List<String> warnings = read.requireCurves().get(0).measurement().warnings();
        assertEquals(words.length, warnings.size(), warnings.toString());
        for (String word : words) {
            assertTrue(warnings.toString().contains(word), warnings.toString());
        }
    }

    @Test
    void pointsArePutBackAndLeftOut() {
        String text = "rate;stress;status\n1;2;ok\n3;3;ok\n9;4;over range\n27;5;ok\n81;x;ok\n";
        CurveSource source = CurveSource.clipboard(text);
        CurveImport read = CurveImport.of(source, ImportChoice.DETECT);
        assertEquals(List.of(4, 6), read.dropped().stream().map(d -> d.place().line()).toList());
        assertEquals(List.of(true, false), read.dropped().stream().map(DroppedPoint::canBePutBack).toList());
        ImportChoice choice = ImportChoice.DETECT.puttingBack(read.dropped().get(0).place()).puttingBack(read.dropped().get(1).place())
                .leavingOut(new PointPlace("", 2, 1));
        CurveImport again = CurveImport.of(source, choice);
        assertArrayEquals(new double[] {3, 9, 27}, again.requireCurves().get(0).points().shearRates());
        assertEquals(List.of("left out by hand", "stress 'x' is a word where a number is expected"),
                again.dropped().stream().map(DroppedPoint::reason).toList());
        assertTrue(again.counts().addUp());
    }

    @Test
    void everythingCanBeOverruled() {
        CurveSource source = CurveSource.clipboard("shear stress,b;shear rate,d;e\n1,0;2,5;7\n10,0;7,5;8\n100,0;20,5;9\n");
        CurveImport read = CurveImport.of(source, ImportChoice.DETECT
                .with(new ColumnChoice("", 2, Optional.of(CurveQuantity.SHEAR_RATE), "1/min"))
                .with(new ColumnChoice("", 1, Optional.of(CurveQuantity.SHEAR_STRESS), "kPa"))
                .with(new BlockChoice(1, Optional.of(BlockUse.UNORDERED), Optional.empty())));
        assertEquals(2.5 / 60, read.requireCurves().get(0).points().shearRate(0), 1e-15);
        assertArrayEquals(new double[] {1000, 10000, 100000}, read.curves().get(0).points().stresses());
        assertEquals(Ramp.NONE, read.curves().get(0).measurement().ramp());
        assertTrue(read.findings().stream().anyMatch(f -> f.topic() == Finding.Topic.COLUMN && f.overruled()));
        CurveImport left = CurveImport.of(source, ImportChoice.DETECT.with(new BlockChoice(1, Optional.empty(), Optional.of(false))));
        assertEquals(List.of(), left.curves());
        assertEquals(3, left.counts().left());
        assertFalse(left.messages().isEmpty());
        CurveImport commas = CurveImport.of(source, ImportChoice.DETECT.withSeparator(Optional.of(CurveSeparator.COMMA)));
        assertTrue(commas.findings().stream().anyMatch(f -> f.topic() == Finding.Topic.SEPARATOR && f.overruled() && f.value().equals("comma")));
    }
}
