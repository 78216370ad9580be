package stirwright.correlation;

/** Reynolds numbers at which a family's laminar regime ends and its turbulent regime begins. */
public final class RegimeLimits {
    private final double laminarUpTo;
    private final double turbulentFrom;
    private final Citation citation;

    private RegimeLimits(double laminarUpTo, double turbulentFrom, Citation citation) {
        if (!(laminarUpTo > 0 && turbulentFrom >= laminarUpTo)) {
            throw new ContractException("regime limits " + laminarUpTo + " and " + turbulentFrom + " are not ascending");
        }
        this.laminarUpTo = laminarUpTo;
        this.turbulentFrom = turbulentFrom;
        this.citation = citation;
    }

    public static RegimeLimits of(double laminarUpTo, double turbulentFrom, Citation citation) {
        return new RegimeLimits(laminarUpTo, turbulentFrom, citation);
    }

    public Regime at(double reynolds) {
        if (reynolds <= laminarUpTo) {
            return Regime.LAMINAR;
        }
        return reynolds < turbulentFrom ? Regime.TRANSITIONAL : Regime.TURBULENT;
    }

    public double laminarUpTo() {
        return laminarUpTo;
    }

    public double turbulentFrom() {
        return turbulentFrom;
    }

    public Citation citation() {
        return citation;
    }
}
