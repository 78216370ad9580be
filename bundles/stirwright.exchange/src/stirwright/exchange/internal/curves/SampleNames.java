package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import stirwright.exchange.BlockUse;
import stirwright.exchange.CurveQuantity;
import stirwright.exchange.Measurement;
import stirwright.exchange.Ramp;
import stirwright.exchange.internal.table.Numbers;
import stirwright.exchange.internal.table.SourceRow;
import stirwright.exchange.internal.table.Texts;

/**
 * What tells samples apart. Equal names are one sample; without any name only what stands in one table without a gap, or
 * under heads that count runs and intervals, is one.
 */
final class SampleNames {
    /** Columns that differ from block to block of one sample as well. */
    private static final List<String> NO_SAMPLE = List.of(" temp ", " temperature ", " temperatur ", " temperatura ", " time ", " zeit ",
            " temps ", " tiempo ", " date ", " datum ", " fecha ", " run ", " replicate ", " cycle ", " direction ");

    private final boolean severalTitles;
    private final boolean severalRuns;
    private final boolean severalSheets;
    private final Map<Stretch, List<Integer>> constants = new IdentityHashMap<>();
    private final Map<Ramp, List<Double>> here = new HashMap<>();
    private final Set<Stretch.Heads> heads = new HashSet<>();
    private String table = "";
    private Stretch last;

    SampleNames(List<Part> parts) {
        severalTitles = parts.stream().map(p -> p.stretch().heads.title()).distinct().count() > 1;
        severalRuns = parts.stream().map(p -> p.stretch().heads.run()).distinct().count() > 1;
        severalSheets = parts.stream().map(p -> p.stretch().sheet).distinct().count() > 1;
        Map<Stretch, List<Part>> stretches = new IdentityHashMap<>();
        parts.forEach(p -> stretches.computeIfAbsent(p.stretch(), s -> new ArrayList<>()).add(p));
        stretches.forEach((stretch, of) -> {
            if (of.size() > 1) {
                constants.put(stretch, unread(stretch, of));
            }
        });
    }

    /** Parts are asked for in their order. */
    String next(Part part, BlockUse use, double celsius) {
        String name = said(part);
        if (!name.isEmpty()) {
            return name;
        }
        boolean same = last == part.stretch();
        boolean opened = last != null && !same && last.layout != part.stretch().layout && !connected(part.stretch());
        boolean again = same && use.isCurve() && part.interrupted() && here.getOrDefault(use.ramp(), List.of()).stream()
                .anyMatch(t -> Measurement.sameTemperature(t, celsius));
        last = part.stretch();
        if (opened || again) {
            table = "table on line " + part.points().get(0).row().row.line();
            here.clear();
            heads.clear();
        }
        heads.add(last.heads);
        if (use.isCurve()) {
            here.computeIfAbsent(use.ramp(), r -> new ArrayList<>()).add(celsius);
        }
        return table;
    }

    /** Whether a head, or a sheet's name, says that it goes on with the table before; heads that come again do not. */
    private boolean connected(Stretch stretch) {
        Stretch.Heads now = stretch.heads;
        boolean headed = !(now.run() + now.block() + now.title()).isEmpty() && !heads.contains(now);
        return headed || !last.sheet.equals(stretch.sheet);
    }

    private String said(Part part) {
        Stretch stretch = part.stretch();
        Stretch.Heads heads = stretch.heads;
        if (!heads.own().isEmpty()) {
            return Stream.of(heads.own(), part.sample()).filter(w -> !w.isEmpty()).collect(Collectors.joining(" "));
        }
        boolean column = stretch.group.column(CurveQuantity.SAMPLE) != null;
        boolean beside = !column && stretch.layout.groups().size() > 1;
        String place = beside && part.sample().isEmpty() ? "sample " + stretch.group.sample() : "";
        NameWords words = NameWords.of(part.sample());
        String sample = words.numberAlone() && !beside ? part.sample() : words.sample();
        boolean named = !sample.isEmpty() && !beside;
        List<String> all = new ArrayList<>(List.of(place, sample,
                column || !severalTitles ? "" : NameWords.of(heads.title()).sample(),
                named || !severalRuns ? "" : NameWords.of(heads.run().replaceFirst("^\\S+", "")).sample(),
                named || !severalSheets ? "" : NameWords.of(stretch.sheet).sample()));
        if (!column) {
            constants.getOrDefault(stretch, List.of()).forEach(at -> all.add(value(stretch.names, part.points().get(0).row().row, at)));
        }
        return all.stream().filter(w -> !w.isEmpty()).collect(Collectors.joining(" "));
    }

    private static String value(SourceRow names, SourceRow row, int at) {
        boolean number = row.isTyped(at) || Numbers.isNumber(row.cell(at));
        return number ? Texts.show(names.cell(at)) + " " + row.cell(at) : NameWords.of(Texts.show(row.cell(at))).sample();
    }

    /** Columns that are not read, and hold one value in each part, but not the same in all. */
    private static List<Integer> unread(Stretch stretch, List<Part> parts) {
        List<Integer> found = new ArrayList<>();
        int width = stretch.rows.get(0).row.cells().size();
        for (int at = 0; at < width; at++) {
            int position = at;
            String name = stretch.names == null ? "" : stretch.names.cell(at);
            boolean read = stretch.layout.groups().stream().flatMap(g -> g.columns().values().stream())
                    .anyMatch(c -> c.position() == position);
            boolean counts = name.isEmpty() || NameWords.of(name).sample().isEmpty() || Folded.of(name).hasAny(NO_SAMPLE);
            if (!read && !counts && parts.stream().allMatch(p -> constant(p, position))
                    && parts.stream().map(p -> p.points().get(0).row().row.cell(position)).distinct().count() > 1) {
                found.add(at);
            }
        }
        return found;
    }

    private static boolean constant(Part part, int at) {
        String first = part.points().get(0).row().row.cell(at);
        return !first.isEmpty() && part.points().stream().allMatch(p -> p.row().row.cell(at).equals(first));
    }
}
