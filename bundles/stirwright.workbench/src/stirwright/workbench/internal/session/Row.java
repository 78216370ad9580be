package stirwright.workbench.internal.session;

import java.util.List;
import java.util.Optional;
import stirwright.core.Role;
import stirwright.correlation.Correlation;
import stirwright.correlation.Verdict;

/**
 * One candidate as the table and the chart show it. Numbers are NaN where they mean nothing.
 *
 * @param familyTitle of the family that it is applied to
 * @param correlationId or "given"
 * @param title short name; for a given value the words for that
 * @param style of its curve and its swatch
 * @param pick whether the case's numbers rest on it; the first row, so always one of the case's own family
 * @param value of the quantity, in its unit
 * @param speed rev/s; of a power number alone
 * @param power W; of a power number alone
 * @param torque N m; of a power number alone
 * @param deviation from the pick of the case at hand, minus 1: power over power, else value over value
 */
public record Row(
        String familyId, String familyTitle, String correlationId, String title, Optional<Correlation> correlation,
        int style, boolean pick, Role role, double value, double speed, double power, double torque, double deviation,
        Verdict verdict, List<String> failedBounds, String why) {

    /** Unique among the rows of one view. */
    public String key() {
        return key(familyId, correlationId);
    }

    static String key(String familyId, String correlationId) {
        return familyId + '/' + correlationId;
    }
}
