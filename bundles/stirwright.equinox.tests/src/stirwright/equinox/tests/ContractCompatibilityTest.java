package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.osgi.framework.Bundle;
import stirwright.conformance.Check;
import stirwright.conformance.ConformanceSuite;
import stirwright.conformance.InstalledBundles;
import stirwright.conformance.Subject;
import stirwright.core.CaseRefusedException;
import stirwright.core.Point;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Bound;
import stirwright.correlation.Correlation;
import stirwright.correlation.Effect;
import stirwright.correlation.Family;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Quantity;
import stirwright.correlation.Variable;
import stirwright.correlation.Verdict;

/** A jar compiled against the contract's first version loads and computes as on its first day; see contract/README.md. */
class ContractCompatibilityTest {
    private static Bundle sample;

    @BeforeAll
    static void install() throws Exception {
        sample = SampleJar.install();
    }

    @AfterAll
    static void leave() throws Exception {
        sample.uninstall();
    }

    @Test
    void itsFamilyIsFound() {
        Family family = Framework.catalogue().family(SampleJar.FAMILY).orElseThrow();
        assertEquals("sample impeller", family.title());
        // Web width D/8 and web height twice that, where D is 0.4 m.
        VesselGeometry vessel = VesselGeometry.resolve(family, Map.of("impeller_diameter", 0.4, "baffle_count", 4.0));
        assertEquals(0.1, vessel.get(family.parameter("web_height").orElseThrow()), 1e-15);
        assertEquals(0.05 + 0.1, vessel.get(family.parameter("web_span").orElseThrow()), 1e-15);
        assertEquals("web_width_m = 0.05 (D/8)", vessel.defaultInWords(family.parameter("web_width").orElseThrow()));
    }

