package stirwright.workbench.internal.flow;

import java.util.ArrayList;
import java.util.List;
import stirwright.correlation.Figures;
import stirwright.rheology.YieldRange;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.session.ModelTitles;

/** Between which values the yield stress lies and who says so, in sentences. */
final class YieldWords {

    private YieldWords() {}

    static List<String> of(YieldRange range) {
        List<String> lines = new ArrayList<>();
        String words = !atRest(range) ? FlowWords.Yield_range : fitted(range) ? FlowWords.Yield_rangeStatic : FlowWords.Yield_staticAlone;
        lines.add(Messages.bind(words, Figures.show(range.low()), Figures.show(range.high())));
        for (YieldRange.Source source : range.sources()) {
            if (isStatic(source)) {
                lines.add(Messages.bind(FlowWords.Yield_static, Figures.show(source.value())));
                continue;
            }
            String value = Messages.bind(FlowWords.Yield_source, new Object[] {ModelTitles.inWords(source.name()), Figures.show(source.value()),
                source.interval().known() ? " (" + ModelRow.range(source.interval()) + ")" : ""});
            lines.add(source.counted() ? value : Messages.bind(FlowWords.Yield_leftOut, value, source.why()));
        }
        return lines;
    }

    private static boolean isStatic(YieldRange.Source source) {
        return source.name().equals(YieldRange.STATIC);
    }

    private static boolean atRest(YieldRange range) {
        return range.sources().stream().anyMatch(YieldWords::isStatic);
    }

    /** Whether a model counts. */
    private static boolean fitted(YieldRange range) {
        return range.sources().stream().anyMatch(s -> s.counted() && !isStatic(s));
    }
}
