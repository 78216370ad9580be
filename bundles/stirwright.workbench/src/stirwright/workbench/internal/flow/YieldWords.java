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
        lines.add(Messages.bind(FlowWords.Yield_range, Figures.show(range.low()), Figures.show(range.high())));
        for (YieldRange.Source source : range.sources()) {
            String value = Messages.bind(FlowWords.Yield_source, new Object[] {ModelTitles.inWords(source.name()), Figures.show(source.value()),
                source.interval().known() ? " (" + ModelRow.range(source.interval()) + ")" : ""});
            lines.add(source.counted() ? value : Messages.bind(FlowWords.Yield_leftOut, value, source.why()));
        }
        return lines;
    }
}
