package stirwright.workbench.internal.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import stirwright.rheology.Interval;
import stirwright.rheology.YieldRange;

/** Who says what of the yield stress, in sentences. */
class YieldWordsTest {
    private static final YieldRange.Source FIT = new YieldRange.Source("bingham, up ramps", 12, new Interval(11, 13), true, "");
    private static final YieldRange.Source MISSES =
            new YieldRange.Source("casson, up ramps", 3, Interval.NONE, false, "misses the curve by 20 % on average");
    private static final YieldRange.Source AT_REST = new YieldRange.Source(YieldRange.STATIC, 60, Interval.NONE, true, "");
    private static final String START_UP =
            "static, as given for the fluid: 60 Pa; start-up after rest needs its own check with the maker of the drive";

    @Test
    void theStaticOneIsNamedAsASource() {
        List<String> lines = YieldWords.of(new YieldRange(11, 60, List.of(FIT, AT_REST)));
        assertEquals("from 11 to 60 Pa, over models, ramps, their intervals and the static yield stress; kept with the fluid when a"
                + " model is picked", lines.get(0));
        assertEquals(START_UP, lines.get(2));
    }

    @Test
    void withoutOneNothingIsSaidOfIt() {
        assertEquals("from 11 to 13 Pa, over models, ramps and their intervals; kept with the fluid when a model is picked",
                YieldWords.of(new YieldRange(11, 13, List.of(FIT))).get(0));
    }

    @Test
    void aloneItIsNoRange() {
        assertEquals(List.of("60 Pa, the static yield stress alone: no model with a yield stress describes the points",
                        "Casson, up ramps: 3 Pa; left out, misses the curve by 20 % on average", START_UP),
                YieldWords.of(new YieldRange(60, 60, List.of(MISSES, AT_REST))));
        YieldRange without = YieldRange.of(Map.of(), OptionalDouble.of(60)).orElseThrow();
        assertEquals(START_UP, YieldWords.of(without).getLast());
    }
}
