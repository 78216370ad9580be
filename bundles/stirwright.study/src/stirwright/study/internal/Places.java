package stirwright.study.internal;

import java.util.Locale;
import org.eclipse.emf.ecore.EObject;
import stirwright.study.Amount;
import stirwright.study.Case;
import stirwright.study.Constant;
import stirwright.study.Curve;
import stirwright.study.Part;
import stirwright.study.Pick;

/** What to call an element of a study in a message. */
final class Places {

    private static final int MOST_SHOWN = 40;

    private Places() {}

    static String of(EObject object) {
        return switch (object) {
            case Part part -> object.eClass().getName().toLowerCase(Locale.ROOT) + " " + quote(part.getName());
            case Case one -> "case " + quote(one.getName());
            case Amount amount -> "amount " + quote(amount.getColumn()) + " of " + of(amount.eContainer());
            case Pick pick -> "pick " + quote(pick.getQuantity()) + " of " + of(pick.eContainer());
            case Constant constant -> "constant " + quote(constant.getName()) + " of " + quote(constant.getCorrelation()) + " in "
                    + of(constant.eContainer());
            case Curve curve -> "curve " + quote(curve.getLabel()) + " of " + of(curve.eContainer());
            default -> "the study";
        };
    }

    /** In quotes, and not longer than a message can bear. */
    static String quote(String text) {
        String whole = text == null ? "" : text;
        return "'" + (whole.length() <= MOST_SHOWN ? whole : whole.substring(0, MOST_SHOWN - 1) + "…") + "'";
    }
}
