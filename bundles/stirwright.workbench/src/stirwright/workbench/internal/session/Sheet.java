package stirwright.workbench.internal.session;

import java.util.Optional;
import stirwright.core.CaseResult;
import stirwright.core.CaseSpec;
import stirwright.core.Catalogue;
import stirwright.core.OpenCase;

/**
 * What came out for the case with one family.
 *
 * @param familyTitle the id where the family is not installed
 * @param spec what was computed; empty when the input is refused
 * @param open the same with its curves; empty when the input is refused
 */
public record Sheet(String familyId, String familyTitle, CaseResult result, Optional<CaseSpec> spec, Optional<OpenCase> open) {

    /** What the case was computed with: what is installed and what it changed of that. */
    public Catalogue catalogue(Catalogue installed) {
        return open.flatMap(OpenCase::catalogue).orElse(installed);
    }

    /** Whether there is something to draw. */
    public boolean computed() {
        return result.refusal().isEmpty();
    }
}
