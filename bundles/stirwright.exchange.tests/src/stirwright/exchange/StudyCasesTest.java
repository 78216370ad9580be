package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static stirwright.exchange.Refusals.assertAccepted;
import static stirwright.exchange.Refusals.assertRefused;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import stirwright.core.CaseResult;
import stirwright.core.CaseSpec;
import stirwright.rheology.YieldBounds;
import stirwright.study.Amounts;
import stirwright.study.Case;
import stirwright.study.Parts;
import stirwright.study.StudyFactory;
import stirwright.study.StudyFiles;

/** Cases of a study are those of a table, and are refused in the same words. */
class StudyCasesTest {
    @TempDir
    Path folder;

    private final InventedStudy invented = new InventedStudy();

    private CaseSpec spec() {
        return invented.entry().spec().orElseThrow();
    }

    @Test
    void theSameCaseAsTheRowOfATable() {
        assertAccepted(invented.entry());
        assertEquals(Sheet.good().entry(folder).spec(), invented.entry().spec());
        assertEquals("case 1", invented.entry().place());
        assertEquals(0, invented.entry().line());
    }

    @Test
    void anyAmountIsTheNumberThatItIs() {
        Amounts.set(invented.impeller.getAmounts(), "impeller_diameter_m", 0.1 + 0.2);
        Amounts.set(invented.vessel.getAmounts(), "vessel_diameter_m", 1.2345678901234567e-3);
        assertEquals(0.1 + 0.2, spec().geometry().get("impeller_diameter"));
        assertEquals(1.2345678901234567e-3, spec().geometry().get("vessel_diameter"));
    }

    @Test
    void aMissingPartIsNamed() {
        invented.good.setVessel(null);
        assertRefused(invented.entry(), "vessel", "", "missing", "vessel of its study");
        invented.good.setFluid(null);
        assertRefused(invented.entry(), "fluid", "", "missing");
        invented.impeller.setFamily(" ");
        invented.good.setFluid(invented.fluid);
        invented.good.setVessel(invented.vessel);
        assertRefused(invented.entry(), "family", "", "blank");
    }

    @Test
    void valuesAreRefusedAsInATable() {
        Amounts.set(invented.fluid.getAmounts(), "viscosity_Pa_s", -0.5);
        assertRefused(invented.entry(), "viscosity_Pa_s", "-0.5");
        Amounts.remove(invented.fluid.getAmounts(), "viscosity_Pa_s");
        assertRefused(invented.entry(), "viscosity_Pa_s", "", "blank", "newtonian");
        invented.fluid.setModel(null);
        assertRefused(invented.entry(), "model", "", "blank");
    }

    @Test
    void refusalsOfTheCoreShowTheAmount() {
        Amounts.set(invented.impeller.getAmounts(), "impeller_diameter_m", 1.6);
        CaseResult result = invented.entry().check(Invented.CROSS_CHECK);
        assertEquals("impeller_diameter_m", result.refusal().orElseThrow().field());
        assertEquals("1.6", result.refusal().orElseThrow().value());
    }

    @Test
    void aFluidsAmountsMayBoundItsYieldStress() {
        invented.fluid.setModel("bingham");
        Amounts.set(invented.fluid.getAmounts(), "yield_stress_Pa", 20);
        Amounts.set(invented.fluid.getAmounts(), "plastic_viscosity_Pa_s", 1);
        Amounts.set(invented.fluid.getAmounts(), "yield_stress_low_Pa", 12);
        Amounts.set(invented.fluid.getAmounts(), "yield_stress_high_Pa", 31);
        assertEquals(new YieldBounds(12, 31), spec().fluid().yieldBounds());
        Amounts.set(invented.fluid.getAmounts(), "yield_stress_low_Pa", 25);
        assertRefused(invented.entry(), "yield_stress_low_Pa", "25", "must not be above the yield stress");
    }

