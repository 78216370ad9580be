package stirwright.study.internal;

import java.util.Iterator;
import java.util.List;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.util.EcoreUtil;
import stirwright.study.MeasuredPoint;

/** Whether a file can hold the texts and numbers of a study. */
final class Texts {

    private Texts() {}

    /** @throws NoStudyException naming the place and the character or number that XML has no form for */
    static void requireWritable(EObject root) throws NoStudyException {
        for (Iterator<EObject> all = EcoreUtil.getAllContents(List.of(root)); all.hasNext();) {
            EObject object = all.next();
            for (EAttribute attribute : object.eClass().getEAllAttributes()) {
                Object value = object.eGet(attribute);
                for (Object one : value instanceof List<?> list ? list : value == null ? List.of() : List.of(value)) {
                    requireWritable(object, attribute, one);
                }
            }
        }
    }

    private static void requireWritable(EObject object, EAttribute attribute, Object value) throws NoStudyException {
        if (value instanceof Double number && !Double.isFinite(number)) {
            throw new NoStudyException(Places.of(object) + " has the " + attribute.getName() + " " + number
                    + ", which is no number; give one");
        }
        if (value instanceof MeasuredPoint point && !(Double.isFinite(point.rate()) && Double.isFinite(point.stress()))) {
            throw new NoStudyException(Places.of(object) + " has the point " + point.rate() + " 1/s, " + point.stress()
                    + " Pa, which is none; give two numbers");
        }
        if (value instanceof String text) {
            int odd = text.codePoints().filter(c -> !isWritable(c)).findFirst().orElse(-1);
            if (odd >= 0) {
                throw new NoStudyException(String.format("the %s of %s holds the character U+%04X, which no file can"
                        + " hold; delete it", attribute.getName(), Places.of(object), odd));
            }
        }
    }

    /** The characters of XML 1.0; half a pair of surrogates is none. */
    private static boolean isWritable(int c) {
        return c == '\t' || c == '\n' || c == '\r' || c >= 0x20 && c <= 0xD7FF || c >= 0xE000 && c <= 0xFFFD || c >= 0x10000;
    }
}
