package stirwright.conformance.internal;

import java.util.regex.Pattern;
import stirwright.correlation.Citation;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;

/** Whether a reader can find where a number comes from. */
public final class Citations {
    private static final Pattern PLACEHOLDER = Pattern.compile(
            "(?i)\\W*(n/?a|none|unknown|not known|missing|tb[acd]|to be .*|no locator|see source)?\\W*");
    private static final Pattern AT_HAND = Pattern.compile("(?i).*\\bat hand\\b.*");
    private static final Pattern WORD = Pattern.compile(".*\\p{L}{3,}.*");

    private Citations() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        for (Family family : workpiece.ownFamilies()) {
            examine(family.id(), family.regimes().citation(), findings);
            family.regimes().shearThinning().ifPresent(thinning -> examine(family.id(), thinning.citation(), findings));
        }
        for (Correlation correlation : workpiece.correlations()) {
            examine(correlation.id(), correlation.citation(), findings);
        }
    }

    private static void examine(String about, Citation citation, Findings findings) {
        if (!citation.hasSource()) {
            return;
        }
        if (!WORD.matcher(citation.work()).matches()) {
            findings.add(about, "the citation's work '" + citation.work() + "' names no author or title");
        }
        String locator = citation.locator();
        boolean saysNotAtHand = AT_HAND.matcher(locator).matches();
        if (PLACEHOLDER.matcher(locator).matches()
                || saysNotAtHand && !locator.contains(Citation.LOCATOR_NOT_AT_HAND)) {
            findings.add(about, "the locator '" + locator + "' leads nowhere; give page, table, equation or figure, or the"
                    + " words \"" + Citation.LOCATOR_NOT_AT_HAND + "\"");
        }
    }
}
