package stirwright.core.internal;

import stirwright.correlation.Bound;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.Measure;
import stirwright.correlation.Term;
import stirwright.correlation.Transcription;

/** What keeps a correlation from being recommended whatever the case: digits, source, standing, silence. */
final class Trust {

    private Trust() {}

    /** Whether its digits, its source and its standing allow to recommend what rests on it. */
    static boolean in(Correlation correlation) {
        return doubt(correlation).isEmpty();
    }

    /** Why a candidate is not recommendable at all, in one sentence; empty when it is. */
    static String obstacle(Candidate candidate) {
        for (Candidate.Part part : candidate.parts()) {
            boolean base = part == candidate.parts().get(0);
            String doubt = doubt(part.correlation());
            if (doubt.isEmpty() && base) {
                doubt = silence(part.correlation());
            }
            if (!doubt.isEmpty()) {
                return base ? doubt : "of its factor " + part.correlation().id() + ", " + doubt;
            }
        }
        return "";
    }

    private static String doubt(Correlation correlation) {
        if (correlation.transcription() == Transcription.UNSURE) {
            return "some digits are unsure (" + correlation.transcription().words() + ")";
        }
        if (!correlation.citation().hasSource()) {
            return "there is no source (common practice)";
        }
        return correlation.standing().recommendable()
                ? "" : "the standing is " + correlation.standing().words();
    }

    private static String silence(Correlation correlation) {
        if (isSilent(correlation)) {
            return "the source states no range of the Reynolds number";
        }
        // Blade count or type, and baffled or not; what is made for named families states the type.
        if (correlation.families().isEmpty() && !stated(correlation, Measure.BLADE_COUNT)) {
            return "the source does not state the impeller's type or blade count";
        }
        return stated(correlation, Classifier.BAFFLING) ? "" : "the source does not state whether the vessel was baffled";
    }

    /** Whether nobody knows in which flow it holds. */
    static boolean isSilent(Correlation correlation) {
        return !stated(correlation, Measure.REYNOLDS);
    }

    private static boolean stated(Correlation correlation, Term subject) {
        return correlation.bound(subject).map(Bound::stated).orElse(false);
    }
}
