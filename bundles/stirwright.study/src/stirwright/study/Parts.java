package stirwright.study;

import java.util.List;
import java.util.Objects;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.util.EcoreUtil;

/** Fluids, vessels and impellers as cases use them. */
public final class Parts {

    private Parts() {}

    /** The cases of the part's study that use it, in their order. */
    public static List<Case> users(Part part) {
        return part.eContainer() instanceof Study study
                ? study.getCases().stream().filter(c -> uses(c, part)).toList()
                : List.of();
    }

    /** Takes a part out of its study; the cases that used it are left without, and cannot be computed until they get another. */
    public static void remove(Part part) {
        for (Case user : users(part)) {
            user.setFluid(without(user.getFluid(), part));
            user.setVessel(without(user.getVessel(), part));
            user.setImpeller(without(user.getImpeller(), part));
        }
        EcoreUtil.remove(part);
    }

    /** A copy that belongs to nothing yet; a case's copy uses the same fluid, vessel and impeller. */
    public static <T extends EObject> T copy(T original) {
        return EcoreUtil.copy(original);
    }

    private static boolean uses(Case user, Part part) {
        return Objects.equals(user.getFluid(), part) || Objects.equals(user.getVessel(), part)
                || Objects.equals(user.getImpeller(), part);
    }

    private static <T extends Part> T without(T used, Part part) {
        return used == part ? null : used;
    }
}
