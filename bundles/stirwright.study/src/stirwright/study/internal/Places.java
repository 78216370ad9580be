package stirwright.study.internal;

import java.util.Locale;
import org.eclipse.emf.ecore.EObject;
import stirwright.study.Amount;
import stirwright.study.Case;
import stirwright.study.Part;
import stirwright.study.Pick;

/** What to call an element of a study in a message. */
final class Places {

    private Places() {}

    static String of(EObject object) {
        return switch (object) {
            case Part part -> object.eClass().getName().toLowerCase(Locale.ROOT) + " '" + part.getName() + "'";
            case Case one -> "case '" + one.getName() + "'";
            case Amount amount -> "amount '" + amount.getColumn() + "' of " + of(amount.eContainer());
            case Pick pick -> "pick '" + pick.getQuantity() + "' of " + of(pick.eContainer());
            default -> "the study";
        };
    }
}
