package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
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
    private static final List<String> AFTER = List.of(" after ", " no ", " without ", " nach ", " ohne ", " apres ", " sans ", " sin ");

    /** Parts of a stretch: at numbers that start again, at other temperatures, and where the shear rate turns or stands still. */
    static List<Part> of(Stretch stretch, List<ReadPoint> points) {
        List<Part> parts = new ArrayList<>();
        Group group = Numbering.found(stretch);
        for (Map.Entry<String, List<ReadPoint>> whose : bySample(stretch, points)) {
            numbered(parts, stretch, group, whose.getKey(), whose.getValue());
        }
        return parts;
    }

    /** Runs of one sample; samples that take turns are gathered. */
    private static List<Map.Entry<String, List<ReadPoint>>> bySample(Stretch stretch, List<ReadPoint> points) {
        List<Map.Entry<String, List<ReadPoint>>> runs = new ArrayList<>();
        Map<String, List<ReadPoint>> all = new LinkedHashMap<>();
        String before = "";
        for (ReadPoint point : points) {
            String whose = stretch.sample(point.row().row, before);
            if (runs.isEmpty() || !whose.equals(before)) {
                runs.add(Map.entry(whose, new ArrayList<>()));
            }
            runs.getLast().getValue().add(point);
            all.computeIfAbsent(whose, w -> new ArrayList<>()).add(point);
            before = whose;
        }
        // Each with a few points in turn: a table in the order of the rates.
        return runs.size() > all.size() && points.size() < 3 * runs.size() ? List.copyOf(all.entrySet()) : runs;
    }

    private static void numbered(List<Part> parts, Stretch stretch, Group group, String sample, List<ReadPoint> points) {
        int begin = 0;
        String segment = "";
        int before = -1;
        for (int i = 0; i < points.size(); i++) {
            WorkRow row = points.get(i).row();
            String now = Numbering.segment(row.row, group);
            int number = Numbering.point(row.row, group);
            boolean again = number >= 0 && before >= 0 && number <= before;
            if (i > begin && (again || !now.equals(segment))) {
                split(parts, stretch, sample, segment, points.subList(begin, i));
                begin = i;
            }
            segment = now;
            before = number >= 0 ? number : again ? -1 : before;
        }
        split(parts, stretch, sample, segment, points.subList(begin, points.size()));
    }

    private static void split(List<Part> into, Stretch stretch, String sample, String segment, List<ReadPoint> points) {
        for (List<ReadPoint> alike : Temperatures.apart(points)) {
            ramps(into, stretch, sample, segment, alike);
        }
    }

    private static void ramps(List<Part> into, Stretch stretch, String sample, String segment, List<ReadPoint> points) {
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

    /** Whether a blank row stands within it or before it. */
    boolean interrupted() {
        return points.stream().anyMatch(p -> p.row().gap);
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
        if (rates.length >= Blocks.LEAST_POINTS && RampSplit.distinct(rates) < Blocks.LEAST_POINTS) {
            return BlockUse.OTHER;
        }
        int direction = steps == 2 ? 0 : RampSplit.direction(rates);
        return direction > 0 ? BlockUse.UP : direction < 0 ? BlockUse.DOWN : BlockUse.UNORDERED;
    }

    /** Whether a head, its sheet, its segment or its sample calls it a pre-shear. */
    boolean namedPreShear() {
        String folded = Folded.of(String.join(" ", stretch.heads.block(), stretch.heads.run(), stretch.heads.title(), stretch.sheet, segment)).text();
        String whose = Folded.of(sample).text();
        return PRE_SHEAR.stream().anyMatch(w -> named(folded, w) || !w.startsWith("condition") && !w.startsWith("konditio") && named(whose, w));
    }

    /** A curve may be called one "after pre-shear". */
    private static boolean named(String folded, String word) {
        int at = folded.indexOf(word);
        return at >= 0 && AFTER.stream().noneMatch(folded.substring(0, at)::endsWith);
    }

    double[] taken(CurveQuantity quantity) {
        return points.stream().filter(ReadPoint::taken).mapToDouble(p -> switch (quantity) {
            case TEMPERATURE -> p.point().temperature();
            case TORQUE_PERCENT -> p.point().torquePercent();
            case SHEAR_RATE -> p.point().shearRate();
            default -> throw new IllegalArgumentException(quantity.name().toLowerCase(Locale.ROOT));
        }).filter(v -> !Double.isNaN(v)).toArray();
    }

    /**
     * Mean in deg C of the points that are taken, else what its names say; NaN for neither.
     *
     * @param file the file's name, which counts last
     */
    double temperature(String file) {
        double[] measured = taken(CurveQuantity.TEMPERATURE);
        // Differences, so that the mean of equal readings is that reading.
        return measured.length > 0 ? measured[0] + Arrays.stream(measured).map(t -> t - measured[0]).average().orElseThrow()
                : TemperatureInName.of(sample + " " + stretch.heads.words() + " " + stretch.sheet + " " + file);
    }
}
