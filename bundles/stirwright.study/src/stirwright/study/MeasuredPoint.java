package stirwright.study;

import stirwright.study.internal.Decimals;

/**
 * A point of a measured flow curve. In a file it is one line, so that a point that changed is one line that changed and no
 * rate can be without its stress.
 *
 * @param rate shear rate in 1/s
 * @param stress shear stress in Pa
 */
public record MeasuredPoint(double rate, double stress) {

    /** @throws NumberFormatException when the text is not two plain decimal numbers with a blank between them */
    public static MeasuredPoint parse(String text) {
        String[] parts = text.strip().split("\\s+");
        if (parts.length != 2) {
            throw new NumberFormatException("'" + text + "' is not a rate and a stress");
        }
        return new MeasuredPoint(Decimals.parse(parts[0]), Decimals.parse(parts[1]));
    }

    /** As it stands in a file; the same doubles come back. */
    @Override
    public String toString() {
        return Decimals.text(rate) + " " + Decimals.text(stress);
    }
}
