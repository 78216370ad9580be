package stirwright.correlation;

/**
 * Which Reynolds number a correlation means. An open set: a definition that the workbench cannot
 * compute excludes the candidate with that reason, it is never replaced by another one.
 */
public final class ReynoldsDefinition extends Term {

    /** rho N D^2 over the apparent viscosity at the average shear rate (Metzner and Otto). */
    public static final ReynoldsDefinition METZNER_OTTO =
            of("metzner-otto", "rho N D^2/mu, mu at the average shear rate");

    /** rho N^(2-n) D^2/K, with the local power law through the average shear rate. */
    public static final ReynoldsDefinition POWER_LAW = of("power-law", "rho N^(2-n) D^2/K");

    private ReynoldsDefinition(String id, String title) {
        super(id, title);
    }

    public static ReynoldsDefinition of(String id, String title) {
        return new ReynoldsDefinition(id, title);
    }
}
