package stirwright.console.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import stirwright.conformance.JarRefusedException;
import stirwright.core.Arrival;
import stirwright.core.Catalogue;
import stirwright.correlation.Quantity;
import stirwright.exchange.Demo;
import stirwright.family.discturbine.DiscTurbine;
import stirwright.family.pitchedblade.PitchedBlade;
import stirwright.general.GeneralRelations;
import stirwright.rheology.ModelKind;

/** The command line as a script sees it: what goes to which stream, and the exit code. */
class CommandLineTest {
    static final Catalogue CATALOGUE = Catalogue.of(List.of(
            Arrival.of(new DiscTurbine(), "stirwright.family.discturbine 1"),
            Arrival.of(new PitchedBlade(), "stirwright.family.pitchedblade 1"),
            Arrival.of(new GeneralRelations(), "stirwright.general 1")));

    private static final String HEAD = "case,family,impeller_diameter_m,vessel_diameter_m,liquid_height_m,clearance_m,"
            + "blade_count,blade_width_m,blade_length_m,blade_thickness_m,baffle_count,baffle_width_m,speed_rev_s,"
            + "density_kg_m3,model,viscosity_Pa_s\n";
    private static final String GOOD = "good,discturbine,0.2,0.6,0.6,0.2,6,0.04,0.05,0.004,4,0.06,2,1000,newtonian,0.001\n";
    private static final String ASSUMING = "assuming,discturbine,0.2,,,,,,,,4,,2,1000,newtonian,0.001\n";
    private static final String WRONG = "wrong,discturbine,0.7,0.6,0.6,0.2,6,0.04,0.05,0.004,4,0.06,2,1000,newtonian,0.001\n";

    @TempDir
    private Path folder;

    private final StringWriter out = new StringWriter();
    private final StringWriter err = new StringWriter();

    private int run(String... arguments) {
        Desk desk = new Desk(() -> CATALOGUE, jar -> {
            throw new JarRefusedException(jar + " is refused by the test");
        }, List::of, List::of, new FakeDoor(), new PrintWriter(out), new PrintWriter(err), "9.9.9");
        return Commands.run(desk, arguments);
    }

    private String table(String... rows) throws IOException {
        Path file = folder.resolve("cases.csv");
        Files.writeString(file, HEAD + String.join("", rows));
        return file.toString();
    }

    @BeforeEach
    @AfterEach
    void noStackTraceReachesTheUser() {
        assertFalse((out.toString() + err).contains("\tat "), () -> out.toString() + err);
    }

    @Test
    void exitCodeTellsTheWorstOutcome() throws IOException {
        assertEquals(0, run("crosscheck", table(GOOD)), err::toString);
        assertEquals(1, run("crosscheck", table(GOOD, ASSUMING)));
        assertEquals(2, run("crosscheck", table(ASSUMING, WRONG, GOOD)));
        assertEquals(3, run("crosscheck", folder.resolve("missing.csv").toString()));
    }

    @Test
    void refusedRowIsNamedOnStandardErrorAndTheOthersAreComputed() throws IOException {
        run("crosscheck", table(WRONG, GOOD));
        String line = err.toString().lines().filter(l -> l.contains("wrong")).findFirst().orElseThrow();
        for (String part : List.of("cases.csv", "2", "impeller_diameter_m", "0.7", "vessel_diameter_m 0.6")) {
            assertTrue(line.contains(part), line);
        }
        assertTrue(out.toString().contains("good, family discturbine: ok"), out.toString());
    }

    @Test
    void resultsAloneGoToStandardOutput() throws IOException {
        run("crosscheck", table(GOOD, WRONG));
        assertFalse(out.toString().contains("separator"), "file remarks are messages");
        assertTrue(err.toString().lines().allMatch(l -> l.contains("cases.csv")), err.toString());
    }

    @Test
    void tablesFitTheirWidthAndCarryTheCaution() throws IOException {
        run("crosscheck", table(GOOD, ASSUMING, WRONG));
        assertTrue(out.toString().contains("torque"));
        int powers = out.toString().split("power number by", -1).length - 1;
        int cautions = out.toString().split("Power and torque are estimates", -1).length - 1;
        assertEquals(powers, cautions, "the caution stands with every table of power and torque");
        assertEquals(2, powers);
        run("candidates");
        run("help");
        assertEquals(List.of(), out.toString().lines().filter(l -> l.length() > 120).toList());
    }

