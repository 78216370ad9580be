package stirwright.workbench.internal.session;

import java.util.Arrays;
import java.util.Comparator;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import stirwright.rheology.ModelKind;
import stirwright.workbench.internal.Messages;

/** What the window calls the fluid models. */
public final class ModelTitles {

    /** Longer ids first, and none within another word. */
    private static final Pattern IDS = Pattern.compile(Arrays.stream(ModelKind.values()).map(ModelKind::id)
            .sorted(Comparator.comparing(String::length).reversed()).collect(Collectors.joining("|", "(?<![\\w-])(?:", ")(?![\\w-])")));

    private ModelTitles() {}

    public static String of(ModelKind kind) {
        return switch (kind) {
            case NEWTONIAN -> Messages.Model_newtonian;
            case POWER_LAW -> Messages.Model_powerLaw;
            case BINGHAM -> Messages.Model_bingham;
            case HERSCHEL_BULKLEY -> Messages.Model_herschelBulkley;
            case CASSON -> Messages.Model_casson;
            case SISKO -> Messages.Model_sisko;
            case CROSS -> Messages.Model_cross;
            case CARREAU -> Messages.Model_carreau;
        };
    }

    /** A sentence of the core with the titles of models in place of their ids. */
    public static String inWords(String sentence) {
        return IDS.matcher(sentence).replaceAll(m -> of(ModelKind.byId(m.group()).orElseThrow()));
    }
}
