package stirwright.correlation;

/** A contribution breaks the contract; the message names the correlation or family and the value. */
public final class ContractException extends IllegalArgumentException {
    private static final long serialVersionUID = 1L;

    public ContractException(String message) {
        super(message);
    }
}
