package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import stirwright.exchange.BlockChoice;
import stirwright.exchange.BlockUse;
import stirwright.exchange.CurveBlock;
import stirwright.exchange.ImportChoice;

/** Says of each part what it is, whether it is taken, and which replicate it is. */
final class Blocks {
    static final int LEAST_POINTS = 3;

    private final List<Part> parts;
    private final ImportChoice choice;
    private final StatusWords statuses;
    private final String file;
    private final SampleNames names;
    private final Replicates replicates = new Replicates();
    /** What tells the sample of each block from others of the source; empty where nothing does. */
    final List<String> samples = new ArrayList<>();

    /** @param file its name, which may hold a temperature */
    Blocks(List<Part> parts, ImportChoice choice, StatusWords statuses, String file) {
        this.file = file;
        this.names = new SampleNames(parts);
        this.parts = parts;
        this.choice = choice;
        this.statuses = statuses;
    }

    /** @param readable whether numbers can be told at all; nothing is taken otherwise */
    List<CurveBlock> build(boolean readable) {
        List<BlockUse> shapes = parts.stream().map(Part::shape).toList();
        boolean[] curveFollows = new boolean[parts.size()];
        boolean follows = false;
        for (int i = parts.size() - 1; i >= 0; i--) {
            curveFollows[i] = follows;
            follows |= shapes.get(i).isCurve();
        }
        List<CurveBlock> blocks = new ArrayList<>(parts.size());
        for (int i = 0; i < parts.size(); i++) {
            // Up, a hold, down: what stands between two ramps of one loop is no pre-shear.
            boolean hold = i > 0 && shapes.get(i - 1) == BlockUse.UP;
            blocks.add(block(i + 1, parts.get(i), shapes.get(i), curveFollows[i] && !hold, readable));
        }
        return blocks;
    }

    private CurveBlock block(int number, Part part, BlockUse shape, boolean before, boolean readable) {
        BlockUse found = part.namedPreShear() || shape == BlockUse.CONSTANT_RATE && before ? BlockUse.PRE_SHEAR : shape;
        String why = found == shape ? because(shape) : part.namedPreShear() ? "its name says so" : "one shear rate, before a ramp";
        Optional<BlockChoice> said = choice.blocks().stream().filter(b -> b.block() == number).findFirst();
        BlockUse use = said.flatMap(BlockChoice::use).orElse(found);
        boolean wanted = said.flatMap(BlockChoice::taken).orElse(use.isCurve());
        long usable = part.points().stream().filter(ReadPoint::taken).count();
        boolean taken = wanted && readable && usable >= LEAST_POINTS;
        String reason = why + (use != found ? "; chosen by hand: " + use.words() : "")
                + (wanted != use.isCurve() ? "; chosen by hand: " + (wanted ? "taken" : "not taken") : "")
                + (wanted && !readable ? "; not taken, since the decimal sign cannot be told" : "")
                + (wanted && readable && !taken ? "; not taken: a flow curve needs at least " + LEAST_POINTS + " points, "
                        + usable + " can be used" : "");
        double temperature = part.temperature(file);
        String name = names.next(part, use, temperature);
        samples.add(name);
        return new CurveBlock(number, part.name(), part.stretch().sheet, part.stretch().group.sample(), found, use, taken, reason,
                taken ? replicates.next(name, use, temperature) : 0, temperature,
                part.stretch().group.columns().values().stream().map(c -> c.shown(part.stretch().sheet)).toList(),
                part.points().stream().map(ReadPoint::point).toList(),
                taken || use.isCurve() ? BlockWarnings.of(part, statuses) : List.of());
    }

    private static String because(BlockUse shape) {
        return switch (shape) {
            case UP -> "the shear rate rises";
            case DOWN -> "the shear rate falls";
            case UNORDERED -> "the shear rate neither rises nor falls throughout";
            case CONSTANT_RATE, PRE_SHEAR -> "one shear rate throughout";
            case OTHER -> "no ramp of shear rates";
        };
    }
}
