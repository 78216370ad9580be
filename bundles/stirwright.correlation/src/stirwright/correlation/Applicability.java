package stirwright.correlation;

import java.util.function.Predicate;

/** When a modifier has anything to say, for instance "several impellers on the shaft". */
record Applicability(String words, Predicate<Geometry> test) {
    static final Applicability ALWAYS = new Applicability("always", g -> true);
}
