package stirwright.study.internal;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import org.eclipse.emf.ecore.EClassifier;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.EcorePackage;
import org.eclipse.emf.ecore.resource.Resource.Diagnostic;
import org.eclipse.emf.ecore.xmi.ClassNotFoundException;
import org.eclipse.emf.ecore.xmi.FeatureNotFoundException;
import org.eclipse.emf.ecore.xmi.IllegalValueException;
import org.eclipse.emf.ecore.xmi.PackageNotFoundException;
import org.eclipse.emf.ecore.xmi.UnresolvedReferenceException;
import org.xml.sax.SAXParseException;
import stirwright.study.StudyPackage;

/** The first thing that kept a file from being read, in words. */
final class ReadProblems {
    static final String NOT_A_STUDY = "is not a study; name one, a file that Stirwright saved";

    private static final String NEWER = ", which this version of Stirwright does not know; a newer one may have written"
            + " it, so open the study with that";

    private ReadProblems() {}

    /**
     * @param failure what ended the reading; null when it came to the end
     * @param within whether a study had begun
     */
    static NoStudyException of(Exception failure, List<Diagnostic> errors, boolean within) {
        SAXParseException syntax = syntax(failure, errors);
        if (syntax != null) {
            return new NoStudyException(syntax(syntax, within), syntax);
        }
        if (!within) {
            return new NoStudyException(NOT_A_STUDY, failure);
        }
        return errors.stream().min(Comparator.comparingInt(Diagnostic::getLine))
                .map(first -> new NoStudyException("line " + first.getLine() + " " + words(first), failure))
                .orElseGet(() -> new NoStudyException("is a damaged study; take a copy of it", failure));
    }

    private static SAXParseException syntax(Exception failure, List<Diagnostic> errors) {
        for (Throwable cause = failure; cause != null; cause = cause.getCause()) {
            if (cause instanceof SAXParseException found) {
                return found;
            }
        }
        return errors.stream().filter(Exception.class::isInstance).map(e -> ((Exception) e).getCause())
                .filter(SAXParseException.class::isInstance).map(SAXParseException.class::cast).findFirst().orElse(null);
    }

    private static String syntax(SAXParseException syntax, boolean within) {
        if (syntax.getMessage().contains("DOCTYPE")) {
            return "line " + syntax.getLineNumber() + " declares a document type, which no study has; delete the declaration";
        }
        return !within && syntax.getLineNumber() <= 1 ? NOT_A_STUDY
                : "line " + syntax.getLineNumber() + " is damaged XML (" + syntax.getMessage().strip().replaceAll("\\.$", "")
                        + "); mend the line or take a copy of the file";
    }

    private static String words(Diagnostic error) {
        return switch (error) {
            case FeatureNotFoundException feature -> "has " + Places.quote(feature.getName()) + NEWER;
            case ClassNotFoundException type -> "has " + Places.quote(type.getName()) + NEWER;
            case PackageNotFoundException namespace -> "has something of " + Places.quote(namespace.uri()) + NEWER;
            case UnresolvedReferenceException reference -> "refers to " + Places.quote(reference.getReference())
                    + ", which is not in the study; name one that is";
            case IllegalValueException value -> value(value.getFeature(), value.getValue());
            default -> "cannot be read (" + error.getMessage() + "); mend the line or take a copy of the file";
        };
    }

    private static String value(EStructuralFeature feature, Object value) {
        String allowed = feature instanceof EReference ? withArticle(feature.getEType().getName().toLowerCase(Locale.ROOT))
                : form(feature.getEType());
        String shown = value instanceof EObject object ? Places.of(object) : Places.quote(String.valueOf(value));
        return "has " + shown + " as " + feature.getName() + ", where " + allowed + " belongs; write one";
    }

    private static String form(EClassifier type) {
        return type == StudyPackage.Literals.MEASURED_POINT ? "a rate and a stress such as 0.25 3.1"
                : type == EcorePackage.Literals.EBOOLEAN ? "true or false"
                : "a plain number such as " + (type == StudyPackage.Literals.NUMBER ? "0.25" : "1");
    }

    private static String withArticle(String noun) {
        return ("aeiou".indexOf(noun.charAt(0)) < 0 ? "a " : "an ") + noun;
    }
}
