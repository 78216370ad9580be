package stirwright.exchange;

import static java.nio.charset.StandardCharsets.UTF_16LE;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static stirwright.exchange.Refusals.assertUnusable;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import stirwright.rheology.FlowCurve;

class FlowCurveFileTest {
    private static final double[] RATES = {0.5, 10, 100};
    private static final double[] STRESSES = {2.5, 7.25, 20};

    @TempDir
    Path folder;

    private FlowCurveFile read(String text) {
        try {
            return FlowCurveFile.read(Files.writeString(folder.resolve("ketchup 7.txt"), text));
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {
        "shear_rate_1_s,shear_stress_Pa\n0.5,2.5\n10,7.25\n100,20\n",
        "shear_stress_Pa,shear_rate_1_s\n2.5,0.5\n7.25,10\n20,100\n",
        "# invented\n\nTime;Shear rate [1/s];Temp;Shear stress [Pa]\n1;0,5;20,1;2,5\n2;10;20,2;7,25\n3;100;20,1;20\n",
        "0.5\t2.5\n10\t7.25\n100\t20\n",
        "0,5;2,5\n10;7,25\n100;20\n",
        "0.5,2.5\n10,7.25\n100,20",
        "\"0,5\",\"2,5\"\n10,\"7,25\"\n100,20\n",
        "\uFEFFpoint,x,y\nfirst,0.5,2.5\nsecond,10,7.25\nthird,100,20\n",
        "100,20\n0.5,2.5\n10,7.25\n"})
    void oneCurveHoweverItIsWritten(String text) {
        FlowCurveFile file = read(text);
        FlowCurve curve = file.curves().get(0).points();
        assertArrayEquals(RATES, curve.shearRates());
        assertArrayEquals(STRESSES, curve.stresses());
        assertEquals("ketchup 7", file.curves().get(0).label());
        assertEquals("ketchup 7.txt", file.fileName());
    }

    @Test
    void whatWasFoundIsReported() {
        String messages = String.join("\n", read("a;b;c\nx;0,5;2,5\nx;1;2\nx;2;3\n").messages());
        assertTrue(messages.contains("semicolon"));
        assertTrue(messages.contains("decimal comma"));
        assertTrue(messages.contains("shear rate in 1/s from b, shear stress in Pa from c"), messages);
    }

    @Test
    void errorsNameFileLineColumnAndValue() {
        String header = "shear_rate_1_s,shear_stress_Pa\n1,2\n";
        assertUnusable(() -> read(header + "# c\n2,x7\n3,4\n"), "ketchup 7.txt", "line 4", "shear_stress_Pa", "'x7'");
        assertUnusable(() -> read(header + "0,4\n3,4\n"), "line 3", "shear_rate_1_s", "'0'", "greater than 0");
        assertUnusable(() -> read(header + "2,-4\n3,4\n"), "line 3", "shear_stress_Pa", "'-4'");
        assertUnusable(() -> read(header + "2\n3,4\n"), "line 3", "shear_stress_Pa", "blank");
        assertUnusable(() -> read(header + "2,3,4\n3,4\n"), "line 3", "column 3", "'4'");
        assertUnusable(() -> read(header + "2,1e999\n3,4\n"), "line 3", "'1e999'", "precision");
        assertUnusable(() -> read(header + "2,\"4\n3,4\n"), "line 3", "shear_stress_Pa", "quote");
        assertUnusable(() -> read("1;2\n2;z\n3;4\n"), "line 2", "column 2", "'z'");
    }

    @Test
    void tooFewPoints() {
        assertUnusable(() -> read("1,2\n2,3\n"), "ketchup 7.txt", "3 points", "2");
        assertUnusable(() -> read("shear_rate_1_s,shear_stress_Pa\n"), "no points");
    }

    @Test
    void whatCannotBeTold() {
        assertUnusable(() -> read("0,1,5,2\n1,2,5,3\n2,1,6,2\n"), "line 1", "4 cells", "header");
        assertUnusable(() -> read("a,b\nx,1\ny,2\n"), "line 2", "1 number");
        assertUnusable(() -> read("shear_rate_1_s,viscosity\n1,2\n2,3\n3,4\n"), "shear stress", "shear_stress_Pa");
        assertUnusable(() -> read("x;y\n0,5;1\n1.5;2\n2;3\n"), "line 2", "'0,5'", "line 3", "'1.5'");
    }

    @ParameterizedTest
    @ValueSource(strings = {"shear_stress_mPa", "Shear Stress [kPa]", "stress (dyn/cm2)", "stress_psi"})
    void otherUnitsAreNotConvertedSilently(String column) {
        assertUnusable(() -> read("shear_rate_1_s;" + column + "\n1;2\n2;3\n3;4\n"), column, "not in Pa");
    }

    @Test
    void noTextFile() throws IOException {
        Path file = Files.write(folder.resolve("curve.csv"), "1,2\n2,3\n3,4\n".getBytes(UTF_16LE));
        assertUnusable(() -> FlowCurveFile.read(file), "curve.csv", "UTF-16");
    }
}
