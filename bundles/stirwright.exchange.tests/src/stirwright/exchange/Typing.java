package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import stirwright.correlation.Family;
import stirwright.family.discturbine.DiscTurbine;
import stirwright.family.pitchedblade.PitchedBlade;
import stirwright.rheology.ModelKind;

/** Types into the fields of a case. */
final class Typing {
    static final List<Family> FAMILIES =
            Stream.of(new DiscTurbine(), new PitchedBlade()).flatMap(c -> c.families().stream()).toList();

    private static final List<CaseField> FIELDS = Stream.of(
                    FAMILIES.stream().flatMap(f -> CaseFields.vessel(f).stream()),
                    FAMILIES.stream().flatMap(f -> CaseFields.impeller(f).stream()),
                    Arrays.stream(ModelKind.values()).flatMap(k -> CaseFields.model(k).stream()),
                    CaseFields.SPEEDS.stream(), CaseFields.GIVEN.stream(), CaseFields.MEASURED_WINDOW.stream(),
                    CaseFields.YIELD_BOUNDS.stream(),
                    Stream.of(CaseFields.STATIC_YIELD_STRESS, CaseFields.DENSITY))
            .flatMap(s -> s).distinct().toList();

    private Typing() {}

    /** Every field of the families that are here. */
    static List<CaseField> fields() {
        return FIELDS;
    }

    static CaseField field(String column) {
        return FIELDS.stream().filter(f -> f.column().equals(column)).findFirst()
                .orElseThrow(() -> new AssertionError("no field for " + column));
    }

    /** The value of what must be readable. */
    static double value(String typed, CaseField field) {
        return assertInstanceOf(TypedNumber.Value.class, TypedNumber.read(typed, field), typed).value();
    }

    /** The words about what must not be readable. */
    static String problem(String typed, CaseField field) {
        return assertInstanceOf(TypedNumber.Problem.class, TypedNumber.read(typed, field), typed).words();
    }
}
