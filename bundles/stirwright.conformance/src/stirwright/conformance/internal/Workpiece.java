package stirwright.conformance.internal;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import stirwright.conformance.ReferenceFile;
import stirwright.core.Arrival;
import stirwright.core.Catalogue;
import stirwright.core.Entry;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;

/** What all checks of one subject share: what it brings, its reference rows, and cases to try it on. Not thread-safe. */
public final class Workpiece {
    private final String origin;
    private final List<Arrival> arrivals;
    private final List<ReferenceFile> files;
    private final Catalogue others;
    private final Map<Correlation, Trials> trials = new HashMap<>();
    private ReferenceRows references;

    public Workpiece(String origin, List<Arrival> arrivals, List<ReferenceFile> files, Catalogue others) {
        this.origin = origin;
        this.arrivals = List.copyOf(arrivals);
        this.files = List.copyOf(files);
        this.others = others;
    }

    public String origin() {
        return origin;
    }

    List<Arrival> arrivals() {
        return arrivals;
    }

    public List<Family> ownFamilies() {
        return arrivals.stream().flatMap(arrival -> arrival.families().stream()).toList();
    }

    public List<Correlation> correlations() {
        return arrivals.stream().flatMap(arrival -> arrival.correlations().stream()).toList();
    }

    /** What the other bundles contribute. */
    Catalogue others() {
        return others;
    }

    public ReferenceRows references() {
        if (references == null) {
            references = ReferenceReader.read(this, files);
        }
        return references;
    }

    /** The cases on which a correlation is tried. */
    Trials trials(Correlation correlation) {
        return trials.computeIfAbsent(correlation, c -> Trials.of(c, references().of(c)));
    }

    /** Every family there is, those of the subject first. */
    List<Family> families() {
        return Stream.concat(ownFamilies().stream(), others.families().stream()).toList();
    }

    Optional<Family> family(String id) {
        return families().stream().filter(f -> f.id().equals(id)).findFirst();
    }

    /** A correlation of the subject. */
    Optional<Correlation> own(String id) {
        return correlations().stream().filter(c -> c.id().equals(id)).findFirst();
    }

    /** A correlation of the subject or of anybody else. */
    Optional<Correlation> correlation(String id) {
        return own(id).or(() -> others.entry(id).map(Entry::correlation));
    }
}
