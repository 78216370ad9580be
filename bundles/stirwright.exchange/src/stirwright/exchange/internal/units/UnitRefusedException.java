package stirwright.exchange.internal.units;

/** A unit cannot be taken; the message says why and follows the quoted text. */
final class UnitRefusedException extends Exception {
    private static final long serialVersionUID = 1L;

    UnitRefusedException(String reason) {
        super(reason);
    }
}
