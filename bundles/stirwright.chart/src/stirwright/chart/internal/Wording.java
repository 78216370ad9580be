package stirwright.chart.internal;

import java.text.MessageFormat;
import java.util.Locale;
import java.util.ResourceBundle;

/** The chart's own words, from wording.properties or its translation. */
final class Wording {
    private static final ResourceBundle WORDS =
            ResourceBundle.getBundle("stirwright.chart.internal.wording", Locale.getDefault(), Wording.class.getClassLoader());

    private Wording() { }

    /** @param parts what {0} and on stand for */
    static String of(String key, Object... parts) {
        return MessageFormat.format(WORDS.getString(key), parts);
    }
}