    @Test
    void neverSaysSafe() throws IOException {
        run("crosscheck", table(GOOD, ASSUMING, WRONG));
        run("candidates");
        run("demo");
        run("help");
        assertFalse(out.toString().matches("(?is).*\\bsafe\\b.*"));
    }

    @Test
    void everyCandidateSaysWhyOrWhyNot() throws IOException {
        run("crosscheck", table(GOOD));
        for (String id : CATALOGUE.correlations(Quantity.POWER_NUMBER, "discturbine").stream()
                .map(Object::toString).toList()) {
            assertTrue(out.toString().matches("(?s).*" + id.replace(".", "\\.") + " +[a-z-]+ [-+. 0-9]+\n +(recommended|qualifies|excluded|chosen).*"), id);
        }
    }

    @Test
    void demoWritesWhatItSaysAndExitsWithZero() throws IOException {
        assertEquals(0, run("demo"));
        assertTrue(out.toString().contains("invented"));
        assertTrue(out.toString().contains("Cases: 4 ok, 1 flagged, 0 refused."), out.toString());
        String kept = out.toString().lines().filter(l -> l.startsWith("Everything in this demo")).findFirst().orElseThrow();
        Path files = Path.of(kept.substring(kept.lastIndexOf(": ") + 2));
        for (String name : List.of("glaze-slip.csv", "glaze-slip.stir", "results.csv", "results.json", "candidates.csv")) {
            assertTrue(Files.size(files.resolve(name)) > 0, name);
        }
    }

    @Test
    void aStudyIsCrossCheckedLikeATable() throws IOException {
        Path study = Demo.copyTo(folder);
        assertEquals(1, run("crosscheck", study.resolveSibling(Demo.TABLE).toString()), err::toString);
        String ofTable = out.toString();
        out.getBuffer().setLength(0);
        assertEquals(1, run("crosscheck", study.toString()), err::toString);
        assertEquals(ofTable, out.toString());
    }

    @Test
    void aRefusedCaseOfAStudyIsNamed() throws IOException {
        Path study = Demo.copyTo(folder);
        Files.writeString(study, Files.readString(study).replace(" vessel=\"vessel-1\" impeller=\"impeller-2\"", ""));
        assertEquals(2, run("crosscheck", study.toString()));
        assertTrue(err.toString().contains("glaze-slip.stir case 4 (case 'hold-pitched'): vessel is missing"), err.toString());
        Files.writeString(study, Files.readString(study).replace("</study:Study>", ""));
        assertEquals(3, run("crosscheck", study.toString()));
        assertTrue(err.toString().contains("glaze-slip.stir: line "), err.toString());
    }

    @Test
    void outWritesEveryRequestedFile() throws IOException {
        Path csv = folder.resolve("r.csv");
        Path json = folder.resolve("r.json");
        Path candidates = folder.resolve("c.csv");
        assertEquals(0, run("crosscheck", table(GOOD), "--out", csv.toString(), "--out", json.toString(),
                "--candidates", candidates.toString()), err::toString);
        assertTrue(Files.readString(csv).startsWith("case,family,correlation,role,verdict,failed_bounds,regime,speed_rev_s,"));
        assertTrue(Files.readString(json).contains("\"9.9.9\""));
        assertTrue(Files.readString(candidates).startsWith("case,quantity,correlation,value,role,verdict,"));
        for (String quantity : List.of("power-number", "shear-rate-constant", "flow-number", "blend-time")) {
            assertTrue(Files.readString(candidates).contains("good," + quantity + ","), quantity);
            assertTrue(Files.readString(json).contains("\"" + quantity + "\""), quantity);
        }
        assertEquals(3, run("crosscheck", table(GOOD), "--out", folder.resolve("r.ods").toString()));
        assertTrue(err.toString().contains(".csv"), err.toString());
    }

