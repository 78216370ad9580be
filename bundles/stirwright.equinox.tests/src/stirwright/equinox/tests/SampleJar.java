package stirwright.equinox.tests;

import java.io.IOException;
import java.io.InputStream;
import java.util.HashMap;
import java.util.Map;
import org.osgi.framework.Bundle;
import stirwright.core.Point;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;
import stirwright.correlation.Variable;

/** The jar of the first contract and its correlations at hand. */
final class SampleJar {
    static final String FAMILY = "sampleblade";
    private static final String PATH = "contract/sample-1.0.jar";

    private SampleJar() {}

    static byte[] bytes() throws IOException {
        try (InputStream in = Framework.context().getBundle().getEntry(PATH).openStream()) {
            return in.readAllBytes();
        }
    }

    /** Installs it and waits until its family is there; the caller uninstalls it. */
    static Bundle install() throws Exception {
        Bundle bundle = Framework.install(PATH, bytes());
        if (!Framework.becomes(() -> Framework.catalogue().family(FAMILY).isPresent())) {
            bundle.uninstall();
            throw new AssertionError("the family of " + PATH + " has not arrived");
        }
        return bundle;
    }

    static Correlation correlation(String id) {
        return Framework.catalogue().entry(FAMILY + "." + id).orElseThrow(() -> new AssertionError("no " + id)).correlation();
    }

    /** @param given words such as {@code reynolds=100 blade_count=6}, in SI units */
    static double value(Correlation correlation, String given) {
        return correlation.bind(vessel(given)).at(point(correlation, given));
    }

    /** D 0.4 m, four baffles, the family's defaults, and what is given. */
    static VesselGeometry vessel(String given) {
        Family family = Framework.catalogue().family(FAMILY).orElseThrow();
        Map<String, Double> values = new HashMap<>(Map.of("impeller_diameter", 0.4, "baffle_count", 4.0));
        values.putAll(numbers(given));
        return VesselGeometry.resolve(family, values);
    }

    /** What is given of the variables that a correlation reads. */
    static Point point(Correlation correlation, String given) {
        Map<String, Double> values = numbers(given);
        Point point = new Point();
        for (Variable variable : correlation.reads()) {
            if (values.containsKey(variable.id())) {
                point.set(variable, values.get(variable.id()));
            }
        }
        return point;
    }

    private static Map<String, Double> numbers(String given) {
        Map<String, Double> numbers = new HashMap<>();
        for (String word : given.strip().split(" +")) {
            if (!word.isEmpty()) {
                numbers.put(word.split("=")[0], Double.valueOf(word.split("=")[1]));
            }
        }
        return numbers;
    }
}