    @Test
    void aFluidMayHaveAStaticYieldStress() {
        Amounts.set(invented.fluid.getAmounts(), "static_yield_stress_Pa", 45);
        assertEquals(new YieldBounds(Double.NaN, Double.NaN, 45), spec().fluid().yieldBounds());
        assertEquals(List.of(), spec().remarks());
        Amounts.set(invented.fluid.getAmounts(), "static_yield_stress_Pa", -1);
        assertRefused(invented.entry(), "static_yield_stress_Pa", "-1", "0 or greater");
    }

    @Test
    void demands() {
        invented.good.setDemand(null);
        assertRefused(invented.entry(), "speed_rpm", "", "exactly one");
        invented.good.setDemand(Amounts.of("density_kg_m3", 3));
        assertRefused(invented.entry(), "demand", "density_kg_m3", "neither a speed nor a target", "speed_rpm");
        invented.good.setDemand(Amounts.of("speed_rpm", 120));
        assertAccepted(invented.entry());
        Amounts.set(invented.good.getAmounts(), "speed_rev_s", 2);
        assertRefused(invented.entry(), "speed_rpm", "120", "speed_rev_s 2");
    }

    @Test
    void anAmountThatTwoGiveIsNobodys() {
        Amounts.set(invented.impeller.getAmounts(), "baffle_count", 2);
        assertRefused(invented.entry(), "baffle_count", "2", "impeller 'stirrer'", "4 of vessel 'kettle'", "keep one");
    }

    @Test
    void unknownAndBlankAmountsAreNotUsed() {
        Amounts.set(invented.fluid.getAmounts(), "colour", 3);
        Amounts.set(invented.fluid.getAmounts(), "model", 4);
        invented.fluid.getAmounts().add(StudyFactory.eINSTANCE.createAmount());
        Amounts.set(invented.impeller.getAmounts(), "blade_width_m", 0.1);
        invented.impeller.getAmounts().get(1).unsetValue();
        assertEquals(List.of("amount 'colour' 3 of fluid 'broth' is not known; ignored",
                "amount 'model' 4 of fluid 'broth' is not known; ignored"), spec().remarks());
        assertFalse(spec().geometry().containsKey("blade_width"));
    }

    @Test
    void namesAreUniqueInATable() {
        Case second = Parts.copy(invented.good);
        Case nameless = Parts.copy(invented.good);
        nameless.setName(null);
        invented.study.getCases().addAll(List.of(second, nameless));
        CaseTable table = StudyCases.table(invented.study, "a.stir", Invented.CATALOGUE);
        assertEquals("a.stir", table.fileName());
        assertAccepted(table.entries().get(0));
        assertRefused(table.entries().get(1), "case", "A", "case 1 and case 2");
        assertRefused(table.entries().get(2), "case", "", "blank (case 3)");
        assertEquals("case 3", table.entries().get(2).name());
        assertAccepted(StudyCases.entry(second, Invented.CATALOGUE));
    }

    @Test
    void filesAreToldByEndingAndByContent() throws IOException {
        Path study = folder.resolve("a.STIR");
        StudyFiles.write(invented.study, study);
        Path renamed = Files.copy(study, folder.resolve("a.csv"));
        Optional<CaseSpec> expected = Sheet.good().entry(folder).spec();
        for (Path file : List.of(study, renamed)) {
            assertEquals(expected, CaseTable.read(file, Invented.CATALOGUE).entries().get(0).spec());
        }
        unusable("case,family\n", "not a study");
        unusable("", "not a study");
        invented.study.getCases().clear();
        StudyFiles.write(invented.study, study);
        assertTrue(assertThrows(UnusableFileException.class, () -> CaseTable.read(study, Invented.CATALOGUE))
                .getMessage().contains("without a case"));
    }

    private void unusable(String text, String part) throws IOException {
        Path file = Files.writeString(folder.resolve("b.stir"), text);
        String said = assertThrows(UnusableFileException.class, () -> CaseTable.read(file, Invented.CATALOGUE)).getMessage();
        assertTrue(said.startsWith(file + ": ") && said.contains(part), said);
        assertEquals(said.indexOf(file.toString()), said.lastIndexOf(file.toString()), "the file is named once");
    }
}
