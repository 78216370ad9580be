package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static stirwright.exchange.Refusals.assertRefused;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import stirwright.core.CandidateResult;
import stirwright.core.CaseResult;
import stirwright.core.Choices;
import stirwright.core.Refusal;
import stirwright.study.Constant;
import stirwright.study.OwnConstants;
import stirwright.study.StudyFactory;

/** Effects left out and constants of the case's own, as a cell of a table and as elements of a study. */
class ByHandTest {
    @TempDir
    Path folder;

    private CaseEntry entry(String column, String text) {
        return Sheet.good().with(column, text).entry(folder);
    }

    private static Choices choices(CaseEntry entry) {
        return entry.spec().orElseThrow(() -> new AssertionError(entry.refusal().toString())).choices();
    }

    @Test
    void effectsStandBetweenBlanksOrCommasOrSemicolons() {
        assertEquals(Set.of("baffles", "clearance"), choices(entry("effects_left_out", " baffles   clearance ")).effectsLeftOut());
        assertEquals(Set.of("baffles"), choices(entry("effects_left_out", "baffles baffles")).effectsLeftOut());
        assertEquals(Set.of("baffles", "clearance"), choices(entry("effects_left_out", "\"baffles, clearance\"")).effectsLeftOut());
        assertEquals(Set.of("baffles", "clearance"), choices(entry("effects_left_out", "\";baffles;clearance,\"")).effectsLeftOut());
        assertEquals(Choices.NONE, choices(entry("effects_left_out", "")));
    }

    @Test
    void constantsStandBehindTheIdOfTheirCorrelation() {
        assertEquals(Map.of("a.np.b", Map.of("k", 6.5)), choices(entry("constants", "a.np.b k=6.5")).constants());
        assertEquals(Map.of("a.np.b", Map.of("a", -1.0, "b", 2e-3), "c.np.d", Map.of("e", 0.5)),
                choices(entry("constants", " a.np.b a=-1  b = 2e-3 ;c.np.d e=.5; ")).constants());
        assertEquals(Map.of("a.np.b", Map.of("a", 1.0, "b", 2.0)),
                choices(entry("constants", "a.np.b a=1; a.np.b b=2")).constants());
    }

    @Test
    void aFileWithDecimalCommasHasThemHereToo() {
        String header = Sheet.good().with("constants", "").header().replace(',', '\t');
        CaseTable read = Sheet.read(folder, header + "\nA\tblades\t0,5\t1,5\t4\t2\t1000\tnewtonian\t0,1\tblades.np.firm c=6,5\n");
        assertEquals(Map.of("blades.np.firm", Map.of("c", 6.5)), choices(read.entries().get(0)).constants());
    }

    @Test
    void theDecimalSignIsToldByConstantsToo() {
        String header = Sheet.good().with("constants", "").header().replace(',', '\t');
        CaseTable read = Sheet.read(folder, header + "\nA\tblades\t1\t2\t4\t2\t1000\tnewtonian\t1\tblades.np.firm c = 6,5\n");
        assertEquals(Map.of("blades.np.firm", Map.of("c", 6.5)), choices(read.entries().get(0)).constants());
        assertTrue(read.messages().toString().contains("decimal comma"), read.messages().toString());
    }

    @Test
    void betweenSemicolonsTwoIdsNeedQuotes() {
        String header = Sheet.good().with("constants", "").header().replace(',', ';');
        String row = "blades;1;2;4;2;1000;newtonian;1;";
        CaseTable read = Sheet.read(folder, header + "\nA;" + row + "\"blades.np.firm c=6; blades.ks.ten c=6\"\nB;" + row
                + "blades.np.firm c=6; blades.ks.ten c=6\n");
        assertEquals(Set.of("blades.np.firm", "blades.ks.ten"), choices(read.entries().get(0)).constants().keySet());
        assertRefused(read.entries().get(1), "column 11", "blades.ks.ten c=6", "between semicolons", "quotes");
    }

    @Test
    void whatCannotBeReadIsNamedAndTheFormIsShown() {
        refused("k=6.5", "'k=6.5'", "id of a correlation");
        refused("a.np.b", "'a.np.b'", "no constant");
        refused("a.np.b k", "'k'", "name and a value");
        refused("a.np.b =3", "'a.np.b=3'", "id of a correlation");
        refused("a.np.b k=", "'k='", "not a plain decimal");
        refused("a.np.b k=six", "'k=six'", "not a plain decimal");
        refused("a.np.b k=1e999", "'k=1e999'", "double precision");
        refused("a.np.b k=1 k=2", "'k'", "twice");
        refused("a.np.b k=1; a.np.b k=2", "'k'", "twice");
    }

    private void refused(String text, String... parts) {
        CaseEntry entry = entry("constants", text);
        assertRefused(entry, "constants", text, parts);
        assertTrue(entry.refusal().orElseThrow().reason().contains("write 'id name=value'"));
    }

    @Test
    void theCoreRefusesWithTheWholeCell() {
        Refusal unknown = entry("effects_left_out", "baffles wobble").check(Invented.CROSS_CHECK).refusal().orElseThrow();
        assertEquals("effects_left_out", unknown.field());
        assertEquals("baffles wobble", unknown.value());
        assertTrue(unknown.reason().contains("'wobble'") && unknown.reason().contains("baffles, clearance"), unknown.reason());
        Refusal constant = entry("constants", "blades.np.firm d=1").check(Invented.CROSS_CHECK).refusal().orElseThrow();
        assertEquals("constants", constant.field());
        assertTrue(constant.reason().contains("'d'") && constant.reason().contains("c = 5"), constant.reason());
    }

    @Test
    void theChangedCorrelationIsARowAndCanBeChosen() {
        CaseResult result = Sheet.good().with("constants", "blades.np.firm c=6")
                .with("correlation", "blades.np.firm-changed").entry(folder).check(Invented.CROSS_CHECK);
        CandidateResult pick = result.pick().orElseThrow();
        assertEquals("blades.np.firm-changed", pick.correlation());
        // 6 * 1000 * 2^3 * 0.5^5
        assertEquals(1500, pick.power(), 1e-9);
        assertEquals(List.of("blades.np.firm"), result.candidates().stream().map(CandidateResult::correlation)
                .filter("blades.np.firm"::equals).toList());
    }

    @Test
    void aStudySaysTheSame() {
        InventedStudy study = new InventedStudy();
        study.good.getLeftOut().add("baffles");
        OwnConstants.set(study.good, "blades.np.firm", "c", 0.1 + 0.2);
        OwnConstants.set(study.good, "blades.ks.ten", "c", 6);
        CaseEntry table = Sheet.good().with("effects_left_out", "baffles")
                .with("constants", "blades.np.firm c=0.30000000000000004; blades.ks.ten c=6").entry(folder);
        assertEquals(choices(table), choices(study.entry()));
        Choices compared = choices(StudyCases.entry(study.good, Invented.CATALOGUE, "plate"));
        assertEquals(choices(table).effectsLeftOut(), compared.effectsLeftOut(), "a vessel is one vessel for all families");
        assertEquals(choices(table).constants(), compared.constants());
    }

    @Test
    void aHalfConstantOfAStudyIsRefused() {
        InventedStudy study = new InventedStudy();
        Constant half = StudyFactory.eINSTANCE.createConstant();
        half.setCorrelation("blades.np.firm");
        half.setName("c");
        study.good.getConstants().add(half);
        assertRefused(study.entry(), "constants", "", "lacks", "value");
        half.setValue(3);
        assertEquals(Map.of("blades.np.firm", Map.of("c", 3.0)), choices(study.entry()).constants());
    }
}
