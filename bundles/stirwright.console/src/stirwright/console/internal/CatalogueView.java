package stirwright.console.internal;

import java.io.PrintWriter;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import stirwright.core.Catalogue;
import stirwright.core.Entry;
import stirwright.correlation.Bound;
import stirwright.correlation.Correlation;
import stirwright.correlation.Effect;
import stirwright.correlation.Family;
import stirwright.correlation.Figures;
import stirwright.correlation.FlowKind;
import stirwright.correlation.RegimeLimits;

/** The installed families and correlations laid out for reading, at most 120 columns wide. */
final class CatalogueView {
    private final PrintWriter out;

    CatalogueView(PrintWriter out) {
        this.out = out;
    }

    void print(Catalogue catalogue) {
        List<Family> families = catalogue.families().stream().sorted(Comparator.comparing(Family::id)).toList();
        List<Entry> entries = catalogue.entries().stream()
                .sorted(Comparator.comparing((Entry e) -> e.correlation().quantity().id())
                        .thenComparing(e -> e.correlation().id()))
                .toList();
        StringBuilder text = new StringBuilder();
        for (Family family : families) {
            line(text, 0, family.id() + ": " + family.title() + " (" + catalogue.originOf(family) + ")");
            line(text, 2, family.description());
            line(text, 2, regimes(family.regimes()));
            family.regimes().shearThinning().ifPresent(
                    thinning -> line(text, 2, "shear-thinning fluids: " + regimes(thinning)));
            text.append('\n');
            entries.stream().filter(e -> e.correlation().families().contains(family.id()))
                    .forEach(e -> card(text, e));
        }
        if (entries.stream().anyMatch(e -> e.correlation().families().isEmpty())) {
            line(text, 0, "for any family");
            text.append('\n');
            entries.stream().filter(e -> e.correlation().families().isEmpty()).forEach(e -> card(text, e));
        }
        line(text, 0, families.size() + " families, " + entries.size() + " correlations. Symbols and units:"
                + " 'stirwright help tables'.");
        out.print(text);
        out.flush();
    }

    private static String regimes(RegimeLimits limits) {
        return "laminar up to Reynolds number " + Figures.show(limits.laminarUpTo()) + ", turbulent from "
                + Figures.show(limits.turbulentFrom()) + "; " + limits.citation()
                + (limits.remark().isEmpty() ? "" : ". " + limits.remark());
    }

    private static void card(StringBuilder text, Entry entry) {
        Correlation c = entry.correlation();
        line(text, 2, c.id() + ": " + c.quantity().title()
                + c.modifierFor().map(e -> ", factor for " + e.title() + " (" + e.id() + ")").orElse("")
                + c.flowKind().map(FlowKind::id).map(k -> ", " + k).orElse(""));
        line(text, 6, c.formula());
        if (!c.constants().names().isEmpty()) {
            line(text, 6, "constants: " + String.join(", ", c.constants().names().stream()
                    .map(name -> name + " = " + Figures.show(c.constants().get(name))).toList()));
        }
        line(text, 6, "range: " + String.join("; ", c.validity().stream().map(Bound::words).toList()));
        line(text, 6, "source: " + c.citation());
        line(text, 6, (c.citation().hasSource() ? c.standing().words() : "rule of the trade") + "; digits " + c.transcription().words()
                + (c.scatter().isPresent()
                        ? String.format(Locale.ROOT, "; scatter %.0f %%", 100 * c.scatter().getAsDouble()) : "")
                + (c.contains().isEmpty() ? ""
                        : "; contains " + String.join(", ", c.contains().stream().map(Effect::title).toList())));
        c.remarks().forEach(r -> line(text, 6, r));
        text.append('\n');
    }

    private static void line(StringBuilder text, int indent, String words) {
        Columns.appendWrapped(text, " ".repeat(indent), words, CaseView.WIDTH);
    }
}
