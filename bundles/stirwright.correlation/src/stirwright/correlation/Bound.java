package stirwright.correlation;

import java.util.List;

/**
 * One bound of a correlation's validity, as data: the check, the shading and the words come from
 * it. Contributors make bounds through {@link CorrelationBuilder}.
 */
public sealed interface Bound {

    /** What is bounded: a {@link Measure} or a {@link Classifier}. */
    Term subject();

    Verdict verdict(Geometry geometry, OperatingPoint point);

    /** What is allowed, for instance "0.2 to 0.5". */
    String allowance();

    /** The bound in words, for instance "D/T 0.2 to 0.5". */
    default String words() {
        return subject().title() + " " + allowance();
    }

    /** What the case has, in words, for instance "D/T 0.62". */
    String found(Geometry geometry, OperatingPoint point);

    /** A closed range; an open end is an infinity. */
    record Range(Measure subject, double least, double most, String remark) implements Bound {
        public Range {
            if (!(least <= most)) {
                throw new ContractException(subject.title() + ": range " + least + " to " + most + " is not ascending");
            }
        }

        @Override
        public Verdict verdict(Geometry geometry, OperatingPoint point) {
            return subject.verdict(subject.value(geometry, point), least, most);
        }

        @Override
        public String allowance() {
            String range = least == Double.NEGATIVE_INFINITY ? "at most " + Figures.show(most)
                    : most == Double.POSITIVE_INFINITY ? "at least " + Figures.show(least)
                    : least == most ? Figures.show(least)
                    : Figures.show(least) + " to " + Figures.show(most);
            return range + (remark.isEmpty() ? "" : ", " + remark);
        }

        @Override
        public String found(Geometry geometry, OperatingPoint point) {
            return subject.title() + " " + Figures.show(subject.value(geometry, point));
        }
    }

    /** One of a set of numbers, for instance blade counts; nothing is near to it. */
    record OneOf(Measure subject, List<Double> allowed) implements Bound {
        public OneOf {
            allowed = List.copyOf(allowed);
        }

        @Override
        public Verdict verdict(Geometry geometry, OperatingPoint point) {
            double found = subject.value(geometry, point);
            for (double one : allowed) {
                if (subject.verdict(found, one, one) == Verdict.INSIDE) {
                    return Verdict.INSIDE;
                }
            }
            return Verdict.OUTSIDE;
        }

        @Override
        public String allowance() {
            return String.join(" or ", allowed.stream().map(Figures::show).toList());
        }

        @Override
        public String found(Geometry geometry, OperatingPoint point) {
            return subject.title() + " " + Figures.show(subject.value(geometry, point));
        }
    }

    /** One of a set of classes. */
    record InClass(Classifier subject, List<String> allowed) implements Bound {
        public InClass {
            allowed = List.copyOf(allowed);
        }

        @Override
        public Verdict verdict(Geometry geometry, OperatingPoint point) {
            return allowed.contains(subject.label(geometry, point)) ? Verdict.INSIDE : Verdict.OUTSIDE;
        }

        @Override
        public String allowance() {
            return String.join(" or ", allowed);
        }

        @Override
        public String found(Geometry geometry, OperatingPoint point) {
            return subject.title() + " " + subject.label(geometry, point);
        }
    }

    /** The source does not say, or says it where nobody here could read it. */
    record NotStated(Term subject, String reason) implements Bound {
        public NotStated {
            if (reason.isBlank()) {
                throw new ContractException(subject.title() + ": a bound that is not stated needs a reason");
            }
        }

        @Override
        public Verdict verdict(Geometry geometry, OperatingPoint point) {
            return Verdict.NOT_STATED;
        }

        @Override
        public String allowance() {
            return "not stated (" + reason + ")";
        }

        @Override
        public String found(Geometry geometry, OperatingPoint point) {
            return words();
        }
    }

    /** Whether the source states this bound. */
    default boolean stated() {
        return !(this instanceof NotStated);
    }
}
