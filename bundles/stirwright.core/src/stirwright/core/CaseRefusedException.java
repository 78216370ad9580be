package stirwright.core;

/** A case cannot be computed; says which field stands in the way and what it holds. */
public final class CaseRefusedException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient Refusal refusal;

    public CaseRefusedException(String field, String value, String reason) {
        super(field + " '" + value + "': " + reason, null, false, false);
        this.refusal = new Refusal(field, value, reason);
    }

    public Refusal refusal() {
        return refusal;
    }
}
