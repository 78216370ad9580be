package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import stirwright.exchange.BlockUse;
import stirwright.exchange.CurveQuantity;

/**
 * Points of one block, before it is known what the blocks around it are.
 *
 * @param sample what its sample is called; may be empty
 * @param segment the number of its segment; may be empty
 */
record Part(Stretch stretch, String sample, String segment, List<ReadPoint> points) {
    private static final List<String> PRE_SHEAR = List.of("pre shear", "preshear", "conditioning", "vorscher", "precisaill",
            "pre cisaill", "precizall", "pre cizall", "konditionier");

    /** Parts of a stretch: at numbers that start again, and where the shear rate turns or stands still. */
    static List<Part> of(Stretch stretch, List<ReadPoint> points) {
        List<Part> parts = new ArrayList<>();
        Group group = Numbering.found(stretch);
        int begin = 0;
        String segment = "";
        String sample = "";
        int before = -1;
        for (int i = 0; i < points.size(); i++) {
            WorkRow row = points.get(i).row();
            String now = Numbering.segment(row.row, group);
            String whose = stretch.sample(row.row);
            int number = Numbering.point(row.row, group);
            boolean again = number >= 0 && before >= 0 && number <= before;
            if (i > begin && (again || !now.equals(segment) || !whose.equals(sample))) {
                split(parts, stretch, sample, segment, points.subList(begin, i));
                begin = i;
            }
            segment = now;
            sample = whose;
            before = number >= 0 ? number : again ? -1 : before;
        }
        split(parts, stretch, sample, segment, points.subList(begin, points.size()));
        return parts;
    }

    private static void split(List<Part> into, Stretch stretch, String sample, String segment, List<ReadPoint> points) {
        int[] placed = new int[points.size()];
        int count = 0;
        for (int i = 0; i < points.size(); i++) {
            if (!Double.isNaN(points.get(i).rate()) && Double.isFinite(points.get(i).rate())) {
                placed[count++] = i;
            }
        }
        double[] rates = new double[count];
        for (int i = 0; i < count; i++) {
            rates[i] = points.get(placed[i]).rate();
        }
        List<RampSplit.Part> ramps = RampSplit.split(rates);
        int from = 0;
        for (int i = 0; i < ramps.size(); i++) {
            // Points without a rate stay with those before them.
            int to = i == ramps.size() - 1 ? points.size() : placed[ramps.get(i).end()];
            into.add(new Part(stretch, sample, segment, List.copyOf(points.subList(from, to))));
            from = to;
        }
        if (ramps.isEmpty()) {
            into.add(new Part(stretch, sample, segment, List.copyOf(points)));
        }
    }

    /** What tells its sample from others of the source; empty where nothing does. Equal names are one sample. */
    String sampleName() {
        String place = sample.isEmpty() && stretch.layout.groups().size() > 1 ? "sample " + stretch.group.sample() : "";
        return Stream.of(stretch.heads.own(), sample, place).filter(w -> !w.isEmpty()).collect(Collectors.joining(" "));
    }

    /** As the source calls it. */
    String name() {
        String head = stretch.group.column(CurveQuantity.SAMPLE) == null ? stretch.heads.words() : sample;
        return segment.isEmpty() || head.contains(segment) ? head : head + (head.isEmpty() ? "segment " : ", segment ") + segment;
    }

    /** What the rates alone say. */
    BlockUse shape() {
        double[] rates = points.stream().mapToDouble(ReadPoint::rate).filter(r -> r > 0 && Double.isFinite(r)).toArray();
        if (rates.length == 0) {
            return BlockUse.OTHER;
        }
        if (RampSplit.constant(rates)) {
            return BlockUse.CONSTANT_RATE;
        }
        int steps = RampSplit.stepCount(rates);
        if (steps == 2 && rates.length > 4) {
            return BlockUse.OTHER;
        }
        int direction = steps == 2 ? 0 : RampSplit.direction(rates);
        return direction > 0 ? BlockUse.UP : direction < 0 ? BlockUse.DOWN : BlockUse.UNORDERED;
    }

    /** Whether its head or its sheet calls it a pre-shear. */
    boolean namedPreShear() {
        String folded = Folded.of(stretch.heads.block() + " " + stretch.heads.run() + " " + stretch.sheet).text();
        return PRE_SHEAR.stream().anyMatch(folded::contains);
    }

    double[] taken(CurveQuantity quantity) {
        return points.stream().filter(ReadPoint::taken).mapToDouble(p -> switch (quantity) {
            case TEMPERATURE -> p.point().temperature();
            case TORQUE_PERCENT -> p.point().torquePercent();
            case SHEAR_RATE -> p.point().shearRate();
            default -> throw new IllegalArgumentException(quantity.name().toLowerCase(Locale.ROOT));
        }).filter(v -> !Double.isNaN(v)).toArray();
    }

    /** Mean in deg C of the points that are taken, else what its names say; NaN for neither. */
    double temperature() {
        double[] measured = taken(CurveQuantity.TEMPERATURE);
        // Differences, so that the mean of equal readings is that reading.
        return measured.length > 0 ? measured[0] + Arrays.stream(measured).map(t -> t - measured[0]).average().orElseThrow()
                : TemperatureInName.of(sample + " " + stretch.heads.words() + " " + stretch.sheet);
    }
}
