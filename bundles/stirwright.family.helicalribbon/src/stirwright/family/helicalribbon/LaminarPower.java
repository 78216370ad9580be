package stirwright.family.helicalribbon;

import static java.lang.Math.pow;
import static stirwright.correlation.Dimensions.IMPELLER_DIAMETER;
import static stirwright.correlation.Dimensions.IMPELLER_HEIGHT;
import static stirwright.correlation.Dimensions.PITCH_RATIO;
import static stirwright.correlation.Dimensions.RIBBON_COUNT;
import static stirwright.correlation.Dimensions.RIBBON_WIDTH;
import static stirwright.correlation.Dimensions.WALL_GAP;

import java.util.function.ToDoubleBiFunction;
import stirwright.correlation.Citation;
import stirwright.correlation.Constants;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Geometry;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** Np Re of laminar flow as products of powers of the ribbon's proportions. */
final class LaminarPower {

    private static final String NOT_AT_HAND = "the source's ribbons are not at hand";

    private static final String CHECKED = "At T 2 m, D = h = p 1.9 m, w 0.19 m and two ribbons the five usable forms lie from "
            + "294 to 370, 12 % around their middle; for one ribbon of half that pitch they lie further apart.";

    private LaminarPower() {}

    static Correlation rieger() {
        return card("helicalribbon.np.rieger-1988", "Rieger, Novak and Havelkova",
                        "Np = {a} (h/D) (c/D)^-{b} (p/D)^-{d} (w/D)^{e} nr^{f}/Re",
                        LaminarPower::rieger)
                .cite(Citation.of("F. Rieger, V. Novak and D. Havelkova, Int. Chem. Eng. 28 (1988) 376-383",
                        "as printed after the Handbook of Industrial Mixing, Wiley (2004), Example 9-6"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .constant("a", 82.8).constant("b", 0.38).constant("d", 0.35).constant("e", 0.20).constant("f", 0.78)
                .remark("The handbook recommends it among the forms for ribbons.")
                .remark(CHECKED)
                .build();
    }

    /** Np Re. */
    static double rieger(Geometry v, Constants k) {
        return k.get("a") * height(v) * pow(gap(v), -k.get("b")) * pow(pitch(v), -k.get("d"))
                * pow(width(v), k.get("e")) * pow(ribbons(v), k.get("f"));
    }

    static Correlation shamlouEdwards() {
        return card("helicalribbon.np.shamlou-edwards-1985", "Shamlou and Edwards",
                        "Np = {a} (h/D) (p/D)^-{b} (c/w)^-{d} nr^{e}/Re",
                        (v, k) -> k.get("a") * height(v) * pow(pitch(v), -k.get("b"))
                                * pow(gap(v) / width(v), -k.get("d")) * pow(ribbons(v), k.get("e")))
                .cite(Citation.withoutLocator("P. A. Shamlou and M. F. Edwards, Chem. Eng. Sci. 40 (1985) 1773-1781"))
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .constant("a", 150).constant("b", 0.50).constant("d", 0.33).constant("e", 0.54)
                .remark("The gap counts over the ribbon's width: over the diameter the form would give 724 where the others have "
                        + "294 to 370.")
                .remark(CHECKED)
                .build();
    }

    static Correlation kaeppel() {
        return card("helicalribbon.np.kaeppel-1979", "Kaeppel",
                        "Np = {a} (h/D) (c/D)^-{b} (p/D)^-{d} nr^{e}/Re",
                        (v, k) -> k.get("a") * height(v) * pow(gap(v), -k.get("b")) * pow(pitch(v), -k.get("d"))
                                * pow(ribbons(v), k.get("e")))
                .cite(Citation.of("M. Kaeppel, Int. Chem. Eng. 19 (1979)", "p. 571"))
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .constant("a", 60).constant("b", 0.3).constant("d", 0.5).constant("e", 0.8)
                .remark(CHECKED)
                .build();
    }

    static Correlation blasinskiRzyski() {
        return card("helicalribbon.np.blasinski-rzyski-1980", "Blasinski and Rzyski",
                        "Np = {a} (h/D) (c/D)^-{b} (p/D)^-{d} (w/D)^{e} nr^{f}/Re",
                        (v, k) -> k.get("a") * height(v) * pow(gap(v), -k.get("b")) * pow(pitch(v), -k.get("d"))
                                * pow(width(v), k.get("e")) * pow(ribbons(v), k.get("f")))
                .cite(Citation.of("H. Blasinski and E. Rzyski, Chem. Eng. J. 19 (1980)", "p. 157"))
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .constant("a", 34.1).constant("b", 0.53).constant("d", 0.63).constant("e", 0.14).constant("f", 0.79)
                .remark(CHECKED)
                .build();
    }

    static Correlation hallGodfrey() {
        return card("helicalribbon.np.hall-godfrey-1970", "Hall and Godfrey",
                        "Np = {a} nr (h/D) (c/D)^-{b} (p/D)^-{d} (w/D)^{e}/Re",
                        (v, k) -> k.get("a") * ribbons(v) * height(v) * pow(gap(v), -k.get("b"))
                                * pow(pitch(v), -k.get("d")) * pow(width(v), k.get("e")))
                .cite(Citation.of("K. R. Hall and J. C. Godfrey, Trans. Instn Chem. Engrs 48 (1970)", "p. T201"))
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .constant("a", 66).constant("b", 0.6).constant("d", 0.73).constant("e", 0.5)
                .remark(CHECKED)
                .build();
    }

    static Correlation nagata() {
        return card("helicalribbon.np.nagata-1972", "Nagata et al.",
                        "Np = {a} (2 c/D)^-{b} (nr D/p)^{d}/Re",
                        (v, k) -> k.get("a") * pow(2 * gap(v), -k.get("b")) * pow(ribbons(v) / pitch(v), k.get("d")))
                .cite(Citation.withoutLocator("S. Nagata et al., as recalled of their papers of 1957 and 1972"))
                .transcription(Transcription.UNSURE)
                .constant("a", 74.3).constant("b", 0.5).constant("d", 0.5)
                .remark("Recalled for h = D. It gives 458 where the five other forms have 294 to 370.")
                .build();
    }

    private static CorrelationBuilder card(
            String id, String title, String formula, ToDoubleBiFunction<Geometry, Constants> laminarPower) {
        return Sources.laminar(id, Quantity.POWER_NUMBER, title + ", laminar")
                .notStated(Sources.GAP_OVER_D, NOT_AT_HAND)
                .notStated(Sources.HEIGHT_OVER_D, NOT_AT_HAND)
                .notStated(Sources.PITCH_RATIO, NOT_AT_HAND)
                .notStated(Sources.RIBBON_OVER_D, NOT_AT_HAND)
                .notStated(Sources.RIBBON_COUNT, NOT_AT_HAND)
                .newtonianData()
                .reads(Variable.REYNOLDS)
                .laminarLimit()
                .formula(formula)
                .relation((vessel, k) -> {
                    double kp = laminarPower.applyAsDouble(vessel, k);
                    return point -> kp / point.reynolds();
                });
    }

    private static double height(Geometry vessel) {
        return vessel.ratio(IMPELLER_HEIGHT, IMPELLER_DIAMETER);
    }

    private static double gap(Geometry vessel) {
        return vessel.ratio(WALL_GAP, IMPELLER_DIAMETER);
    }

    private static double pitch(Geometry vessel) {
        return vessel.get(PITCH_RATIO);
    }

    private static double width(Geometry vessel) {
        return vessel.ratio(RIBBON_WIDTH, IMPELLER_DIAMETER);
    }

    private static double ribbons(Geometry vessel) {
        return vessel.get(RIBBON_COUNT);
    }
}
