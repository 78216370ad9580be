package stirwright.correlation;

/** Reynolds numbers at which a family's laminar regime ends and its turbulent regime begins. */
public final class RegimeLimits {

    /** Of impellers in general, for families whose sources give no limits of their own. */
    public static final RegimeLimits IN_GENERAL = of(10, 1e4, Citation.of(
            "J. F. Steffe, Rheological Methods in Food Process Engineering, 2nd ed., Freeman Press (1996)", "p. 188"));

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

    /**
     * @param laminarUpTo the last Reynolds number of the laminar regime, above zero
     * @param turbulentFrom the first Reynolds number of the turbulent regime
     */
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
