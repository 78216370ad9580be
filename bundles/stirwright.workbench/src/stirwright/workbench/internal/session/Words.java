package stirwright.workbench.internal.session;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import stirwright.core.Catalogue;
import stirwright.core.Refusal;
import stirwright.correlation.Family;
import stirwright.exchange.CaseField;
import stirwright.exchange.CaseFields;
import stirwright.rheology.ModelKind;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.Units;

/** Sentences of the core as the window says them: with the titles of its fields in place of the case table's columns. */
public final class Words {
    private final Map<String, String> titles = new LinkedHashMap<>();
    private final Pattern columns;

    public Words(Catalogue catalogue) {
        List<CaseField> fields = new ArrayList<>(CaseFields.SPEEDS);
        fields.addAll(CaseFields.GIVEN);
        fields.addAll(CaseFields.MEASURED_WINDOW);
        fields.addAll(CaseFields.YIELD_BOUNDS);
        fields.add(CaseFields.STATIC_YIELD_STRESS);
        fields.add(CaseFields.DENSITY);
        Stream.of(ModelKind.values()).map(CaseFields::model).forEach(fields::addAll);
        for (Family family : catalogue.families()) {
            fields.addAll(CaseFields.vessel(family));
            fields.addAll(CaseFields.impeller(family));
        }
        fields.stream().sorted(Comparator.comparing(f -> -f.column().length())).forEach(f -> titles.putIfAbsent(f.column(),
                f.unit().equals("-") ? f.title() : f.title() + " (" + Units.show(f.unit()) + ")"));
        columns = Pattern.compile("(?<![\\w.])(" + String.join("|", titles.keySet()) + ")(?![\\w.])");
    }

    public String of(String sentence) {
        return columns.matcher(sentence).replaceAll(m -> Matcher.quoteReplacement(titles.get(m.group(1))));
    }

    /** Why a case cannot be computed; of a blank field that which is to be done. */
    public String of(Refusal refusal) {
        boolean noDemand = refusal.value().isEmpty() && CaseFields.SPEEDS.stream().anyMatch(f -> f.column().equals(refusal.field()));
        return noDemand ? Messages.Case_noDemand : of(refusal.words());
    }

    public List<String> of(List<String> sentences) {
        return sentences.stream().map(this::of).toList();
    }
}
