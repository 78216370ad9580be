package stirwright.correlation;

import java.util.Optional;

/**
 * Reynolds numbers at which a family's laminar regime ends and its turbulent regime begins; where sources tell them
 * apart, a second pair for shear-thinning fluids, by Metzner and Otto's Reynolds number. Immutable.
 */
public final class RegimeLimits {

    /** Of impellers in general, for families whose sources give no limits of their own. */
    public static final RegimeLimits IN_GENERAL = of(10, 1e4, Citation.of(
            "J. F. Steffe, Rheological Methods in Food Process Engineering, 2nd ed., Freeman Press (1996)", "p. 188"));

    private final double laminarUpTo;
    private final double turbulentFrom;
    private final Citation citation;
    private final String remark;
    private final Optional<RegimeLimits> shearThinning;

    private RegimeLimits(
            double laminarUpTo, double turbulentFrom, Citation citation, String remark, Optional<RegimeLimits> shearThinning) {
        if (!(laminarUpTo > 0 && turbulentFrom >= laminarUpTo)) {
            throw new ContractException("regime limits " + laminarUpTo + " and " + turbulentFrom + " are not ascending");
        }
        this.laminarUpTo = laminarUpTo;
        this.turbulentFrom = turbulentFrom;
        this.citation = citation;
        this.remark = remark;
        this.shearThinning = shearThinning;
    }

    /**
     * @param laminarUpTo the last Reynolds number of the laminar regime, above zero
     * @param turbulentFrom the first Reynolds number of the turbulent regime
     */
    public static RegimeLimits of(double laminarUpTo, double turbulentFrom, Citation citation) {
        return new RegimeLimits(laminarUpTo, turbulentFrom, citation, "", Optional.empty());
    }

    /**
     * The same with other limits for shear-thinning fluids. A fluid with a yield stress counts as one, since its apparent
     * viscosity falls with the shear rate too.
     *
     * @param laminarUpTo the last Reynolds number of the laminar regime, above zero
     * @param turbulentFrom the first Reynolds number of the turbulent regime
     * @param remark how the limits follow from what the source says, in a sentence; may be empty
     */
    public RegimeLimits withShearThinning(double laminarUpTo, double turbulentFrom, Citation citation, String remark) {
        return new RegimeLimits(this.laminarUpTo, this.turbulentFrom, this.citation, this.remark,
                Optional.of(new RegimeLimits(laminarUpTo, turbulentFrom, citation, remark, Optional.empty())));
    }

    /** The limits for a kind of fluid. */
    public RegimeLimits forFluid(FluidClass fluid) {
        boolean thinning = fluid == FluidClass.SHEAR_THINNING || fluid == FluidClass.YIELD_STRESS;
        return thinning ? shearThinning.orElse(this) : this;
    }

    /** The regime of a kind of fluid. */
    public Regime at(double reynolds, FluidClass fluid) {
        return forFluid(fluid).at(reynolds);
    }

    /** The regime by the limits that hold where none are told apart by fluid. */
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

    /** How the limits follow from what the source says; empty where they stand there. */
    public String remark() {
        return remark;
    }

    /** The limits for shear-thinning fluids, where sources give some of their own. */
    public Optional<RegimeLimits> shearThinning() {
        return shearThinning;
    }
}
