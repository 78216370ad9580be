package stirwright.workbench.internal.session;

import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.Stream;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.util.EcoreUtil;
import stirwright.study.Case;
import stirwright.study.Study;

/** Which cases of a study a step changed: an undo that nobody sees is taken for none. */
final class CaseChanges {
    private final Study study;
    private final Map<Case, List<EObject>> before = new LinkedHashMap<>();

    /** Notes the cases as they are before the step. */
    CaseChanges(Study study) {
        this.study = study;
        study.getCases().forEach(c -> before.put(c, copies(c)));
    }

    private static List<EObject> copies(Case one) {
        Collection<EObject> parts = parts(one);
        return List.copyOf(EcoreUtil.copyAll(parts));
    }

    private static List<EObject> parts(Case one) {
        return Stream.of(one, one.getFluid(), one.getVessel(), one.getImpeller()).filter(Objects::nonNull)
                .map(EObject.class::cast).toList();
    }

    /** The case to turn to after the step: none when the one at hand changed, or none did. */
    Optional<Case> toShow(Case atHand) {
        List<Case> changed = study.getCases().stream().filter(this::isOther).toList();
        return changed.isEmpty() || changed.contains(atHand) ? Optional.empty() : Optional.of(changed.get(0));
    }

    private boolean isOther(Case one) {
        List<EObject> then = before.get(one);
        List<EObject> now = parts(one);
        return then == null || !EcoreUtil.equals(then, now);
    }
}
