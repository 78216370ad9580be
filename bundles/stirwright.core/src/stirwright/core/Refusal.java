package stirwright.core;

/**
 * Why a case cannot be computed.
 *
 * @param field the name of the input, as a case table heads its column
 * @param value what stands there, as it was given; empty when nothing was
 * @param reason what is wrong and what is allowed
 */
public record Refusal(String field, String value, String reason) {

    /** One line that names the field and the value. */
    public String words() {
        return value.isEmpty() ? field + " " + reason : field + " " + value + " " + reason;
    }
}