    @Test
    void candidatesListsEveryCardWithItsSource() {
        assertEquals(0, run("candidates"));
        // General relations speak of families, too, that are not in this catalogue; those have no card here.
        CATALOGUE.entries().stream().map(e -> e.correlation())
                .filter(c -> CATALOGUE.families().stream().anyMatch(family -> c.holdsFor(family.id())))
                .forEach(c -> assertTrue(out.toString().contains(c.id()), c.id()));
        assertTrue(out.toString().contains("Np = 2.512 (t/D)^-0.195 (T/T0)^0.063"));
        assertTrue(out.toString().contains("Chem. Eng. Sci. 42 (1987) 317-326"));
    }

    @Test
    void fitPrintsEveryModelWithIntervals() throws IOException {
        Path curve = folder.resolve("slip.csv");
        Files.writeString(curve, "shear_rate_1_s,shear_stress_Pa\n1,5\n3,6.2\n10,8.7\n30,13\n100,22\n300,39\n");
        assertEquals(0, run("fit", curve.toString()), err::toString);
        for (ModelKind kind : ModelKind.values()) {
            assertTrue(out.toString().contains("  " + kind.id() + " "), kind + " in\n" + out);
        }
        assertTrue(out.toString().contains("slip: 6 points, shear rate 1 to 300 1/s; relative error, intervals of 95 %"), out.toString());
        assertTrue(out.toString().contains("yield stress from "), out.toString());
    }

    @Test
    void fitComparesRampsAndPoolsReplicates() throws IOException {
        Path curve = folder.resolve("paint.csv");
        // invented: five points up, five down, two times; the rising stresses are a quarter higher
        StringBuilder text = new StringBuilder("shear rate 1/s;shear stress Pa\n");
        for (double replicate : new double[] {1.01, 0.99}) {
            for (double rate : new double[] {1, 3, 10, 30, 100}) {
                text.append(rate).append(';').append(5 * replicate * Math.sqrt(rate)).append('\n');
            }
            for (double rate : new double[] {100, 30, 10, 3, 1}) {
                text.append(rate).append(';').append(4 * replicate * Math.sqrt(rate)).append('\n');
            }
        }
        Files.writeString(curve, text.toString());
        run("fit", curve.toString());
        assertTrue(out.toString().contains("1 more, pooled: 10 points"), out.toString());
        assertTrue(out.toString().replaceAll("\\s+", " ").contains("stress up over down 1.250 at 1, 1.250 at 10, 1.250 at 100 1/s"),
                out.toString());
    }

    @Test
    void fitTellsFilesOfOneNameApartAndGoesOnWithoutABadOne() throws IOException {
        String points = "shear_rate_1_s,shear_stress_Pa\n1,5\n3,6.2\n10,8.7\n30,13\n100,22\n300,39\n";
        Path first = Files.writeString(Files.createDirectory(folder.resolve("a")).resolve("run.csv"), points);
        Path second = Files.writeString(Files.createDirectory(folder.resolve("b")).resolve("run.csv"), points.replace(",39", ",38"));
        Path empty = Files.writeString(folder.resolve("empty.csv"), "");
        Path table = folder.resolve("out.csv");
        assertEquals(3, run("fit", first.toString(), empty.toString(), second.toString(), "--out", table.toString()));
        assertTrue(err.toString().contains("empty.csv: is empty"), err.toString());
        List<String> curves = Files.readAllLines(table).stream().skip(1).map(line -> line.split(",")[0]).distinct().toList();
        assertEquals(List.of("run", "run of " + second), curves);
        assertEquals(3, run("fit", first.toString(), "--out", folder.resolve("new.csv").toString(), "--out", "new.doc"));
        assertFalse(Files.exists(folder.resolve("new.csv")), "nothing is written when an output cannot be");
    }

    @Test
    void fitSaysWarningsLast() throws IOException {
        Path curve = folder.resolve("slip.csv");
        Files.writeString(curve, "shear rate 1/s;shear stress Pa;viscosity Pa s\n1;5;5000\n3;6,2;2067\n10;8,7;870\n30;13;433\n100;22;220\n300;39;130\n");
        assertEquals(1, run("fit", curve.toString()));
        List<String> lines = err.toString().lines().toList();
        assertTrue(lines.getLast().startsWith("slip.csv: warning: "), err.toString());
        assertTrue(lines.getLast().contains("1000 times"), err.toString());
    }