    @Test
    void aDimensionFollowsFromWhatIsListedAfterIt() {
        // Web width D/8 of a span of 0.2 m leaves 0.15 m.
        VesselGeometry vessel = SampleJar.vessel("web_span=0.2");
        Family family = Framework.catalogue().family(SampleJar.FAMILY).orElseThrow();
        assertEquals(0.15, vessel.get(family.parameter("web_height").orElseThrow()), 1e-15);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "web_width=0.21 | web_width_m  | below 0.5 times impeller_diameter_m 0.4",
        "slot_count=3   | slot_count   | an even number",
        "slot_count=10  | slot_count   | 9",
    })
    void itsHardLimitsHold(String given, String column, String words) {
        String refusal = assertThrows(CaseRefusedException.class, () -> SampleJar.vessel(given)).toString();
        assertTrue(refusal.contains(column) && refusal.contains(words), refusal);
    }

    @Test
    void itsCorrelationsAreFound() {
        assertEquals(16, Framework.catalogue().entries().stream()
                .filter(e -> e.origin().equals("invented.contract.sample 1.0.0")).count());
        assertEquals(List.of(), Framework.catalogue().problems());
    }

    /** The same formulas as in sample-1.0/src, worked by hand for D 0.4 m, T 0.8 m, H = T, unless the row says otherwise. */
    @ParameterizedTest(name = "{0} = {1}")
    @CsvSource(delimiter = '|', value = {
        "np.invented-curve            | 2.66404738  | 80/400 + 2 * 2^(log10(400/100)/2) | reynolds=400",
        "np.invented-curve            | 10.4494897  | 80/10 + 2 * (6/4)^0.5             | reynolds=10 blade_count=6",
        "np.invented-froude-inside    | 0.922680835 | 3 * 0.2^0.05/log10(10 + 990)      | reynolds=990 froude=0.2",
        "np.invented-own-reynolds     | 0.05        | 5/100                             | reynolds=100",
        "np.invented-factor-froude    | 1.17461894  | 0.2^-0.1                          | froude=0.2",
        "np.invented-factor-several   | 1.86606598  | 2^0.9                             | impeller_count=2",
        "np.invented-factor-slots     | 0.92        | 1 - 0.02 * 4                      | slot_count=4",
        "ks.invented-flow-index       | 10          | 8 * (3 * 0.5 + 1)/(4 * 0.5)       | flow_index=0.5",
        "ks.invented-geometry         | 10.6666667  | 16 * (0.4/0.9)^0.5 = 16 * 2/3     | vessel_diameter=0.9",
        "ks.invented-reynolds         | 15.8489319  | 10 * 10000^0.05 = 10 * 10^0.2     | reynolds=10000",
        "ks.invented-flow-number      | 8.4         | 12 * 0.7                          | flow_number=0.7",
        "nq.invented                  | 0.6         | 0.8 * 150/(150 + 50)              | reynolds=150",
        "blend-time.invented          | 7.5         | 6 * 2^2 * (1 + 100/400)/(2 * 2)   | reynolds=400 power_number=8 speed=2",
        "web-load.invented            | 288         | 0.3 * 1.5 * 1000 * 2^2 * 0.4^2    | density=1000 speed=2 web_roughness=0.5",
        "web-wear.invented            | 0.7         | the number itself                 | reynolds=100",
        "web-drag.invented            | 4.8         | 24/5                              | reynolds=5",
        "web-lift.invented            | 2.88        | 0.01 * 288                        | web_load=288",
    })
    void computesAsOnItsFirstDay(String id, double expected, String byHand, String given) {
        assertEquals(expected, SampleJar.value(SampleJar.correlation(id), given), 1e-8 * expected, byHand);
    }

    @Test
    void everyKindOfBoundStillSpeaks() {
        Correlation curve = SampleJar.correlation("np.invented-curve");
        assertEquals(List.of(
                "Reynolds number 0.1 to 100000", "vessel baffled or unbaffled", "D/T 0.3 to 0.6",
                "fluid newtonian or shear-thinning or yield-stress", "blade count 2 or 4 or 6", "H/T at least 0.5",
                "C/T at most 0.5", "w/D 0.1219 to 0.1281, nominal 0.125", "web narrow", "web area in m2 at most 0.5",
                "vessel diameter in m not stated (invented without a scale)"),
                curve.validity().stream().map(Bound::words).toList());
        assertEquals("OUTSIDE", verdict(curve, "web", "web_width=0.1 web_height=0.2"));
        assertEquals("NEAR", verdict(curve, "reynolds", "reynolds=140000"));
        assertEquals("OUTSIDE", verdict(curve, "blade_count", "blade_count=3"));
        assertEquals("INSIDE", verdict(curve, "web_area", ""));
        assertEquals("NOT_STATED", verdict(curve, "vessel_diameter_m", ""));
    }

    @Test
    void itsWordsArrive() {
        Correlation curve = SampleJar.correlation("np.invented-curve");
        assertEquals("Np = 80/Re + phi(Re) (nB/4)^0.5, phi through (1, 2), (100, 2), (10000, 4), both axes logarithmic",
                curve.formula());
        assertEquals(0.1, curve.scatter().getAsDouble());
        assertEquals("sampleblade.ks.invented-flow-index", curve.belongsWith().orElseThrow());
        assertEquals("diameter-ratio, web-slots",
                curve.contains().stream().map(Effect::id).sorted().collect(Collectors.joining(", ")));
        assertTrue(curve.claimsLaminarLimit());
        assertEquals("Invented for a test of the contract (2025), no page: nothing was measured", curve.citation().toString());
        assertEquals(FlowKind.CIRCULATION, SampleJar.correlation("nq.invented").flowKind().orElseThrow());
        assertEquals("web load in Pa", words(SampleJar.correlation("web-load.invented").quantity()));
        assertEquals("more than one impeller", SampleJar.correlation("np.invented-factor-several").appliesWhen());
        assertTrue(SampleJar.correlation("blend-time.invented").holdsFor("anything"));
    }

    @Test
    void itsConstantsCanBeChanged() {
        Correlation curve = SampleJar.correlation("np.invented-curve");
        Correlation other = curve.variant("sampleblade.np.changed",
                curve.constants().with("A", 100).withCurve("phi", phi -> phi.scaled(2)));
        // 100/10 + 2 * 2
        assertEquals(14, SampleJar.value(other, "reynolds=10"), 1e-12);
        assertTrue(other.formula().startsWith("Np = 100/Re"), other.formula());
        // 80/10 + 2
        assertEquals(10, SampleJar.value(curve, "reynolds=10"), 1e-12);
    }

    @Test
    void itsReferenceRowsAreReadAndMet() {
        Subject subject = InstalledBundles.subject(Framework.context(), sample);
        List<Check> checks = ConformanceSuite.checks().stream()
                .filter(c -> List.of("answers", "rows read", "rows met").contains(c.name())).toList();
        assertEquals(3, checks.size());
        checks.forEach(check -> assertEquals(List.of(), check.examine(subject)));
        assertEquals(19, subject.rows());
        assertEquals(1, subject.recalledRows());
    }

    private static String words(Quantity quantity) {
        return quantity.title() + " in " + quantity.unit();
    }

    private static String verdict(Correlation correlation, String subject, String given) {
        VesselGeometry vessel = SampleJar.vessel(given);
        Point point = SampleJar.point(correlation, given).set(Variable.FLOW_INDEX, 0.5);
        return correlation.validity().stream().filter(b -> b.subject().id().equals(subject)).findFirst()
                .map(b -> b.verdict(vessel, point)).map(Verdict::name).orElseThrow();
    }
}
