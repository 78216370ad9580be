package stirwright.conformance;

import java.util.List;
import stirwright.conformance.internal.Answers;
import stirwright.conformance.internal.Bounds;
import stirwright.conformance.internal.Citations;
import stirwright.conformance.internal.Clamping;
import stirwright.conformance.internal.ConstantsUsed;
import stirwright.conformance.internal.DeclaredReads;
import stirwright.conformance.internal.FamilyGeometry;
import stirwright.conformance.internal.Ids;
import stirwright.conformance.internal.LaminarLimits;
import stirwright.conformance.internal.Names;
import stirwright.conformance.internal.PrintedForm;
import stirwright.conformance.internal.RangesFlagged;
import stirwright.conformance.internal.References;
import stirwright.conformance.internal.SpokenOf;
import stirwright.conformance.internal.StatedRange;

/** Every check, in the order in which a contributor would want to mend what they find. */
public final class ConformanceSuite {

    private static final List<Check> CHECKS = List.of(
            new Check("answers", "Every contribution hands over its families and correlations without an error.",
                    Answers::examine),
            new Check("ids", "Every id is unique among all that is installed and tells family or bundle, quantity and"
                    + " source.", Ids::examine),
            new Check("citation", "Every correlation and regime limit says where it comes from, with a locator or the words"
                    + " \"locator not at hand\".", Citations::examine),
            new Check("bounds", "Reynolds number, baffling, D/T and fluid are each stated, or not stated with a reason.",
                    Bounds::examine),
            new Check("names", "The families and the shear-rate constant that a correlation names exist.", Names::examine),
            new Check("family geometry", "Every default of a family follows from what the family lists before it.",
                    FamilyGeometry::examine),
            new Check("formula", "The formula prints with nothing left to fill in.", PrintedForm::formula),
            new Check("applicability", "Every modifier says when it applies.", PrintedForm::applicability),
            new Check("rows read", "Every reference file has its provenance on top and is read completely.",
                    References::read),
            new Check("rows cover", "Every correlation has a reference row within its stated bounds, for each installed"
                    + " family that it names.", References::cover),
            new Check("rows inside", "Every reference row is within the stated bounds or marked outside.", References::mark),
            new Check("rows met", "Every reference row is met within the tolerance of its kind.", References::met),
            new Check("finite", "Within its stated range every correlation gives a finite number above zero.",
                    StatedRange::examine),
            new Check("flagged", "A case beyond a stated range is flagged.", RangesFlagged::examine),
            new Check("not clamped", "Beyond a stated range a value is not held at the end of the range.",
                    Clamping::examine),
            new Check("laminar limit", "Where a laminar limit is claimed, value times Reynolds number becomes constant.",
                    LaminarLimits::examine),
            new Check("reads", "A correlation reads the variables that it declares, all of them and no other.",
                    DeclaredReads::examine),
            new Check("spoken of", "Every dimension that a correlation reads is spoken of by a bound, stated or not.",
                    SpokenOf::examine),
            new Check("constants", "Every constant and curve that the formula prints is held by a reference row.",
                    ConstantsUsed::examine));

    private ConformanceSuite() {}

    /** In the order in which {@link #examine} runs them. */
    public static List<Check> checks() {
        return CHECKS;
    }

    /** Runs every check; an empty list means that the subject conforms. */
    public static List<Finding> examine(Subject subject) {
        return CHECKS.stream().flatMap(check -> check.examine(subject).stream()).toList();
    }
}
