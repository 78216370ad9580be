package stirwright.workbench.internal.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import stirwright.rheology.HerschelBulkley;
import stirwright.rheology.MeasuredWindow;
import stirwright.rheology.ModelKind;
import stirwright.workbench.internal.session.ModelTitles;

/** What curves are fitted together, and words about them. */
class FitTargetTest {

    private static CurveData curve(String label, String ramp, double temperature, boolean used) {
        return new CurveData(label, "a.csv", "", "1", ramp, 1, temperature, used, 0, new double[] {1, 10, 100}, new double[] {2, 5, 12},
                List.of(), List.of());
    }

    private static List<String> titles(CurveData... curves) {
        return FitTarget.of(List.of(curves)).stream().map(FitTarget::title).toList();
    }

    @Test
    void oneCurveIsFittedAsItIs() {
        assertEquals(List.of("a"), titles(curve("a", "up", 25, true)));
        assertEquals(List.of(), titles(curve("a", "up", 25, false)));
    }

    @Test
    void replicatesArePooledFirst() {
        assertEquals(List.of("all used curves together", "only a", "only b"), titles(curve("a", "up", 25, true), curve("b", "up", 25.4, true),
                curve("set aside", "up", 25, false)));
    }

    /** 2 K, as on the command line and in the import. */
    @Test
    void whatCountsAsOneTemperatureDoesSoEverywhere() {
        assertEquals(List.of("all used curves together", "only a", "only b"),
                titles(curve("a", "up", 25, true), curve("b", "up", 27, true)));
        assertEquals(List.of("up ramps, 25 \u00B0C", "up ramps, 27.1 \u00B0C"),
                titles(curve("a", "up", 25, true), curve("b", "up", 27.1, true)).subList(0, 2));
    }

    /** 22 is within 2 K of 20 and of 23, and belongs to the colder one alone. */
    @Test
    void eachCurveHasOneTemperature() {
        List<CurveData> curves = List.of(curve("c", "up", 23, true), curve("?", "up", Double.NaN, true), curve("a", "up", 20, true),
                curve("b", "up", 22, true), curve("!", "down", Double.NaN, true));
        assertEquals(List.of(List.of("a", "b"), List.of("c"), List.of("?", "!")),
                FitTarget.byTemperature(curves).stream().map(here -> here.stream().map(CurveData::label).toList()).toList());
        assertEquals(List.of(20.0, 23.0, Double.NaN), FitTarget.temperatures(curves));
        FitTarget cold = FitTarget.of(curves).stream().filter(t -> t.title().equals("up ramps, 20 \u00B0C")).findFirst().orElseThrow();
        assertEquals(List.of("a", "b"), cold.curves().stream().map(CurveData::label).toList());
        assertFalse(cold.mixesTemperatures());
    }

    @Test
    void rampsAndTemperaturesAreNotMixedUnlessAskedFor() {
        assertEquals(List.of("up ramps", "curves without a ramp", "down ramps", "all used curves together", "only d", "only n", "only u"),
                titles(curve("d", "down", 25, true), curve("n", "", 25, true), curve("u", "up", 25, true)));
        assertEquals(List.of("up ramps, 10 \u00B0C", "up ramps, 40 \u00B0C", "up ramps, temperature not known"),
                titles(curve("warm", "up", 40, true), curve("cold", "up", 10, true), curve("?", "up", Double.NaN, true)).stream()
                        .filter(t -> t.startsWith("up")).sorted().toList());
        List<FitTarget> targets = FitTarget.of(List.of(curve("u", "up", 25, true), curve("d", "down", 40, true)));
        assertFalse(targets.get(0).mixesRamps() || targets.get(0).mixesTemperatures());
        FitTarget all = targets.stream().filter(t -> t.key().equals("all")).findFirst().orElseThrow();
        assertTrue(all.mixesRamps() && all.mixesTemperatures());
    }

    @Test
    void theDistanceFromWhatWasMeasuredIsInDecades() {
        MeasuredWindow window = new MeasuredWindow(0.1, 100);
        assertEquals("", FlowPicture.beyond(new NamedRate("a", 100), window));
        assertEquals("1.5 decades above", FlowPicture.beyond(new NamedRate("a", 100 * Math.pow(10, 1.5)), window));
        assertEquals("2.0 decades below", FlowPicture.beyond(new NamedRate("a", 0.001), window));
        assertEquals("0.1 decades above", FlowPicture.beyond(new NamedRate("a", 101), window), "a little is not nothing");
        assertEquals("", FlowPicture.beyond(new NamedRate("a", 1), MeasuredWindow.UNKNOWN));
    }

    @Test
    void sentencesHaveTheTitlesOfModels() {
        assertEquals("Herschel-Bulkley: better than Power law, not pre-bingham",
                ModelTitles.inWords("herschel-bulkley: better than power-law, not pre-bingham"));
    }

    @Test
    void sixDigitsOfAModelAreKept() {
        double[] kept = ModelKind.values(FluidEdits.kept(new HerschelBulkley(11.7498566521, 0.000331000896, 0.43327029535)));
        assertEquals(11.7499, kept[0], 0);
        assertEquals(0.000331001, kept[1], 0);
        assertEquals(0.43327, kept[2], 0);
    }
}
