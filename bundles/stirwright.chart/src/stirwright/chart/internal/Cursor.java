package stirwright.chart.internal;

import java.util.ArrayList;
import java.util.List;
import stirwright.chart.Reading;

/**
 * Where the pointer or the keyboard reads the curves.
 *
 * @param x in pixels of the chart
 * @param y in pixels of the chart; the curve nearest to it is emphasised
 * @param reading the values there
 * @param nearest the index of the emphasised value; -1 when there is none
 */
public record Cursor(double x, double y, Reading reading, int nearest) {
    /** A cursor at a place of a scene. */
    public static Cursor at(Scene scene, double x, double y) {
        double at = scene.x().clamp(x);
        Reading reading = Readings.at(scene.x().value(at), scene.traces().stream().map(Trace::curve).toList(),
                scene.x().span(), scene.y().span());
        return new Cursor(at, y, reading, nearest(scene, reading.values(), y));
    }

    private static int nearest(Scene scene, List<Reading.At> values, double y) {
        int nearest = -1;
        double least = Double.POSITIVE_INFINITY;
        for (int i = 0; i < values.size(); i++) {
            double distance = Math.abs(scene.y().pixel(values.get(i).value()) - y);
            if (distance < least) {
                least = distance;
                nearest = i;
            }
        }
        return nearest;
    }

    /** The emphasised value moved up or down the table. */
    public Cursor stepped(Scene scene, int step) {
        if (nearest < 0) {
            return this;
        }
        int next = Math.clamp(nearest + step, 0, reading.values().size() - 1);
        return new Cursor(x, scene.y().pixel(reading.values().get(next).value()), reading, next);
    }

    /** The id of the emphasised curve; null when there is none. */
    public String nearestId() {
        return nearest < 0 ? null : reading.values().get(nearest).curveId();
    }

    /** The x that is read, with its name, for instance "Reynolds number 1234". */
    static String head(Scene scene, Reading reading) {
        String title = scene.picture.x().title();
        int definition = title.indexOf(',');
        String unit = scene.picture.x().unit();
        return (definition < 0 ? title : title.substring(0, definition)) + " " + Numbers.reading(reading.x())
                + (unit.isBlank() ? "" : " " + unit);
    }

    /** The whole reading as one sentence for screen readers. */
    public String words(Scene scene) {
        String head = head(scene, reading);
        if (reading.values().isEmpty()) {
            return Wording.of("reading.none", head);
        }
        List<String> parts = new ArrayList<>();
        for (int i = 0; i < reading.values().size(); i++) {
            Reading.At at = reading.values().get(i);
            parts.add(at.label() + ' ' + Numbers.reading(at.value()) + (at.inside() ? "" : Wording.of("reading.outside"))
                    + (i == nearest ? Wording.of("reading.nearest") : ""));
        }
        return Wording.of("reading", head, String.join("; ", parts));
    }
}
