package stirwright.study.internal;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.HashSet;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.resource.Resource.Diagnostic;
import org.eclipse.emf.ecore.util.EcoreUtil;
import stirwright.study.Study;
import stirwright.study.StudyPackage;

/** Turns bytes into a study. */
public final class StudyReader {

    private StudyReader() {}

    /** @param format the latest that is understood */
    public static Study read(byte[] bytes, int format) throws NoStudyException {
        StudyPackage.eINSTANCE.eClass();
        StudyResource resource = new StudyResource();
        Exception failure = null;
        try {
            resource.load(new ByteArrayInputStream(bytes), Map.of());
        } catch (IOException | RuntimeException damaged) {
            // EMF answers some damaged files with whatever its own code ran into; the diagnostics say more.
            failure = damaged;
        }
        Optional<Study> study = resource.getContents().stream()
                .filter(Study.class::isInstance).map(Study.class::cast).findFirst();
        if (study.isPresent() && study.get().getFormat() > format) {
            throw new NoStudyException("is of format " + study.get().getFormat() + ", and this version of Stirwright reads"
                    + " up to " + format + "; open it with a newer version");
        }
        List<Diagnostic> errors = resource.getErrors();
        if (failure != null || !errors.isEmpty()) {
            throw ReadProblems.of(failure, errors, study.isPresent());
        }
        if (study.isEmpty() || resource.getContents().size() != 1) {
            throw new NoStudyException(ReadProblems.NOT_A_STUDY);
        }
        if (study.get().getFormat() < 1) {
            throw new NoStudyException("the study names no format; write format=\"" + format
                    + "\" into its first element if it is one of this version");
        }
        OneOfEach.require(bytes);
        requireWhole(study.get());
        requireOwnIds(resource, study.get());
        resource.getContents().clear();
        return study.get();
    }

    /** Whatever stands in another file is neither loaded nor silently missing. */
    private static void requireWhole(Study study) throws NoStudyException {
        for (Iterator<EObject> all = EcoreUtil.getAllContents(List.of(study)); all.hasNext();) {
            EObject object = all.next();
            if (object.eIsProxy()) {
                throw new NoStudyException(Places.of(object.eContainer())
                        + " leaves a part to another file; a study is one file, so put the part into it");
            }
            for (EReference reference : object.eClass().getEAllReferences()) {
                if (!reference.isContainment() && object.eGet(reference, false) instanceof EObject part
                        && (part.eIsProxy() || part.eContainer() != study)) {
                    throw new NoStudyException("the " + reference.getName() + " of " + Places.of(object)
                            + " is not in the study; name one that is");
                }
            }
        }
    }

    /** Of two elements with one id, a case would get whichever comes last. */
    private static void requireOwnIds(StudyResource resource, Study study) throws NoStudyException {
        Set<String> taken = new HashSet<>();
        for (EObject element : study.eContents()) {
            String id = resource.getID(element);
            if (id != null && !taken.add(id)) {
                throw new NoStudyException(Places.of(element) + " has the id " + Places.quote(id)
                        + " of another; give it one of its own, also where cases name it");
            }
        }
    }
}
