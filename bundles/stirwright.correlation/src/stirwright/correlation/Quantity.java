package stirwright.correlation;

/** What a correlation gives. An open set: equal ids are the same quantity. */
public final class Quantity extends Term {

    /** Power number P/(rho N^3 D^5), of one impeller unless the correlation contains several. */
    public static final Quantity POWER_NUMBER = of("power-number", "power number", "Np", "-");

    /** A power number below which no impeller of the family can lie: no estimate, and so a quantity of its own. */
    public static final Quantity POWER_NUMBER_FLOOR = of("power-number-floor", "least power number", "Npmin", "-");

    /** Flow number Q/(N D^3); whether Q is discharge or circulation is told by {@link FlowKind}. */
    public static final Quantity FLOW_NUMBER = of("flow-number", "flow number", "Nq", "-");

    /** Average shear rate over speed, per revolution. */
    public static final Quantity SHEAR_RATE_CONSTANT =
            of("shear-rate-constant", "shear-rate constant", "ks", "per revolution");

    /** Time to 95 % homogeneity. */
    public static final Quantity BLEND_TIME = of("blend-time", "blend time to 95 %", "t95", "s");

    private final String symbol;
    private final String unit;

    private Quantity(String id, String title, String symbol, String unit) {
        super(id, title);
        this.symbol = symbol;
        this.unit = unit;
    }

    /**
     * A quantity of a contributor's own or one listed here.
     *
     * @param unit the SI unit; {@code "-"} for a pure number
     */
    public static Quantity of(String id, String title, String symbol, String unit) {
        return new Quantity(id, title, symbol, unit);
    }

    public String symbol() {
        return symbol;
    }

    public String unit() {
        return unit;
    }
}
