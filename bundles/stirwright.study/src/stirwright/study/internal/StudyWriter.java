package stirwright.study.internal;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.List;
import java.util.Map;
import org.eclipse.emf.ecore.util.EcoreUtil;
import stirwright.study.Case;
import stirwright.study.Part;
import stirwright.study.Study;
import stirwright.study.StudyPackage;

/** Turns a study into bytes. */
public final class StudyWriter {

    private StudyWriter() {}

    /** Of a copy, so that the study belongs to no resource and keeps its format. */
    public static byte[] bytes(Study study, int format) throws NoStudyException {
        Texts.requireWritable(study);
        for (Case one : study.getCases()) {
            requireHome(study, one, one.getFluid());
            requireHome(study, one, one.getVessel());
            requireHome(study, one, one.getImpeller());
        }
        Study copy = EcoreUtil.copy(study);
        copy.eSet(StudyPackage.eINSTANCE.getStudy_Format(), format);
        StudyResource resource = new StudyResource();
        resource.getContents().add(copy);
        name(resource, "fluid", copy.getFluids());
        name(resource, "vessel", copy.getVessels());
        name(resource, "impeller", copy.getImpellers());
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try {
            resource.save(out, Map.of());
        } catch (IOException failure) {
            throw new NoStudyException("cannot be written: " + failure.getMessage(), failure);
        }
        return out.toByteArray();
    }

    private static void requireHome(Study study, Case user, Part part) throws NoStudyException {
        if (part != null && part.eContainer() != study) {
            throw new NoStudyException(Places.of(user) + " uses " + Places.of(part)
                    + ", which is not in the study; add it or pick another");
        }
    }

    /** A word that cases refer to: a place in a list would say nothing to a reader. */
    private static void name(StudyResource resource, String what, List<? extends Part> parts) {
        for (int i = 0; i < parts.size(); i++) {
            resource.setID(parts.get(i), what + "-" + (i + 1));
        }
    }
}
