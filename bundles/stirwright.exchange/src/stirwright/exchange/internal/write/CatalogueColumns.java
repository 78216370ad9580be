package stirwright.exchange.internal.write;

import static stirwright.exchange.internal.write.Column.entries;
import static stirwright.exchange.internal.write.Column.number;
import static stirwright.exchange.internal.write.Column.text;
import static stirwright.exchange.internal.write.Column.words;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import stirwright.core.Catalogue;
import stirwright.core.Entry;
import stirwright.correlation.Bound;
import stirwright.correlation.Correlation;
import stirwright.correlation.Effect;
import stirwright.correlation.Family;
import stirwright.correlation.Figures;
import stirwright.correlation.Term;

/** The columns of the list of everything installed. */
public final class CatalogueColumns {

    /** What stands in the family's column for a correlation that holds for every impeller. */
    private static final String ANY = "any";

    /** A family and one of its correlations; a family without any has a row of its own. */
    public record Row(String family, String title, String bundle, Optional<Correlation> correlation) {}

    public static final List<Column<Row>> ALL = List.of(
            text("family", Row::family),
            of("quantity", c -> c.quantity().id()),
            of("correlation", Correlation::id),
            text("title", Row::title),
            of("formula", Correlation::formula),
            of("source", c -> c.citation().toString()),
            words("range", r -> r.correlation().map(c -> c.validity().stream().map(Bound::words).toList()).orElse(List.of())),
            of("standing", c -> c.standing().words()),
            of("transcription", c -> c.transcription().words()),
            number("scatter", r -> r.correlation().map(c -> c.scatter().orElse(Double.NaN)).orElse(Double.NaN)),
            words("contains", r -> r.correlation().map(c -> c.contains().stream().map(Term::id).toList()).orElse(List.of())),
            text("bundle", Row::bundle),
            of("modifier_for", c -> c.modifierFor().map(Effect::id).orElse("")),
            entries("constants", r -> r.correlation().map(CatalogueColumns::constants).orElse(List.of())));

    private CatalogueColumns() {}

    private static Column<Row> of(String name, Function<Correlation, String> words) {
        return text(name, r -> r.correlation().map(words).orElse(""));
    }

    private static List<String> constants(Correlation c) {
        return c.constants().names().stream().map(name -> name + "=" + Figures.exact(c.constants().get(name))).toList();
    }

    /** Family by family in the order of their ids, then what holds for any. */
    public static List<Row> rows(Catalogue catalogue) {
        List<Row> rows = new ArrayList<>();
        List<String> families = catalogue.entries().stream()
                .flatMap(e -> e.correlation().families().stream())
                .distinct()
                .toList();
        List<String> all = new ArrayList<>(families);
        catalogue.families().stream().map(Family::id).filter(id -> !families.contains(id)).forEach(all::add);
        all.stream().sorted().forEach(id -> {
            int before = rows.size();
            catalogue.entries().stream().filter(e -> e.correlation().families().contains(id))
                    .forEach(e -> rows.add(row(id, e)));
            if (rows.size() == before) {
                catalogue.family(id).ifPresent(
                        f -> rows.add(new Row(id, f.title(), catalogue.originOf(f), Optional.empty())));
            }
        });
        catalogue.entries().stream().filter(e -> e.correlation().families().isEmpty()).forEach(e -> rows.add(row(ANY, e)));
        return rows;
    }

    private static Row row(String family, Entry entry) {
        return new Row(family, entry.correlation().title(), entry.origin(), Optional.of(entry.correlation()));
    }
}
