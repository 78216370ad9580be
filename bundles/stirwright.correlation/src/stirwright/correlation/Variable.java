package stirwright.correlation;

/** A named number of an {@link OperatingPoint}. An open set: equal ids are the same variable. */
public final class Variable extends Term {

    /** Impeller Reynolds number by the correlation's own {@link ReynoldsDefinition}. */
    public static final Variable REYNOLDS = of("reynolds", "Reynolds number", "Re", "-");

    /** Froude number N^2 D/g. */
    public static final Variable FROUDE = of("froude", "Froude number", "Fr", "-");

    /** Local flow index d ln(stress)/d ln(shear rate) at the average shear rate. */
    public static final Variable FLOW_INDEX = of("flow_index", "flow index", "n", "-");

    /** Yield stress over rho N^2 D^2. */
    public static final Variable YIELD_NUMBER = of("yield_number", "yield number", "Ny", "-");

    /** Speed. */
    public static final Variable SPEED = of("speed", "speed", "N", "rev/s");

    /** Density of the product. */
    public static final Variable DENSITY = of("density", "density", "rho", "kg/m3");

    /** Apparent viscosity at the average shear rate. */
    public static final Variable VISCOSITY = of("viscosity", "apparent viscosity", "mu", "Pa s");

    /** Power number of the pick, all impellers and vessel effects included. */
    public static final Variable POWER_NUMBER = of(Quantity.POWER_NUMBER);

    /** Flow number of the pick, all impellers and vessel effects included. */
    public static final Variable FLOW_NUMBER = of(Quantity.FLOW_NUMBER);

    /** Shear-rate constant of the pick, per revolution. */
    public static final Variable SHEAR_RATE_CONSTANT = of(Quantity.SHEAR_RATE_CONSTANT);

    /**
     * Power number times Reynolds number in laminar flow, all impellers included: of the power
     * correlation that would be picked there. A property of impeller and vessel, whatever the state.
     */
    public static final Variable LAMINAR_POWER =
            of("laminar_power_constant", "laminar power constant", "Kp", "-");

    private final String symbol;
    private final String unit;

    private Variable(String id, String title, String symbol, String unit) {
        super(id, title);
        this.symbol = symbol;
        this.unit = unit;
    }

    /**
     * The value of the pick for a quantity. It is unknown where nothing is picked for that quantity,
     * or not yet.
     */
    public static Variable of(Quantity quantity) {
        return of(quantity.id().replace('-', '_'), quantity.title(), quantity.symbol(), quantity.unit());
    }

    /**
     * A variable of a contributor's own or one listed here.
     *
     * @param unit the SI unit; {@code "-"} for a pure number
     */
    public static Variable of(String id, String title, String symbol, String unit) {
        return new Variable(id, title, symbol, unit);
    }

    public String symbol() {
        return symbol;
    }

    public String unit() {
        return unit;
    }
}
