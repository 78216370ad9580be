package stirwright.correlation;

/** Which flow a flow number counts; the two are never compared as if they were one. */
public enum FlowKind {
    /** What leaves the impeller's swept volume. */
    DISCHARGE("discharge"),
    /** What circulates in the vessel, entrained liquid included. */
    CIRCULATION("circulation");

    private final String id;

    FlowKind(String id) {
        this.id = id;
    }

    public String id() {
        return id;
    }
}