    @Test
    void fitAsksForTheDecimalSignThatNothingTells() throws IOException {
        Path curve = Files.writeString(folder.resolve("three.csv"),
                "shear rate 1/s;shear stress Pa\n1;16.000\n3;18.558\n10;23.274\n30;30.483\n100;44.773\n300;66.125\n");
        assertEquals(3, run("fit", curve.toString()));
        assertTrue(err.toString().contains("so it may be a decimal sign or part thousands"), err.toString());
        assertEquals(0, run("fit", curve.toString(), "--decimal-sign", "point"), err::toString);
        assertTrue(out.toString().contains("three: 6 points"), out.toString());
        assertEquals(3, run("fit", curve.toString(), "--decimal-sign", "dot"));
        assertTrue(err.toString().contains("--decimal-sign dot: must be point or comma"), err.toString());
    }

    @Test
    void fitReadsAsATemplateSays() throws IOException {
        Path curve = folder.resolve("odd.csv");
        Files.writeString(curve, "a;b;c\n1;10;5\n3;30;6,2\n10;100;8,7\n30;300;13\n100;1000;22\n300;3000;39\n");
        Path template = folder.resolve("odd.import");
        Files.writeString(template, "column = 2|shear-rate|1/s|\ncolumn = 3|shear-stress|Pa|\ncolumn = 1|not-read||\n");
        assertEquals(0, run("fit", curve.toString(), "--template", template.toString()), err::toString);
        assertTrue(out.toString().contains("shear rate 10 to 3000 1/s"), out.toString());
        assertEquals(3, run("fit", curve.toString(), "--template", folder.resolve("none.import").toString()));
        assertTrue(err.toString().contains("there is no such"), err.toString());
    }

    @Test
    void versionAndHelpWork() {
        assertEquals(0, run("--version"));
        assertEquals("Stirwright 9.9.9", out.toString().strip());
        assertEquals(0, run());
        assertEquals(0, run("help", "crosscheck"));
        assertTrue(out.toString().contains("--candidates"), out.toString());
    }

    @Test
    void windowIsInTheHelpAndOpensWithNothingElseOnTheLine() {
        assertEquals(0, run("help"));
        assertTrue(out.toString().contains("Alone it opens the") && out.toString().contains("  open "), out::toString);
        assertEquals(3, run("open", "--", "mud.study"));
        assertTrue(err.toString().contains("'stirwright open mud.study' and nothing else"), err::toString);
    }

    @ParameterizedTest
    @ValueSource(strings = {"crosschek", "crosscheck", "crosscheck a b", "crosscheck a --nonsense", "help nonsense",
            "candidates --out", "fit", "check some.jar", "--nonsense"})
    void wrongUseIsOneLineOnStandardErrorAndExitsWithThree(String line) {
        assertEquals(3, run(line.split(" ")));
        assertEquals("", out.toString());
        assertEquals(1, err.toString().lines().count(), err.toString());
    }

    @Test
    void cardsAreWrittenWhereAskedFor() throws IOException {
        Path cards = folder.resolve("cards");
        assertEquals(0, run("cards", "--out", cards.toString()), err::toString);
        assertTrue(out.toString().contains(cards.resolve("index.html").toString()), out::toString);
        for (var entry : CATALOGUE.entries()) {
            assertTrue(Files.exists(cards.resolve("card-" + entry.correlation().id() + ".html")), entry.correlation()::id);
        }
    }

    @Test
    void cardsLeaveAFolderOfSomebodyElseAlone() throws IOException {
        Path index = Files.writeString(folder.resolve("index.html"), "mine");
        assertEquals(3, run("cards", "--out", folder.toString()));
        assertTrue(err.toString().contains(folder.toString()), err::toString);
        assertEquals("mine", Files.readString(index));
    }

    @Test
    void cardsThatCannotBeWrittenSayWhy() throws IOException {
        Path file = Files.writeString(folder.resolve("afile"), "");
        assertEquals(3, run("cards", "--out", file.toString()));
        assertTrue(err.toString().contains("is a file and not a folder; name another folder"), err::toString);
    }
}
