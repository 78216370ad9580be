package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;
import stirwright.exchange.CurveBlock;
import stirwright.exchange.CurveImport;
import stirwright.exchange.CurvePoint;
import stirwright.exchange.CurveSource;
import stirwright.exchange.DroppedPoint;
import stirwright.exchange.Finding;
import stirwright.exchange.Finding.Topic;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.MeasuredCurve;
import stirwright.exchange.Measurement;
import stirwright.exchange.internal.table.SourceRow;
import stirwright.exchange.internal.table.SourceSheet;
import stirwright.rheology.FlowCurve;

/** From a source to its curves, one step after the other. */
public final class Importer {
    private final CurveSource source;
    private final ImportChoice choice;
    private final List<WorkRow> rows = new ArrayList<>();
    private final List<Layout> layouts = new ArrayList<>();
    private final List<Stretch> stretches = new ArrayList<>();
    private final Set<String> unread = new LinkedHashSet<>();
    private final Set<Finding> findings = new LinkedHashSet<>();
    private final Messages messages = new Messages();

    private Importer(CurveSource source, ImportChoice choice) {
        this.source = source;
        this.choice = choice;
    }

    /** See {@link CurveImport#of}. */
    public static CurveImport read(CurveSource source, ImportChoice choice) {
        return new Importer(source, choice).run();
    }

    private CurveImport run() {
        Sources sources = Sources.read(source, choice);
        findings.addAll(sources.findings());
        sort(sources);
        SignVote vote = SignVote.of(stretches, choice, sources.separator());
        findings.add(vote.finding());
        vote.tie().ifPresent(messages::problem);
        StatusWords statuses = StatusWords.of(stretches);
        statuses.finding().ifPresent(findings::add);
        PointReader reader = new PointReader(choice, vote.sign(), statuses, sources.separator());
        List<Part> parts = stretches.stream().flatMap(s -> Part.of(s, reader.read(s)).stream()).toList();
        Blocks found = new Blocks(parts, choice, statuses, source.stem());
        List<CurveBlock> blocks = found.build(vote.tie().isEmpty());
        List<DroppedPoint> dropped = new ArrayList<>();
        List<String> doubts = new ArrayList<>(vote.doubts());
        doubts.addAll(ChoiceCheck.unmatched(choice, sources.sheets().stream().map(SourceSheet::name).toList(), rows, blocks.size()));
        List<MeasuredCurve> curves = curves(parts, blocks, found.samples, dropped, doubts);
        findings.add(new Finding(Topic.BLOCKS, blocks.size() + (blocks.size() == 1 ? " block, " : " blocks, ") + curves.size()
                + " taken", "heads, numbers that start again, and turns of the shear rate part them", !choice.blocks().isEmpty()));
        doubts.forEach(messages::warning);
        layouts.forEach(layout -> {
            layout.problems().forEach(messages::problem);
            layout.notes().forEach(messages::warning);
            layout.doubts().forEach(messages::warning);
        });
        sources.notes().forEach(messages::warning);
        messages.unread(unread);
        messages.outside(rows);
        messages.blocks(blocks);
        messages.dropped(dropped);
        if (curves.isEmpty()) {
            messages.none(blocks, dropped);
        }
        return new CurveImport(source, choice, List.copyOf(findings), rows.stream().map(WorkRow::shown).toList(), blocks, dropped,
                RowCounts.of(rows, blocks), messages.list(), curves);
    }

    private void sort(Sources sources) {
        HeaderCells headers = new HeaderCells();
        List<List<WorkRow>> sheets = new ArrayList<>();
        for (SourceSheet sheet : sources.sheets()) {
            List<WorkRow> all = new ArrayList<>(sheet.rows().size());
            for (SourceRow row : sheet.rows()) {
                all.add(new WorkRow(sheet.name(), row));
            }
            sheets.add(all);
            rows.addAll(all);
            SheetSorter sorter = new SheetSorter(sheet.name(), choice, headers, all);
            sorter.sort();
            take(sorter);
        }
        String layout = "names of columns";
        if (layouts.isEmpty()) {
            layout = "no names of columns";
            List<String> refused = new ArrayList<>();
            for (int i = 0; i < sheets.size(); i++) {
                sheets.get(i).forEach(WorkRow::forget);
                Nameless nameless = Nameless.sort(sources.sheets().get(i).name(), choice, headers, sheets.get(i), sources.separator());
                take(nameless.sorter());
                refused.add(nameless.problem());
                layout = nameless.set() ? "a set of curves, each with its number and name" : layout;
            }
            if (stretches.isEmpty()) {
                refused.stream().filter(p -> !p.isEmpty()).findFirst().ifPresent(messages::problem);
            }
        }
        findings.add(new Finding(Topic.LAYOUT, layout, layouts.size() + (layouts.size() == 1 ? " table" : " tables"), false));
        for (Stretch stretch : stretches) {
            stretch.group.columns().values().forEach(c -> findings.add(new Finding(Topic.COLUMN, c.words(), c.reason(),
                    c.reason().startsWith(LayoutBuilder.BY_HAND))));
        }
    }

    private void take(SheetSorter sorter) {
        layouts.addAll(sorter.layouts);
        sorter.problems.forEach(messages::problem);
        stretches.addAll(sorter.stretches);
        unread.addAll(sorter.unread);
    }

    private List<MeasuredCurve> curves(List<Part> parts, List<CurveBlock> blocks, List<String> samples, List<DroppedPoint> dropped,
            List<String> doubts) {
        CurveNames names = new CurveNames(source.stem(), blocks.stream().filter(CurveBlock::taken).toList());
        List<MeasuredCurve> curves = new ArrayList<>();
        Map<List<Object>, String> twins = new HashMap<>();
        for (int i = 0; i < blocks.size(); i++) {
            CurveBlock block = blocks.get(i);
            List<DroppedPoint> here = new ArrayList<>();
            for (ReadPoint point : parts.get(i).points()) {
                point.row().block = point.row().block == 0 ? block.number() : point.row().block;
                if (!point.taken()) {
                    here.add(point.dropped(block.number()));
                }
            }
            dropped.addAll(here);
            if (block.taken()) {
                List<CurvePoint> taken = block.points().stream().filter(CurvePoint::taken).toList();
                FlowCurve points = FlowCurve.of(taken.stream().mapToDouble(CurvePoint::shearRate).toArray(),
                        taken.stream().mapToDouble(CurvePoint::shearStress).toArray());
                List<String> warnings = new ArrayList<>(warnings(block, parts.get(i), doubts));
                String label = names.next(block, parts.get(i), samples.get(i));
                String twin = twins.putIfAbsent(List.of(block.use().ramp(), new SamePoints(points)), label);
                if (twin != null) {
                    String same = "its points are those of '" + twin + "', so it is no replicate and is pooled with none";
                    messages.warning("'" + label + "': " + same);
                    if (parts.get(i).stretch().heads.own().isEmpty()) {
                        warnings.add(same);
                    }
                }
                curves.add(new MeasuredCurve(label, points, new Measurement(source.name(), source.sha256(), Messages.name(block),
                        samples.get(i), block.use().ramp(), block.replicate(), block.temperature(), here, warnings)));
            }
        }
        return curves;
    }

    /** What speaks against a block, and what is doubtful of its table or of the whole source. */
    private static List<String> warnings(CurveBlock block, Part part, List<String> doubts) {
        return Stream.of(block.warnings(), part.stretch().layout.doubts(), doubts).flatMap(List::stream).toList();
    }
}
