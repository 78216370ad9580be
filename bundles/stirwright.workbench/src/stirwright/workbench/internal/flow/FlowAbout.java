package stirwright.workbench.internal.flow;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import stirwright.correlation.Figures;
import stirwright.rheology.MeasuredWindow;
import stirwright.rheology.RankedFits;
import stirwright.rheology.TemperatureLaw;
import stirwright.rheology.YieldRange;
import stirwright.workbench.internal.Messages;

/** What is to be said of the curves whichever model is selected: how they were fitted, where the case is, where they come from. */
final class FlowAbout {
    private final FlowRequest request;
    private final Optional<RankedFits> fits;
    private final MeasuredWindow window;
    private final Ramps ramps;
    private final Optional<YieldRange> yield;
    private final Optional<TemperatureLaw> law;
    private final List<Section> sections = new ArrayList<>();

    FlowAbout(FlowRequest request, Optional<RankedFits> fits, MeasuredWindow window, Ramps ramps,
            Optional<YieldRange> yield, Optional<TemperatureLaw> law) {
        this.request = request;
        this.fits = fits;
        this.window = window;
        this.ramps = ramps;
        this.yield = yield;
        this.law = law;
    }

    List<Section> sections() {
        add(FlowWords.About_inUse, request.reason().isEmpty() ? List.of() : List.of(request.reason()));
        add(FlowWords.About_fit, fit());
        add(FlowWords.About_rates, request.rates().stream().map(this::rate).toList());
        add(FlowWords.About_ramps, RampWords.of(ramps.pairs(), request.rates()));
        add(FlowWords.About_yield, yield.map(YieldWords::of).orElse(List.of()));
        add(FlowWords.About_temperature, law.map(TemperatureWords::of).orElse(List.of()));
        add(FlowWords.About_dropped, request.curves().stream()
                .flatMap(c -> c.dropped().stream().map(d -> named(c, d))).toList());
        add(FlowWords.About_readAs, request.curves().stream().flatMap(c -> c.readAs().stream()).distinct().toList());
        add(FlowWords.About_sources, sources());
        return sections;
    }

    private void add(String title, List<String> lines) {
        if (!lines.isEmpty()) {
            sections.add(new Section(title, lines));
        }
    }

    private String named(CurveData curve, String sentence) {
        return request.curves().size() == 1 ? sentence : Messages.bind(FlowWords.About_of, curve.label(), sentence);
    }

    private List<String> fit() {
        List<String> lines = new ArrayList<>();
        request.target().ifPresent(t -> {
            int points = t.curves().stream().mapToInt(CurveData::usable).sum();
            int measured = t.curves().stream().mapToInt(c -> c.rates().length).sum();
            lines.add(Messages.bind(FlowWords.Fit_points, points, t.title()));
            if (points < measured) {
                lines.add(Messages.bind(FlowWords.Fit_notAboveZero, measured - points));
            }
            lines.add(FlowWords.Fit_weighting);
            lines.add(request.options().robust() ? FlowWords.Fit_robust : FlowWords.Fit_alike);
            if (t.mixesTemperatures()) {
                lines.add(FlowWords.Fit_mixedTemperatures);
            }
            if (t.mixesRamps()) {
                lines.add(FlowWords.Fit_mixedRamps);
            }
        });
        if (request.target().isPresent() && fits.isEmpty()) {
            lines.add(FlowWords.Fit_tooFew);
        }
        if (request.target().isEmpty() && !request.curves().isEmpty()) {
            lines.add(FlowWords.Fit_noneUsed);
        }
        return lines;
    }

    private String rate(NamedRate rate) {
        String beyond = FlowPicture.beyond(rate, window);
        return Messages.bind(FlowWords.Rate_line, new Object[] {rate.name(), Figures.show(rate.rate()),
            !window.known() ? FlowWords.Rate_unknown : beyond.isEmpty() ? FlowWords.Rate_inside : Messages.bind(FlowWords.Rate_outside, beyond)});
    }

    /** Each file once with its hash, its curves below it. */
    private List<String> sources() {
        List<String> lines = new ArrayList<>();
        Map<List<String>, List<CurveData>> files = request.curves().stream().filter(c -> !c.source().isEmpty())
                .collect(Collectors.groupingBy(c -> List.of(c.source(), c.sha256()), LinkedHashMap::new, Collectors.toList()));
        files.forEach((file, curves) -> {
            lines.add(file.get(1).isEmpty() ? file.get(0) : Messages.bind(FlowWords.Source_file, file.get(0), file.get(1)));
            curves.forEach(c -> lines.add(Messages.bind(FlowWords.Source_curve, new Object[] {c.label(), c.rates().length,
                c.block().isEmpty() ? "" : Messages.bind(FlowWords.Source_block, c.block()), temperature(c.temperature())})));
        });
        return lines;
    }

    /** "25 °C", or words where it is not known. */
    static String temperature(double temperature) {
        return Double.isNaN(temperature) ? FlowWords.Temperature_unknown : Messages.bind(FlowWords.Temperature, Figures.show(temperature));
    }
}
